import ICAL from 'ical.js';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import { GET as getCalendar } from '@/app/(public)/camps/[slug]/calendar.ics/route';
import { GET as getPlaces } from '@/app/api/camps/[slug]/places/route';
import { meeting } from '@/db/schema/workshop';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildRegistration } from '../../builders/build-registration';
import { buildWorkshop } from '../../builders/build-workshop';
import { useTestDatabase } from '../../setup/test-database';

let sent = new Headers();
vi.mock('next/headers', () => ({
  headers: async () => sent,
  cookies: async () => ({ get: () => undefined }),
}));

const at = useTestDatabase();
beforeEach(() => {
  sent = new Headers();
});

const ask = (get: typeof getPlaces, slug: string, headers: Record<string, string> = {}) => {
  sent = new Headers(headers);
  return get(new Request(`http://localhost:3000/x/${slug}`, { headers }), {
    params: Promise.resolve({ slug }),
  });
};

describe('live places', () => {
  test('says what is left, and nothing about who took it', async () => {
    const ids = buildCamp(at.db);
    buildRegistration(at.db, { ...ids, trackId: ids.benders, name: 'Łucja Øverland' });
    const answer = await ask(getPlaces, 'kettle-lake-1');
    const text = await answer.text();
    expect(answer.status).toBe(200);
    expect(JSON.parse(text)).toEqual({
      camp: { left: 59, of: 60 },
      tracks: { trk_1a: { left: 40, of: 40 }, trk_1b: { left: 39, of: 40 } },
    });
    expect(text).not.toContain('Łucja');
    expect(answer.headers.get('cache-control')).toBe('public, max-age=5');
  });

  test('answers 304 to the same tag, and anew once a place is gone (RFC 9110, 13.1.2)', async () => {
    const ids = buildCamp(at.db);
    const etag = (await ask(getPlaces, 'kettle-lake-1')).headers.get('etag') ?? '';
    expect(etag).toMatch(/^"[\w-]{22}"$/);
    expect((await ask(getPlaces, 'kettle-lake-1', { 'if-none-match': `"old", W/${etag}` })).status).toBe(304);
    buildRegistration(at.db, { ...ids, trackId: ids.benders });
    expect((await ask(getPlaces, 'kettle-lake-1', { 'if-none-match': etag })).status).toBe(200);
  });

  test.each([
    ['a draft', 'kettle-lake-1', 404],
    ['an unknown camp', 'nothing', 404],
    ['what is no address', '../../etc', 400],
    ['an address too long', 'a'.repeat(500), 400],
  ])('hides %s', async (_, slug, status) => {
    buildCamp(at.db, { state: 'draft' });
    const answer = await ask(getPlaces, slug);
    expect(answer.status).toBe(status);
    expect(answer.headers.get('content-type')).toBe('application/problem+json');
    expect((await ask(getCalendar, slug)).status).toBe(status);
  });
});

test('the calendar feed has the camp’s meetings and is cached by its tag', async () => {
  const ids = buildCamp(at.db);
  buildWorkshop(at.db, { id: 'wsh_1', title: 'Bends, slowly', trackIds: [ids.benders] });
  at.db
    .insert(meeting)
    .values({
      id: 'mtg_1',
      campId: ids.campId,
      workshopId: 'wsh_1',
      roomId: ids.barn,
      day: '2026-06-09',
      starts: '09:30',
      lengthMinutes: 75,
      sequence: 2,
      updatedAt: NOW,
    })
    .run();
  const answer = await ask(getCalendar, 'kettle-lake-1');
  const text = await answer.text();
  expect(answer.headers.get('content-type')).toBe('text/calendar; charset=utf-8');
  const events = new ICAL.Component(ICAL.parse(text))
    .getAllSubcomponents('vevent')
    .map((e) => new ICAL.Event(e));
  expect(events.map(({ uid, summary, sequence }) => [uid, summary, sequence])).toEqual([
    ['mtg_1@combwood', 'Bends, slowly', 2],
  ]);
  const etag = answer.headers.get('etag') ?? '';
  expect((await ask(getCalendar, 'kettle-lake-1', { 'if-none-match': etag })).status).toBe(304);
});
