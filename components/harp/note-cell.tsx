import type { Cell } from './note-column';

type NoteCellProps = {
  y: number;
  size: { width: number; height: number };
  cell: Cell;
  /** Set while the note sounds: how far it lies above its target. */
  cents?: number;
};

/** One note of the map; ticks count the half steps of a bend, and the note that sounds turns brass with its cents. */
export function NoteCell({ y, size: { width, height }, cell, cents }: NoteCellProps) {
  const heard = cents !== undefined;
  const reed = cell.kind === 'reed';
  const ground = heard ? 'fill-brass stroke-ink' : reed ? 'fill-panel stroke-edge' : 'fill-board stroke-edge';
  const ink = heard ? 'fill-on-brass' : 'fill-ink';
  const middle = width / 2 - 1;
  return (
    <g transform={`translate(1 ${y + 1})`}>
      <rect
        width={width - 2}
        height={height - 2}
        rx="2"
        className={ground}
        strokeWidth={heard ? 2 : 1}
        strokeDasharray={cell.kind === 'overbend' ? '4 3' : undefined}
      />
      <text
        x={middle}
        y={cell.depth > 0 || heard ? 20 : 24}
        textAnchor="middle"
        className={`${ink} font-body text-[18px] ${reed ? 'font-bold' : ''}`}
      >
        {cell.note.replace(/-?\d+$/, '')}
      </text>
      {heard ? (
        <text x={middle} y={33} textAnchor="middle" className={`${ink} font-mono text-[12px]`}>
          {cents > 0 ? '+' : ''}
          {Math.round(cents)}
        </text>
      ) : (
        [1, 2, 3]
          .slice(0, cell.depth)
          .map((tick) => (
            <rect
              key={tick}
              x={middle - (cell.depth * 7 - 3) / 2 + (tick - 1) * 7}
              y="25"
              width="4"
              height="7"
              className={ink}
            />
          ))
      )}
    </g>
  );
}
