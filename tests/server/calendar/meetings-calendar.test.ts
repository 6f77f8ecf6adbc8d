import ICAL from 'ical.js';
import { Temporal } from 'temporal-polyfill';
import { describe, expect, test } from 'vitest';
import { meetingsCalendar } from '@/lib/server/calendar/meetings-calendar';
import { buildProgramme, meetingOf } from '../../builders/build-programme';

const URL = 'https://camps.example.test/camps/kettle-lake-2026';

/** Reads the text back with ical.js, which knows only the zones that the text itself brings. */
function read(text: string) {
  const root = new ICAL.Component(ICAL.parse(text));
  ICAL.TimezoneService.reset();
  for (const zone of root.getAllSubcomponents('vtimezone')) ICAL.TimezoneService.register(zone);
  return { root, events: root.getAllSubcomponents('vevent').map((event) => new ICAL.Event(event)) };
}

const calendarOf = (programme: ReturnType<typeof buildProgramme>) =>
  meetingsCalendar({ programme, meetings: programme.meetings, name: programme.camp.name, url: URL });

describe('the calendar of a programme (RFC 5545, read back by ical.js)', () => {
  test('has one event a meeting with stable id, sequence, place and words', () => {
    const programme = buildProgramme({
      meetings: [meetingOf('wsh_1a', 'mtg_1a', { sequence: 3 })],
    });
    const { root, events } = read(calendarOf(programme));
    const [event] = events;
    expect(root.getFirstPropertyValue('version')).toBe('2.0');
    expect(root.getFirstPropertyValue('prodid')).toContain('Combwood');
    expect(events).toHaveLength(1);
    expect(event?.uid).toBe('mtg_1a@combwood');
    expect(event?.sequence).toBe(3);
    expect(event?.summary).toBe('Bends in crossharp');
    expect(event?.location).toBe('Hall, Kettle Lake Hall, 1 Lake Road');
    expect(event?.description).toBe(
      'With Ana Teixeira.\nHarps: song in E, 2nd position → A harp or D harp.\nSlow and clean.',
    );
    expect(event?.startDate.toString()).toBe('2026-06-09T09:30:00');
    expect(event?.startDate.zone?.tzid).toBe('Europe/Berlin');
    // 09:30 in Berlin in June is UTC+2.
    expect(event?.startDate.toUnixTime()).toBe(Date.UTC(2026, 5, 9, 7, 30) / 1000);
    expect(event?.endDate.toUnixTime()).toBe(Date.UTC(2026, 5, 9, 8, 45) / 1000);
  });

  test('lets a jam run past midnight into the next day', () => {
    const { events } = read(calendarOf(buildProgramme()));
    const jam = events.find((event) => event.uid === 'mtg_1b@combwood');
    expect(jam?.startDate.toString()).toBe('2026-06-09T23:00:00');
    expect(jam?.endDate.toString()).toBe('2026-06-10T01:00:00');
  });

  test('escapes what titles and places may hold, and lets no line in (ASVS 1.2.1)', () => {
    const title = 'Blues; "slow", \\ then fast\r\nBEGIN:VALARM\r\nÆ 日本 🎵'.repeat(3);
    const programme = buildProgramme({ camp: { venueName: 'Hall, upper; left\nATTENDEE:x' } });
    programme.workshops = programme.workshops.map((workshop) => ({ ...workshop, title, description: title }));
    const text = calendarOf(programme);
    const { root, events } = read(text);
    expect(events).toHaveLength(2);
    expect(events[0]?.summary).toBe(title.replace(/\s+/g, ' '));
    expect(events[0]?.location).toBe('Hall, Hall, upper; left ATTENDEE:x, 1 Lake Road');
    expect(events[0]?.description).toContain('BEGIN:VALARM');
    expect(root.getAllSubcomponents('vevent')[0]?.getAllSubcomponents('valarm')).toEqual([]);
    // 3.1: lines end in CRLF and are at most 75 octets.
    expect(text.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/);
    for (const line of text.split('\r\n')) expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);
  });

  test('is the same text for the same programme, and another when a meeting moves', () => {
    const programme = buildProgramme();
    expect(calendarOf(programme)).toBe(calendarOf(structuredClone(programme)));
    const [first] = programme.meetings;
    if (first) first.starts = '11:00';
    expect(calendarOf(programme)).not.toBe(calendarOf(buildProgramme()));
  });

  // IANA tz: New York springs forward on 2026-03-08 and falls back on 11-01; Lord Howe moves half an hour on 10-04.
  test.each([
    ['America/New_York', '2026-03-08', '01:30', 60, '2026-03-08T06:30Z', '2026-03-08T07:30Z'],
    ['America/New_York', '2026-03-08', '03:30', 60, '2026-03-08T07:30Z', '2026-03-08T08:30Z'],
    ['America/New_York', '2026-11-01', '01:30', 15, '2026-11-01T05:30Z', '2026-11-01T05:45Z'],
    ['America/New_York', '2026-11-01', '00:30', 120, '2026-11-01T04:30Z', '2026-11-01T06:30Z'],
    ['America/New_York', '2026-11-01', '02:30', 60, '2026-11-01T07:30Z', '2026-11-01T08:30Z'],
    ['Australia/Lord_Howe', '2026-10-04', '01:30', 60, '2026-10-03T15:00Z', '2026-10-03T16:00Z'],
    ['Australia/Lord_Howe', '2026-10-04', '03:00', 60, '2026-10-03T16:00Z', '2026-10-03T17:00Z'],
    ['Asia/Kolkata', '2026-10-04', '10:00', 60, '2026-10-04T04:30Z', '2026-10-04T05:30Z'],
    ['UTC', '2026-10-04', '10:00', 60, '2026-10-04T10:00Z', '2026-10-04T11:00Z'],
  ])('in %s on %s at %s', (timeZone, day, starts, lengthMinutes, from, to) => {
    const programme = buildProgramme({
      camp: { timeZone, startsOn: day, endsOn: day },
      meetings: [meetingOf('wsh_1a', 'mtg_1a', { day, starts, lengthMinutes })],
    });
    const [event] = read(calendarOf(programme)).events;
    expect(event?.startDate.toUnixTime()).toBe(Date.parse(from) / 1000);
    expect(event?.endDate.toUnixTime()).toBe(Date.parse(to) / 1000);
  });

  test('every zone this runtime knows is read back to the same instants, across a whole year', () => {
    const days = [
      '2026-01-15',
      '2026-03-29',
      '2026-04-05',
      '2026-07-15',
      '2026-10-25',
      '2026-11-01',
      '2026-12-31',
    ];
    for (const timeZone of Intl.supportedValuesOf('timeZone')) {
      const meetings = days.map((day, index) =>
        meetingOf('wsh_1a', `mtg_1${index}`, { day, starts: '12:00' }),
      );
      const programme = buildProgramme({
        camp: { timeZone, startsOn: '2026-01-15', endsOn: '2026-12-31' },
        meetings,
      });
      const { events } = read(calendarOf(programme));
      const got = events.map((event) => event.startDate.toUnixTime() * 1000);
      const want = days.map(
        (day) => Temporal.PlainDateTime.from(`${day}T12:00`).toZonedDateTime(timeZone).epochMilliseconds,
      );
      expect(got, timeZone).toEqual(want);
    }
  });
});
