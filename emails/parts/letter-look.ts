import type { CSSProperties } from 'react';

const font = 'Verdana, "DejaVu Sans", Tahoma, sans-serif';
const ink = '#14211f';
const soft = '#42524e';

/** The board's day colours as inline styles: mail programs read little else. Verdana is the widest of the safe faces. */
export const LETTER = {
  board: '#f3f5f1',
  edge: '#6a7874',
  font,
  head: { color: ink, fontFamily: font, fontWeight: 700, lineHeight: 1.2 },
  text: { color: ink, fontFamily: font, fontSize: 18, lineHeight: 1.55, margin: '0 0 16px' },
  small: { color: soft, fontFamily: font, fontSize: 15, lineHeight: 1.5 },
  button: {
    display: 'inline-block',
    background: '#e3a008',
    color: ink,
    fontFamily: font,
    fontSize: 18,
    fontWeight: 700,
    lineHeight: '28px',
    padding: '12px 22px',
    border: `2px solid ${ink}`,
    borderRadius: 6,
    textDecoration: 'none',
  },
} as const satisfies Record<string, string | CSSProperties>;
