import { holdPlaces } from '@/lib/server/registration/hold-places';

// One process of the race: presses the button for each of its drafts as fast as it can and says how it went.
const tokens = (process.argv[2] ?? '').split(',');
process.once('message', () => {
  const told: Record<string, number> = {};
  for (const token of tokens) {
    let outcome: string;
    try {
      const held = holdPlaces(token, 'cmp_1', null, Date.now());
      outcome = held.ok ? 'held' : held.error.code;
    } catch (error) {
      outcome = `error: ${error instanceof Error ? error.message : String(error)}`;
    }
    told[outcome] = (told[outcome] ?? 0) + 1;
  }
  process.send?.(told, () => process.exit(0));
});
process.send?.('ready');
