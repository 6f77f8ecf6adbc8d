import 'server-only';

/** Work that comes round: `run` does what is due at `now` and says how many things it did. It must bear being done twice. */
export type Job = { name: string; everyMs: number; run: (now: number) => Promise<number> | number };
