import { listWords } from '../shared/list-words';
import { changeoverMinutes } from '../timetable/changeover';
import { isRefused } from '../timetable/clash';
import { clashSentence } from '../timetable/clash-sentence';
import { findClashes } from '../timetable/find-clashes';
import type { Programme, ProgrammeWorkshop } from '../timetable/programme';
import type { ChecklistItem } from './checklist-item';
import { saleItems } from './missing-for-sale';

/** Names in a sentence: three, then a count. */
const named = (rows: readonly { name?: string; title?: string }[]): string =>
  listWords(
    rows.map((row) => row.name ?? row.title ?? ''),
    'and',
    3,
  );

const have = (count: number): string => (count === 1 ? 'has' : 'have');

/**
 * What stands between a camp and its public page, `must` first and in the order in which one would mend it. `today` is
 * the ISO date in the camp's zone.
 */
export function publishChecklist(programme: Programme, today: string): ChecklistItem[] {
  const clashes = clashItems(programme);
  const { tracks, workshops, meetings } = programme;
  // A rule about nothing is neither missing nor done.
  const about = (rows: readonly unknown[], codes: readonly string[]) => (rows.length === 0 ? codes : []);
  const moot = [
    ...about(tracks, ['gates', 'core-workshops', 'track-places']),
    ...about(workshops, ['core-meetings', 'meetings', 'elective-places', 'instructors', 'harps']),
    ...about(meetings, ['meeting-days', 'clashes', 'fit']),
  ];
  return [
    ...dateItems(programme, today),
    ...saleItems(programme),
    ...programmeItems(programme),
    ...clashes.musts,
    ...adviceItems(programme),
    ...clashes.shoulds,
  ].filter(({ code }) => !moot.includes(code));
}

/** True when nothing that must be there is missing. */
export const mayPublish = (items: readonly ChecklistItem[]): boolean =>
  items.every(({ level, missing }) => level === 'should' || missing === null);

const must = (
  code: string,
  title: string,
  mend: ChecklistItem['mend'],
  missing: string | false,
): ChecklistItem => ({ code, level: 'must', title, mend, missing: missing || null });

const should = (...args: Parameters<typeof must>): ChecklistItem => ({ ...must(...args), level: 'should' });

function dateItems({ camp }: Programme, today: string): ChecklistItem[] {
  return [
    must(
      'dates',
      'Dates',
      'details',
      camp.endsOn < today && `The camp ended on ${camp.endsOn}. Give it new dates.`,
    ),
  ];
}

function programmeItems({ tracks, rooms, workshops, meetings }: Programme): ChecklistItem[] {
  const ungated = tracks.filter(({ gate }) => !gate);
  const coreless = tracks.filter(
    ({ id }) => !workshops.some(({ audience, trackIds }) => audience === 'core' && trackIds.includes(id)),
  );
  const unplaced = unmet(workshops, meetings, true);
  return [
    must(
      'gates',
      'Gates',
      'tracks',
      ungated.length > 0 &&
        `${named(ungated)} ${have(ungated.length)} no gate: say what a player must already do.`,
    ),
    must('rooms', 'Rooms', 'rooms', rooms.length === 0 && 'There is no room to meet in.'),
    must(
      'core-workshops',
      'Core workshops',
      'workshops',
      coreless.length > 0 && `${named(coreless)} ${have(coreless.length)} no core workshop.`,
    ),
    must(
      'core-meetings',
      'Core meetings',
      'timetable',
      unplaced.length > 0 && `${named(unplaced)} ${have(unplaced.length)} no time and room yet.`,
    ),
  ];
}

const unmet = (
  workshops: readonly ProgrammeWorkshop[],
  meetings: Programme['meetings'],
  core: boolean,
): ProgrammeWorkshop[] =>
  workshops.filter(
    ({ id, audience }) =>
      (audience === 'core') === core && !meetings.some(({ workshopId }) => workshopId === id),
  );

function clashItems(programme: Programme): { musts: ChecklistItem[]; shoulds: ChecklistItem[] } {
  const found = findClashes(programme, changeoverMinutes(programme.blocks));
  const say = (clashes: typeof found): string | false => {
    const [first, ...rest] = clashes;
    if (!first) return false;
    return `${clashSentence(first, programme)}${rest.length > 0 ? ` And ${rest.length} more.` : ''}`;
  };
  const outside = found.filter(({ kind }) => kind === 'outside-days');
  const hard = found.filter((clash) => isRefused(clash) && clash.kind !== 'outside-days');
  const soft = found.filter((clash) => !isRefused(clash));
  return {
    musts: [
      must('meeting-days', 'Days of meetings', 'timetable', say(outside)),
      must('clashes', 'Clashes', 'timetable', say(hard)),
    ],
    shoulds: [should('fit', 'Rooms that fit', 'timetable', say(soft))],
  };
}

/** Kinds that have a teacher; at a jam or a concert there may be none. */
const TAUGHT: readonly ProgrammeWorkshop['kind'][] = [
  'technique',
  'theory',
  'band-lab',
  'repair-bench',
  'one-to-one',
];

function adviceItems({ camp, tracks, workshops, meetings, pictures }: Programme): ChecklistItem[] {
  const seats = tracks.reduce((sum, { capacity }) => sum + capacity, 0);
  const unplaced = unmet(workshops, meetings, false);
  const open = workshops.filter(({ audience, capacity }) => audience === 'elective' && capacity === null);
  const untaught = workshops.filter(
    ({ kind, instructorIds }) => TAUGHT.includes(kind) && instructorIds.length === 0,
  );
  const unsaid = workshops.filter(({ kind, needs }) => kind === 'technique' && needs.length === 0);
  return [
    should(
      'summary',
      'Summary',
      'details',
      !camp.summary && 'One sentence for lists and shared links is missing.',
    ),
    should(
      'description',
      'Description',
      'details',
      !camp.description && 'Players read nothing about the camp yet.',
    ),
    should('pictures', 'Pictures', 'pictures', pictures.length === 0 && 'There is no picture yet.'),
    should(
      'track-places',
      'Places in tracks',
      'tracks',
      tracks.length > 0 &&
        seats < camp.capacity &&
        `The tracks hold ${seats} together, the camp ${camp.capacity}: ${camp.capacity - seats} can never be sold.`,
    ),
    should(
      'meetings',
      'Other meetings',
      'timetable',
      unplaced.length > 0 && `${named(unplaced)} ${have(unplaced.length)} no time and room yet.`,
    ),
    should(
      'elective-places',
      'Places in electives',
      'workshops',
      open.length > 0 &&
        `${named(open)} ${have(open.length)} no limit, so more may choose than the room seats.`,
    ),
    should(
      'instructors',
      'Instructors',
      'workshops',
      untaught.length > 0 && `${named(untaught)} ${have(untaught.length)} no instructor.`,
    ),
    should(
      'harps',
      'Harps',
      'workshops',
      unsaid.length > 0 &&
        `${named(unsaid)} ${unsaid.length === 1 ? 'says' : 'say'} nothing about harps to bring.`,
    ),
  ];
}
