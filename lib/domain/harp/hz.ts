import type { Brand } from '../shared/brand';
import type { Midi } from './midi';

/** A frequency in hertz. */
export type Hz = Brand<number, 'Hz'>;

/** Equal temperament: a4 · 2^((m − 69) / 12). `a4` is the pitch of A4 in Hz, 440 by ISO 16. */
export const midiToHz = (note: Midi, a4 = 440): Hz => (a4 * 2 ** ((note - 69) / 12)) as Hz;

/** How far `sounded` lies above `target`, in hundredths of a semitone; negative is flat. */
export const centsAbove = (sounded: number, target: number): number => 1200 * Math.log2(sounded / target);

/** Quarter wavelength in centimetres at 343 m/s: a relative index of how much room a bend takes, not anatomy. */
export const quarterWaveCm = (hz: number): number => 34_300 / (4 * hz);
