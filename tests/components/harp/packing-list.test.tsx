import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';
import { HarpRow } from '@/components/harp/harp-row';
import { PackingList } from '@/components/harp/packing-list';
import type { Harp } from '@/lib/domain/harp/harp';
import type { HarpNeed } from '@/lib/domain/harp/harp-ask';
import { buildPackingList } from '@/lib/domain/packing/build-packing-list';
import type { PackingMeeting } from '@/lib/domain/packing/packing-meeting';

const usual = { tuning: 'richter', register: 'standard' } as const;
const a: HarpNeed = {
  level: 'required',
  anyOf: [{ by: 'song', songKey: { tonic: 'E', minor: false }, position: 2, ...usual }],
};
const bFlat: HarpNeed = { level: 'required', anyOf: [{ by: 'harp', labelKey: 'Bb', ...usual }] };
const d: HarpNeed = { level: 'helpful', anyOf: [{ by: 'harp', labelKey: 'D', ...usual }] };

const meeting = (over: Partial<PackingMeeting>): PackingMeeting => ({
  id: 'mtg_1',
  workshop: 'Twelve bars',
  day: '2026-07-14',
  starts: '10:00',
  ends: '11:15',
  room: 'Boat house',
  needs: [a],
  ...over,
});
const shown = (meetings: PackingMeeting[], owned: Harp[] = []): string =>
  renderToStaticMarkup(
    <PackingList list={buildPackingList({ meetings, owned })} help="Write to the organiser." />,
  );
const headings = (html: string) => [...html.matchAll(/<h2[^>]*>([^<]*)/g)].map(([, text]) => text);

describe('packing list on the page', () => {
  test('splits what one has from what to get, and leaves out empty parts', () => {
    const meetings = [meeting({ needs: [a, bFlat, d] })];
    expect(headings(shown(meetings, [{ root: 'A', ...usual }]))).toEqual([
      'To get before camp',
      'Pack from your own',
      'Helpful, not required',
      'Day by day',
    ]);
    expect(headings(shown([meeting({})]))).toEqual(['To get before camp', 'Day by day']);
  });

  test('says song, position and harp; key to the eye and to the ear', () => {
    const html = shown([meeting({ needs: [a, bFlat] })]);
    expect(html).toContain('song in E, 2nd position → A harp');
    expect(html).toContain(
      '<span aria-hidden="true">Bb</span><span class="sr-only select-none">B flat</span>',
    );
  });

  test('a workshop that meets twice is told once, with both times', () => {
    const html = shown([meeting({}), meeting({ id: 'mtg_2', day: '2026-07-15' })]);
    expect(html.match(/song in E, 2nd position/g)).toHaveLength(1);
    expect(html).toContain('first on Tue 14 July, 10:00');
    expect(html).toContain('dateTime="2026-07-15T10:00"');
  });

  test('help with getting a harp only where there is one to get', () => {
    expect(shown([meeting({})])).toContain('Write to the organiser.');
    expect(shown([meeting({})], [{ root: 'A', ...usual }])).not.toContain('Write to the organiser.');
  });

  test('empty and any-key lists say so', () => {
    expect(shown([])).toContain('None of your workshops asks for a harp so far.');
    const html = shown([meeting({ needs: [{ level: 'required', anyOf: [], note: 'slow ones first' }] })]);
    expect(html).toContain('Your workshops work with a harp in any key.');
    expect(html).toContain('Any key');
    expect(html).toContain('slow ones first');
  });

  test('what people typed stays text', () => {
    const html = shown([meeting({ workshop: '<img src=x onerror=alert(1)>', room: '<b>Loft</b>' })]);
    expect(html).not.toMatch(/<img|<b>/);
    expect(html).toContain('&lt;b&gt;Loft&lt;/b&gt;');
  });

  test('the hygiene sentence is always there', () => {
    expect(shown([])).toContain('never share one');
  });
});

test('a row of harps is a named list in pitch order, each once', () => {
  const harps: Harp[] = [
    { root: 'F', ...usual },
    { root: 'F', tuning: 'richter', register: 'low' },
    { root: 'A', ...usual },
    { root: 'F', ...usual },
  ];
  const html = renderToStaticMarkup(<HarpRow harps={harps} label="Harps of the Blue track" />);
  expect(html).toContain('<ul aria-label="Harps of the Blue track"');
  expect([...html.matchAll(/<span>([^<]+)<\/span>/g)].map(([, label]) => label)).toEqual(['Low F', 'A', 'F']);
});
