import fc from 'fast-check';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';
import { filledHoles } from '@/components/harp/filled-holes';
import { TenHoleStrip } from '@/components/harp/ten-hole-strip';
import { noteMap } from '@/lib/domain/harp/note-map';
import { parseHarpLabel } from '@/lib/domain/harp/parse-harp-label';

const count = (html: string, part: string): number => html.split(part).length - 1;
const holesOf = (label: string) =>
  noteMap(parseHarpLabel(label) ?? { root: 'C', tuning: 'richter', register: 'low' });

describe('places', () => {
  test.each([
    [20, 20, 0],
    [19, 20, 1],
    [13, 20, 3],
    [1, 20, 9],
    [0, 20, 10],
    [1, 300, 9],
    [299, 300, 1],
    [0, 0, 10],
    [5, 3, 0],
  ])('%i of %i left fills %i holes', (left, of, filled) => expect(filledHoles(left, of)).toBe(filled));

  test('never fewer holes when fewer are left, never full before the last place', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 400 }), fc.nat(400), (of, sold) => {
        const left = Math.max(0, of - sold);
        expect(filledHoles(Math.max(0, left - 1), of)).toBeGreaterThanOrEqual(filledHoles(left, of));
        expect(filledHoles(left, of) === 10).toBe(left === 0);
        expect(filledHoles(left, of) === 0).toBe(left === of);
      }),
    );
  });

  test('says in words what it draws, with a reed in each filled hole', () => {
    const html = renderToStaticMarkup(<TenHoleStrip mode="places" left={13} of={20} what="Blue track" />);
    expect(html).toContain('role="img" aria-label="Blue track: 13 of 20 places left"');
    expect(count(html, 'fill-on-brass')).toBe(3);
    expect(renderToStaticMarkup(<TenHoleStrip mode="places" left={0} of={20} />)).toContain(
      'aria-label="full, no places left"',
    );
  });
});

test('steps: done ones are filled, the others keep their number', () => {
  const html = renderToStaticMarkup(
    <TenHoleStrip mode="steps" step={3} names={['Who', 'Track', 'Harps', 'Pay']} />,
  );
  expect(html).toContain('aria-label="Step 3 of 4: Harps"');
  expect(html.match(/>(\d)<\/text>/g)).toEqual(['>3</text>', '>4</text>']);
});

test('the mark without a label is an ornament', () => {
  expect(renderToStaticMarkup(<TenHoleStrip mode="mark" />)).toContain('aria-hidden="true"');
  expect(renderToStaticMarkup(<TenHoleStrip mode="mark" label="Combwood" />)).toContain(
    'aria-label="Combwood"',
  );
});

describe('note map', () => {
  test('tells every note in words too', () => {
    const html = renderToStaticMarkup(<TenHoleStrip mode="notes" label="Bb" holes={holesOf('Bb')} />);
    expect(html).toContain('Notes of the B flat harp, hole by hole');
    expect(html).toContain(
      '<th scope="row">3</th><td>F 4</td><td>A 4</td><td>draw bent a half step: A flat 4; draw bent a whole step: G 4; draw bent a step and a half: G flat 4</td>',
    );
  });

  test('a sounding bend shows its cents, and only there', () => {
    const sounding = { hole: 3, breath: 'draw', depth: 2, cents: -12.4 } as const;
    const html = renderToStaticMarkup(
      <TenHoleStrip mode="notes" label="A" holes={holesOf('A')} sounding={sounding} />,
    );
    expect(count(html, '>-12<')).toBe(1);
    expect(count(html, 'fill-brass')).toBe(1);
  });

  test('a tremolo says why there is none', () => {
    expect(renderToStaticMarkup(<TenHoleStrip mode="notes" label="C tremolo" holes={[]} />)).toContain(
      'There is no note map for C tremolo',
    );
  });
});
