const USUAL_MINUTES = 15;

const minutesOf = (clock: string): number => Number(clock.slice(0, 2)) * 60 + Number(clock.slice(3));

/**
 * Minutes that a room and an instructor need between two meetings: 15, or less where the camp's own blocks lie closer
 * together, so that neighbouring blocks can always both be used. Blocks that overlap say nothing.
 */
export function changeoverMinutes(blocks: readonly { starts: string; ends: string }[]): number {
  const gaps = blocks.flatMap((block) =>
    blocks
      .filter((next) => next.starts >= block.ends && block.ends > block.starts)
      .map((next) => minutesOf(next.starts) - minutesOf(block.ends)),
  );
  return Math.min(USUAL_MINUTES, ...gaps);
}
