import fc from 'fast-check';
import { Temporal } from 'temporal-polyfill';
import { expect, test } from 'vitest';
import type { Clash } from '@/lib/domain/timetable/clash';
import { findClashes } from '@/lib/domain/timetable/find-clashes';
import { CAMP, input, meeting, ROOMS, TRACKS, workshop } from './programme-parts';

const ZONES = ['Europe/Berlin', 'America/New_York', 'Australia/Lord_Howe', 'UTC'] as const;
// Around the clock changes of 2026 in New York and on Lord Howe, and an ordinary week.
const DAYS = ['2026-03-07', '2026-03-08', '2026-06-08', '2026-10-03', '2026-10-04', '2026-11-01'] as const;

const workshops = fc
  .array(
    fc.record({
      kind: fc.constantFrom('technique', 'jam', 'theory', 'concert'),
      audience: fc.constantFrom('core', 'elective', 'everyone'),
      capacity: fc.option(fc.integer({ min: 1, max: 90 })),
      trackIds: fc.subarray(TRACKS.map(({ id }) => id)),
      instructorIds: fc.subarray(['ins_ana', 'ins_bo', 'ins_cy'] as `ins_${string}`[]),
    }),
    { minLength: 1, maxLength: 6 },
  )
  .map((list) => list.map((more, at) => workshop(`w${at}`, more as Partial<ReturnType<typeof workshop>>)));
const timetable = workshops.chain((list) =>
  fc.record({
    workshops: fc.constant(list),
    timeZone: fc.constantFrom(...ZONES),
    changeover: fc.constantFrom(0, 5, 15),
    meetings: fc
      .array(
        fc.record({
          of: fc.nat(list.length - 1),
          roomId: fc.constantFrom(...ROOMS.map(({ id }) => id)),
          day: fc.constantFrom(...DAYS),
          hour: fc.integer({ min: 0, max: 23 }),
          minute: fc.constantFrom(0, 5, 15, 30, 45),
          lengthMinutes: fc.integer({ min: 1, max: 180 }),
        }),
        { maxLength: 14 },
      )
      .map((rows) =>
        rows.map(({ of, hour, minute, ...more }, at) =>
          meeting(`m${at}`, `w${of}`, {
            ...more,
            starts: `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`,
          }),
        ),
      ),
  }),
);

/** The same question asked the slow way: do any two share a minute of real time, widened by the changeover? */
function naive(of: ReturnType<typeof input>, changeover: number): string[] {
  const said: string[] = [];
  const stamp = (m: (typeof of.meetings)[number]) =>
    Temporal.ZonedDateTime.from(`${m.day}T${m.starts}[${of.camp.timeZone}]`).epochMilliseconds / 60_000;
  for (const a of of.meetings) {
    for (const b of of.meetings) {
      if (a.id >= b.id) continue;
      const distance = Math.max(stamp(a), stamp(b));
      const gap = distance - Math.min(stamp(a) + a.lengthMinutes, stamp(b) + b.lengthMinutes);
      const [x, y] = [a, b].map((m) => of.workshops.find((w) => w.id === m.workshopId));
      if (!x || !y) throw new Error('unknown workshop');
      const overlap =
        gap < 0 && stamp(a) < stamp(b) + b.lengthMinutes && stamp(b) < stamp(a) + a.lengthMinutes;
      const near = overlap || gap < changeover;
      const pair = `${a.id} ${b.id}`;
      if (near && a.roomId === b.roomId) said.push(`room ${pair}`);
      if (near)
        for (const who of x.instructorIds) if (y.instructorIds.includes(who)) said.push(`instructor ${pair}`);
      if (!overlap) continue;
      if (x === y) said.push(`same-workshop ${pair}`);
      else if (x.audience === 'everyone' || y.audience === 'everyone') said.push(`everyone ${pair}`);
      else if (x.audience === 'core' && y.audience === 'core')
        for (const track of x.trackIds) if (y.trackIds.includes(track)) said.push(`track ${pair}`);
    }
  }
  return said.sort();
}

const pairs = (clashes: Clash[]) =>
  clashes
    .flatMap((clash) =>
      'otherId' in clash ? [`${clash.kind} ${[clash.meetingId, clash.otherId].sort().join(' ')}`] : [],
    )
    .sort();

test('finds what a slow check of every pair finds, in any zone', () => {
  fc.assert(
    fc.property(timetable, ({ workshops, meetings, timeZone, changeover }) => {
      const given = input(workshops, meetings, { timeZone });
      expect(pairs(findClashes(given, changeover))).toEqual(naive(given, changeover));
    }),
    { numRuns: 300 },
  );
});

test('the order of the rows never shows, and every meeting outside the days is told', () => {
  fc.assert(
    fc.property(timetable, fc.integer(), ({ workshops, meetings, timeZone, changeover }, turn) => {
      const given = input(workshops, meetings, { timeZone });
      const at = meetings.length ? Math.abs(turn) % meetings.length : 0;
      const turned = [...meetings.slice(at), ...meetings.slice(0, at)].reverse();
      const found = findClashes(given, changeover);
      expect(
        findClashes({ ...given, meetings: turned, workshops: [...workshops].reverse() }, changeover),
      ).toEqual(found);
      const outside = meetings.filter(({ day }) => day < CAMP.startsOn || day > CAMP.endsOn);
      expect(found.filter(({ kind }) => kind === 'outside-days')).toHaveLength(outside.length);
    }),
    { numRuns: 100 },
  );
});

test('a longer changeover never loses a clash', () => {
  fc.assert(
    fc.property(timetable, ({ workshops, meetings, timeZone }) => {
      const given = input(workshops, meetings, { timeZone });
      const wide = pairs(findClashes(given, 15));
      for (const clash of pairs(findClashes(given, 0))) expect(wide).toContain(clash);
    }),
    { numRuns: 100 },
  );
});
