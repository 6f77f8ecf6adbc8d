export const REGISTERS = ['low', 'standard', 'high'] as const;

/** Octave of a harp beside the usual one of its key: a Low F sounds an octave under an F. */
export type Register = (typeof REGISTERS)[number];

/** Semitones away from the standard register. */
export const REGISTER_SHIFT = { low: -12, standard: 0, high: 12 } satisfies Record<Register, number>;
