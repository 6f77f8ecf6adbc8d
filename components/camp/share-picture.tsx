import { filledHoles, HOLES } from '../harp/filled-holes';

/** The board's day colours, written out: the drawing library knows no stylesheet. */
const INK = { board: '#f3f5f1', pine: '#0e4a45', brass: '#e3a008', ink: '#14211f' };

type SharePictureProps = { days: string; left: number; of: number };

/**
 * What a shared link shows, for 1200 × 630: dates, our name and the strip of places. Nothing that somebody typed, since
 * a glyph that the font lacks would be fetched from elsewhere, and strangers' text has no place in a picture we make.
 */
export function SharePicture({ days, left, of }: SharePictureProps) {
  const filled = filledHoles(left, of);
  const holes = Array.from({ length: HOLES }, (_, index) => ({ number: index + 1, sold: index < filled }));
  return (
    <div style={BOARD}>
      <div style={{ fontSize: 42 }}>Combwood · harmonica camp</div>
      <div style={{ fontSize: 100, letterSpacing: -4, lineHeight: 1.05 }}>{days}</div>
      <div style={{ display: 'flex', gap: 34, background: INK.pine, borderRadius: 14, padding: 30 }}>
        {holes.map(({ number, sold }) => (
          <div key={number} style={{ ...HOLE, background: sold ? INK.brass : INK.board }}>
            <div style={{ width: '100%', height: 12, background: sold ? INK.ink : 'transparent' }} />
          </div>
        ))}
      </div>
    </div>
  );
}

const BOARD = {
  width: '100%',
  height: '100%',
  display: 'flex',
  flexDirection: 'column',
  justifyContent: 'space-between',
  background: INK.board,
  color: INK.pine,
  padding: '64px 72px',
  borderTop: `28px solid ${INK.pine}`,
} as const;

const HOLE = { width: 69, height: 69, display: 'flex', alignItems: 'center' } as const;
