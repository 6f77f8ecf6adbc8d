// Drawn in the harmonica's own squares: readable from two metres, told apart without colour.
const SHAPES = {
  tick: 'M6 34 16 24 28 36 54 8 64 18 28 56z',
  ring: 'M8 8h54v54H8zM22 22v26h26V22z',
  cross: 'M14 4 35 25 56 4 66 14 45 35 66 56 56 66 35 45 14 66 4 56 25 35 4 14z',
  bar: 'M4 26h62v18H4z',
} as const;

export function VerdictShape({ shape }: { shape: keyof typeof SHAPES }) {
  return (
    <svg viewBox="0 0 70 70" className="h-28 w-28 sm:h-40 sm:w-40" aria-hidden="true">
      <path d={SHAPES[shape]} fill="currentColor" fillRule="evenodd" />
    </svg>
  );
}
