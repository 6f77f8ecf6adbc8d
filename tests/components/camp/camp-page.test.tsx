import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';
import { CampPage } from '@/components/camp/camp-page';
import type { CampStanding } from '@/lib/domain/camp/camp-standing';
import { buildProgramme, CLASS, meetingOf } from '../../builders/build-programme';

const places = {
  camp: { capacity: 60, taken: 48, left: 12 },
  tracks: [
    { id: 'trk_1a' as const, places: { capacity: 40, taken: 40, left: 0 } },
    { id: 'trk_1b' as const, places: { capacity: 40, taken: 8, left: 32 } },
  ],
  electives: [],
};
const render = (programme = buildProgramme(), standing: CampStanding = 'open') =>
  renderToStaticMarkup(<CampPage programme={programme} places={places} standing={standing} />);

describe('the camp page', () => {
  test('shows the real programme: dates, price, places, tracks, harps and why', () => {
    const html = render();
    for (const words of [
      'Kettle Lake Harp Week',
      '8–12 June 2026',
      'Europe/Berlin',
      '€460.00',
      '12 of 60 places left',
      'Full',
      '32 of 40 places left',
      'Bends 4 draw.',
      'Level: Bending',
      'song in E, 2nd position → A harp',
      'A position says how a song lies on the harp.',
      'Ana Teixeira',
      'Until 60 days before: all but 50 EUR.',
      'office@slateridge.example',
      'light-headed',
      'Late jam',
    ])
      expect(html).toContain(words);
    expect(html).toContain('href="/camps/kettle-lake-2026/register/who"');
    expect(html).toContain('href="/camps/kettle-lake-2026/calendar.ics"');
  });

  test.each([
    ['full', 'Every place is taken'],
    ['closed', 'Registration is closed'],
    ['begun', 'The camp is running'],
    ['past', 'This camp is over'],
    ['draft', 'Only your organisation sees this page'],
  ] as const)('a camp that is %s says so and sells nothing', (standing, words) => {
    const html = render(buildProgramme(), standing);
    expect(html).toContain(words);
    expect(html).not.toContain('/register/');
  });

  test('prints what people typed and never runs it (ASVS 1.2.1)', () => {
    const evil = '<img src=x onerror=alert(1)>"\'&';
    const programme = buildProgramme({
      camp: {
        name: evil,
        summary: evil,
        description: evil,
        venueName: evil,
        venueAddress: evil,
        refundTerms: evil,
        organisationName: evil,
      },
      instructors: [{ id: 'ins_1a', name: evil, bio: evil }],
      tracks: [{ id: 'trk_1b', name: evil, level: 'bending', gate: evil, capacity: 4, price: null }],
      workshops: [
        { ...CLASS, title: evil, description: evil, needs: CLASS.needs.map((n) => ({ ...n, note: evil })) },
      ],
      meetings: [meetingOf('wsh_1a', 'mtg_1a')],
      pictures: [{ id: 'pic_1', alt: evil, width: 40, height: 30 }],
    });
    const html = render(programme);
    expect(html).not.toMatch(/<img src=x/);
    expect(html.match(/&lt;img src=x onerror=alert\(1\)&gt;/g)?.length).toBeGreaterThan(12);
  });

  test('stands without tracks, workshops, meetings or a price', () => {
    const html = render(
      buildProgramme({
        camp: { price: null, summary: '', description: '', venueName: '', venueAddress: '', refundTerms: '' },
        tracks: [],
        workshops: [],
        meetings: [],
        instructors: [],
      }),
    );
    expect(html).toContain('The times are still being set');
    expect(html).toContain('To be told');
  });
});
