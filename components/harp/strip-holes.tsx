export type HoleLook = 'open' | 'brass' | 'filled';

type StripHolesProps = {
  looks: readonly HoleLook[];
  /** What the picture says, in words. Without it the picture is an ornament beside words that say the same. */
  label?: string;
  /** Numbers the holes that are not filled. */
  numbered?: boolean;
  className?: string;
};

const CELL = 24;
const HOLE = 16;
const INSET = (CELL - HOLE) / 2;

/** A strip of wood with square holes. A filled hole shows brass with a reed across it, so that
 * shape tells as well as colour; plain brass is the hole one is at, and the mark. */
export function StripHoles({ looks, label, numbered = false, className = '' }: StripHolesProps) {
  const width = looks.length * CELL + INSET * 2;
  const holes = looks.map((look, index) => ({ look, number: index + 1 }));
  return (
    <svg
      viewBox={`0 0 ${width} ${CELL + 4}`}
      className={`block h-auto w-full ${className}`}
      role={label ? 'img' : 'presentation'}
      aria-label={label}
      aria-hidden={!label}
    >
      <rect width={width} height={CELL + 4} rx="4" className="fill-pine" />
      {holes.map(({ look, number }) => {
        const x = INSET * 2 + (number - 1) * CELL;
        return (
          <g key={number} transform={`translate(${x} 6)`}>
            <rect width={HOLE} height={HOLE} className="fill-board" />
            {look !== 'open' && (
              <rect x="1.5" y="1.5" width={HOLE - 3} height={HOLE - 3} className="fill-brass" />
            )}
            {look === 'filled' && (
              <rect x="1.5" y={HOLE / 2 - 1.5} width={HOLE - 3} height="3" className="fill-on-brass" />
            )}
            {numbered && look !== 'filled' && (
              <text
                x={HOLE / 2}
                y={HOLE - 4}
                textAnchor="middle"
                className={`font-mono text-[11px] font-bold ${look === 'brass' ? 'fill-on-brass' : 'fill-soft'}`}
              >
                {number}
              </text>
            )}
          </g>
        );
      })}
    </svg>
  );
}
