import type { HarpAsk } from './harp-ask';
import { harpFromAsk } from './harp-from-ask';
import { harpLabel } from './harp-label';
import { positionName } from './position';
import { songKeyName } from './song-key';

/** `song in E, 2nd position → A harp`, or just `A harp`. Both keys always, so that one is not taken for the other. */
export function askSentence(ask: HarpAsk): string {
  const harp = `${harpLabel(harpFromAsk(ask))} harp`;
  if (ask.by === 'harp') return harp;
  return `song in ${songKeyName(ask.songKey)}, ${positionName(ask.position)} position → ${harp}`;
}
