import 'server-only';
import { changeoverMinutes } from '@/lib/domain/timetable/changeover';
import { type Clash, isRefused } from '@/lib/domain/timetable/clash';
import { clashSentence } from '@/lib/domain/timetable/clash-sentence';
import { findClashes } from '@/lib/domain/timetable/find-clashes';
import type { Programme } from '@/lib/domain/timetable/programme';

const refused = (programme: Programme): Clash[] =>
  findClashes(programme, changeoverMinutes(programme.blocks)).filter(isRefused);

/** Sentences of the clashes that cannot stand and that an edit brought in; those that were there are left alone. */
export function newClashes(before: Programme, after: Programme): string[] {
  const known = new Set(refused(before).map((clash) => JSON.stringify(clash)));
  return refused(after)
    .filter((clash) => !known.has(JSON.stringify(clash)))
    .map((clash) => clashSentence(clash, after));
}
