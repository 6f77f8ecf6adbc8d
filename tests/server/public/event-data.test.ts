import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import type { Event, WithContext } from 'schema-dts';
import { describe, expect, test } from 'vitest';
import { EventScript } from '@/components/camp/event-script';
import { minor } from '@/lib/domain/shared/money';
import { eventData } from '@/lib/server/camps/event-data';
import { buildProgramme } from '../../builders/build-programme';

const BASE = 'https://camps.example.test';
const places = (left: number) => ({
  camp: { capacity: 60, taken: 60 - left, left },
  tracks: [{ id: 'trk_1a' as const, places: { capacity: 60, taken: 60 - left, left } }],
  electives: [],
});

describe('schema.org Event', () => {
  test('has what the vocabulary asks of an event, with times in the camp’s zone', () => {
    // The type is schema.org's own vocabulary as published by schema-dts: this line compiles or the test does not.
    const data: WithContext<Event> = eventData(
      { programme: buildProgramme(), places: places(12), standing: 'open' },
      BASE,
    );
    expect(data).toMatchObject({
      '@context': 'https://schema.org',
      '@type': 'Event',
      name: 'Kettle Lake Harp Week',
      // Berlin keeps summer time in June: UTC+2.
      startDate: '2026-06-08T14:00:00+02:00',
      endDate: '2026-06-12',
      location: { '@type': 'Place', name: 'Kettle Lake Hall', address: '1 Lake Road' },
      offers: { price: '460.00', priceCurrency: 'EUR', availability: 'https://schema.org/InStock' },
      remainingAttendeeCapacity: 12,
    });
  });

  test('writes prices by the digits of ISO 4217, and none while none is set', () => {
    const yen = buildProgramme({ camp: { currency: 'JPY', price: minor(46_000) } });
    const dinar = buildProgramme({ camp: { currency: 'BHD', price: minor(46_000) } });
    const none = buildProgramme({ camp: { price: null } });
    const of = (programme: ReturnType<typeof buildProgramme>) =>
      eventData({ programme, places: places(1), standing: 'full' }, BASE);
    expect(of(yen)).toMatchObject({ offers: { price: '46000', availability: 'https://schema.org/SoldOut' } });
    expect(of(dinar)).toMatchObject({ offers: { price: '46.000' } });
    expect(of(none)).not.toHaveProperty('offers');
  });

  test('cannot be ended from inside by a name (ASVS 1.2.1)', () => {
    const name = '</script><script>alert(1)</script><!-- “Harp & Co”';
    const data = eventData(
      { programme: buildProgramme({ camp: { name } }), places: places(1), standing: 'open' },
      BASE,
    );
    const html = renderToStaticMarkup(createElement(EventScript, { data, nonce: 'n0' }));
    expect(html.match(/<\/?script/g)).toEqual(['<script', '</script']);
    expect(html).not.toContain('<!--');
    const json = html.replace(/^<script[^>]*>/, '').replace(/<\/script>$/, '');
    expect(JSON.parse(json).name).toBe(name);
  });
});
