import { listWords } from '../shared/list-words';
import type { CampState } from './camp-words';
import type { ChecklistItem } from './checklist-item';
import { dayOffset } from './day-offset';

type CampFacts = { state: CampState; startsOn: string; endsOn: string };

/**
 * The one thing that is next for a camp, in a sentence; null when nothing presses. `items` is the checklist of a draft;
 * `today` the ISO date in the camp's zone.
 */
export function nextStep(camp: CampFacts, items: readonly ChecklistItem[], today: string): string | null {
  if (camp.state === 'draft') {
    const missing = items.filter((item) => item.level === 'must' && item.missing);
    if (missing.length === 0) return 'Ready to publish.';
    const words = missing.map(({ title }) => title.toLowerCase());
    return `Before you publish: ${listWords(words, 'and', 3)}.`;
  }
  const days = dayOffset(today, camp.startsOn);
  if (today > camp.endsOn) return camp.state === 'published' ? 'It is over: close the sale.' : null;
  if (days > 14) return null;
  if (days > 1) return `Begins in ${days} days: look through the people and who still owes.`;
  if (days === 1) return 'Begins tomorrow: try the door on a phone.';
  return days === 0 ? 'Begins today: the door is open.' : 'It is running.';
}
