import type { HoleNotes } from '@/lib/domain/harp/note-map';
import { spokenName } from '@/lib/domain/harp/spoken-name';
import { NoteCell } from './note-cell';
import { isHeard, noteColumn, type Sounding } from './note-column';
import { NoteTable } from './note-table';

type NoteMapProps = {
  label: string;
  holes: readonly HoleNotes[];
  sounding?: Sounding;
  className?: string;
};

const COLUMN = 44;
const ROW = 38;
const STRIP = 34;
const GUTTER = 22;

/** The notes of a harp: blow above the strip, draw below, bends rising from the one and hanging from the other. */
export function NoteMap({ label, holes, sounding, className = '' }: NoteMapProps) {
  if (holes.length === 0)
    return (
      <p className={`max-w-prose text-soft ${className}`}>
        There is no note map for {label}: makers lay these harps out differently.
      </p>
    );
  const above = Math.max(...holes.map((hole) => noteColumn(hole, 'blow').length - 1));
  const below = Math.max(...holes.map((hole) => noteColumn(hole, 'draw').length - 1));
  const blowY = above * ROW;
  const stripY = blowY + ROW;
  const drawY = stripY + STRIP;
  const width = GUTTER + holes.length * COLUMN;
  return (
    <figure className={`relative ${className}`}>
      <svg
        viewBox={`0 0 ${width} ${drawY + (below + 1) * ROW}`}
        className="block h-auto w-full"
        aria-hidden="true"
      >
        <RowWord y={blowY + ROW / 2}>blow</RowWord>
        <RowWord y={drawY + ROW / 2}>draw</RowWord>
        <rect x={GUTTER} y={stripY} width={width - GUTTER} height={STRIP} className="fill-pine" />
        {holes.map((hole, index) => (
          <g key={hole.hole} transform={`translate(${GUTTER + index * COLUMN} 0)`}>
            <rect x="10" y={stripY + 5} width="24" height="24" className="fill-board" />
            <text
              x="22"
              y={stripY + 23}
              textAnchor="middle"
              className="fill-ink font-mono text-[17px] font-bold"
            >
              {hole.hole}
            </text>
            {(['blow', 'draw'] as const)
              .flatMap((breath) => noteColumn(hole, breath))
              .map((cell) => (
                <NoteCell
                  key={`${cell.breath} ${cell.kind} ${cell.depth}`}
                  y={cell.breath === 'blow' ? blowY - cell.out * ROW : drawY + cell.out * ROW}
                  size={{ width: COLUMN, height: ROW }}
                  cell={cell}
                  cents={isHeard(cell, hole.hole, sounding) ? sounding?.cents : undefined}
                />
              ))}
          </g>
        ))}
      </svg>
      <figcaption className="mt-2 text-small text-soft">
        Blow notes above the holes, draw notes below.
        {holes.some(({ bends }) => bends.length > 0) &&
          ' Further out: bends, each tick a half step; broken lines are overbends.'}
        {holes.some(({ slide }) => slide) && ' Further out: the same hole with the slide pushed in.'}
      </figcaption>
      <NoteTable label={spokenName(label)} holes={holes} />
    </figure>
  );
}

function RowWord({ y, children }: { y: number; children: string }) {
  return (
    <text
      transform={`translate(15 ${y}) rotate(-90)`}
      textAnchor="middle"
      className="fill-soft font-body text-[14px] font-semibold"
    >
      {children}
    </text>
  );
}
