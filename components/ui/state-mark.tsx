export type MarkTone = 'done' | 'open' | 'stop' | 'wait' | 'off';

// Shape as well as word and colour: filled square, hollow square, cross, half square, dash.
const SHAPES: Record<MarkTone, { path: string; colour: string }> = {
  done: { path: 'M2 2h10v10H2z', colour: 'text-moss' },
  open: { path: 'M2 2h10v10H2zM4 4v6h6V4z', colour: 'text-lake' },
  wait: { path: 'M2 2h10v10H2zM4 4v3h6V4z', colour: 'text-lake' },
  stop: { path: 'M3 1.6 7 5.6l4-4L12.4 3l-4 4 4 4L11 12.4l-4-4-4 4L1.6 11l4-4-4-4z', colour: 'text-reed' },
  off: { path: 'M2 6h10v2H2z', colour: 'text-soft' },
};

/** A state in a word, with a shape of its own. */
export function StateMark({ tone, children }: { tone: MarkTone; children: string }) {
  const { path, colour } = SHAPES[tone];
  return (
    <span className={`inline-flex items-center gap-1.5 whitespace-nowrap font-semibold ${colour}`}>
      <svg viewBox="0 0 14 14" width="14" height="14" aria-hidden="true">
        <path d={path} fill="currentColor" fillRule="evenodd" />
      </svg>
      {children}
    </span>
  );
}
