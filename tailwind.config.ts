import type { Config } from 'tailwindcss';

/**
 * Design tokens. Colours are CSS variables (set for day and night in app/globals.css) so that one class serves both;
 * contrast of each text pair is checked by tests/domain/look/contrast.test.ts.
 */
export default {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  darkMode: 'media',
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      board: 'var(--board)',
      panel: 'var(--panel)',
      ink: 'var(--ink)',
      soft: 'var(--soft)',
      line: 'var(--line)',
      edge: 'var(--edge)',
      pine: 'var(--pine)',
      'on-pine': 'var(--on-pine)',
      reed: 'var(--reed)',
      moss: 'var(--moss)',
      lake: 'var(--lake)',
      brass: 'var(--brass)',
      'on-brass': 'var(--on-brass)',
    },
    borderRadius: { none: '0', DEFAULT: '6px', full: '9999px' },
    boxShadow: { none: 'none' },
    extend: {
      fontFamily: {
        head: ['var(--font-head)', 'system-ui', 'sans-serif'],
        body: ['var(--font-body)', 'system-ui', 'sans-serif'],
        mono: ['var(--font-mono)', 'ui-monospace', 'monospace'],
      },
      fontSize: {
        small: ['0.882rem', '1.4'],
        base: ['1rem', '1.55'],
        lead: ['1.176rem', '1.5'],
        h3: ['1.294rem', '1.25'],
        h2: ['1.647rem', '1.15'],
        h1: ['2.235rem', '1.05'],
        bill: ['clamp(2.1rem, 4.6vw, 3.4rem)', '0.98'],
        poster: ['clamp(2.6rem, 7vw, 5.2rem)', '0.95'],
      },
      minHeight: { target: '44px' },
      minWidth: { target: '44px' },
      maxWidth: { prose: '38rem', page: '76rem' },
      transitionDuration: { DEFAULT: '140ms' },
    },
  },
} satisfies Config;
