import type { CSSProperties, ReactNode } from 'react';

type ScrollRegionProps = { label: string; children: ReactNode; className?: string; style?: CSSProperties };

// WCAG 2.1.1: what scrolls must scroll by keyboard, so the region itself takes the focus.
const REACHABLE = { tabIndex: 0 };

/** A part of the page that scrolls by itself, such as a wide table; named, and reachable by keyboard. */
export function ScrollRegion({ label, children, className = '', style }: ScrollRegionProps) {
  return (
    <section
      aria-label={label}
      className={`relative overflow-auto ${className}`}
      style={style}
      {...REACHABLE}
    >
      {children}
    </section>
  );
}
