type Tone = { hz: number; from: number; seconds: number };

// Told apart with eyes closed: a rising fourth lets in, one low note stops, two level notes ask for a look.
const TONES = {
  in: [
    { hz: 523.25, from: 0, seconds: 0.09 },
    { hz: 698.46, from: 0.09, seconds: 0.16 },
  ],
  stop: [{ hz: 130.81, from: 0, seconds: 0.45 }],
  look: [
    { hz: 329.63, from: 0, seconds: 0.11 },
    { hz: 329.63, from: 0.17, seconds: 0.11 },
  ],
} as const satisfies Record<string, readonly Tone[]>;

export type VerdictSound = keyof typeof TONES;

let context: AudioContext | null = null;

/** Plays one short sign; silent where the browser has no sound or refuses it before a first touch. */
export function playVerdict(sound: VerdictSound): void {
  try {
    context ??= new AudioContext();
    void context.resume();
    for (const { hz, from, seconds } of TONES[sound]) {
      const start = context.currentTime + from;
      const reed = new OscillatorNode(context, { type: 'triangle', frequency: hz });
      const level = new GainNode(context, { gain: 0.25 });
      level.gain.setTargetAtTime(0, start + seconds * 0.7, 0.03);
      reed.connect(level).connect(context.destination);
      reed.start(start);
      reed.stop(start + seconds + 0.1);
    }
  } catch {
    // The word on the screen says it all.
  }
}
