import type { Harp } from './harp';
import type { Breath, Hole } from './hole';
import { holeOneMidi } from './hole-one';
import { type Hz, midiToHz } from './hz';
import { type Midi, midi } from './midi';
import { rootName } from './root-name';
import { spellNote } from './spell-note';
import { TUNING_LAYOUTS } from './tuning-layout';

/** A note as it is named, counted and heard. */
export type Pitch = { note: string; midi: Midi; hz: Hz };

/** Depth in semitones below the unbent note: 1 half step, 2 whole step, 3 step and a half. */
export type Bend = Pitch & { breath: Breath; depth: number };

/** An overblow or overdraw. `repeats`: the harp has this pitch elsewhere, so it gains no new note. */
export type Overbend = Pitch & { breath: Breath; repeats: boolean };

export type HoleNotes = {
  hole: Hole;
  blow: Pitch;
  draw: Pitch;
  /** Shallow to deep; empty where the reeds lie a half step or less apart. */
  bends: Bend[];
  overbend: Overbend | null;
  /** With the button held, on a chromatic. */
  slide: { blow: Pitch; draw: Pitch } | null;
};

/** The higher reed bends to a semitone above the lower one, so a half step between them leaves nothing to bend. */
export const bendDepth = (blow: number, draw: number): number => Math.max(0, Math.abs(blow - draw) - 1);

/** Every note of a harp, hole by hole; none for a tremolo (see `TUNING_LAYOUTS`). `a4` in Hz. */
export function noteMap(harp: Harp, a4 = 440): HoleNotes[] {
  const layout = TUNING_LAYOUTS[harp.tuning];
  if (!layout) return [];
  const base = holeOneMidi(harp);
  const name = rootName(harp);
  const pitch = (offset: number, keepLetter: boolean): Pitch => {
    const note = midi(base + offset);
    return { note: spellNote(name, offset, note, keepLetter), midi: note, hz: midiToHz(note, a4) };
  };
  const reeds = layout.blow.map((blow, index) => ({ blow, draw: layout.draw[index] ?? blow }));
  const bent = reeds.map(({ blow, draw }) =>
    Array.from({ length: layout.bends ? bendDepth(blow, draw) : 0 }, (_, i) => Math.max(blow, draw) - i - 1),
  );
  const sounded = new Set([...reeds.flatMap(({ blow, draw }) => [blow, draw]), ...bent.flat()]);

  return reeds.map(({ blow, draw }, index): HoleNotes => {
    const high: Breath = draw > blow ? 'draw' : 'blow';
    // An overbend closes the higher reed and opens the lower one, with the other breath.
    const over = Math.max(blow, draw) + 1;
    const overBreath: Breath = high === 'draw' ? 'blow' : 'draw';
    return {
      hole: (index + 1) as Hole,
      blow: pitch(blow, true),
      draw: pitch(draw, true),
      bends: (bent[index] ?? []).map((offset, i) => ({
        ...pitch(offset, false),
        breath: high,
        depth: i + 1,
      })),
      overbend: layout.bends
        ? { ...pitch(over, false), breath: overBreath, repeats: sounded.has(over) }
        : null,
      slide: layout.slide ? { blow: pitch(blow + 1, false), draw: pitch(draw + 1, false) } : null,
    };
  });
}
