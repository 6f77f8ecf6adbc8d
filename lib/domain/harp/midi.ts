import type { Brand } from '../shared/brand';

/** A pitch as a MIDI note number: middle C (C4) is 60, A4 is 69. */
export type Midi = Brand<number, 'Midi'>;

export function midi(value: number): Midi {
  if (!Number.isInteger(value) || value < 0 || value > 127) throw new RangeError(`Not a MIDI note: ${value}`);
  return value as Midi;
}
