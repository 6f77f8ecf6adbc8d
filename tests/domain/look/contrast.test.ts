import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';

const css = readFileSync('app/globals.css', 'utf8');

/** The `--name: #rrggbb` pairs of the first rule that follows `start`. */
function tokens(start: string): Record<string, string> {
  const from = css.indexOf(start);
  const rule = css.slice(css.indexOf(':root {', from), css.indexOf('}', css.indexOf(':root {', from)));
  return Object.fromEntries([...rule.matchAll(/--([a-z-]+):\s*(#[0-9a-f]{6})/g)].map((m) => [m[1], m[2]]));
}

/** WCAG 2.2, definition of relative luminance (sRGB, threshold 0.04045). */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const channel = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

/** WCAG 2.2, definition of contrast ratio. */
function ratio(a: string, b: string): number {
  const [high = 0, low = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (high + 0.05) / (low + 0.05);
}

// Text on ground, and what it must reach: 7 for what is read at length (1.4.6), 4.5 for the rest (1.4.3), 3 for edges
// and shapes that carry meaning (1.4.11).
const PAIRS: [ink: string, ground: string, least: number][] = [
  ['ink', 'board', 7],
  ['ink', 'panel', 7],
  ['soft', 'board', 7],
  ['soft', 'panel', 7],
  ['pine', 'board', 4.5],
  ['pine', 'panel', 4.5],
  ['on-pine', 'pine', 4.5],
  ['reed', 'board', 4.5],
  ['reed', 'panel', 4.5],
  ['board', 'reed', 4.5],
  ['moss', 'board', 4.5],
  ['moss', 'panel', 4.5],
  ['lake', 'board', 4.5],
  ['lake', 'panel', 4.5],
  ['on-brass', 'brass', 7],
  ['edge', 'board', 3],
  ['edge', 'panel', 3],
  // The strip: a hole shows the board, or brass with a reed across.
  ['board', 'pine', 3],
];

test('the formula gives the published ends and a published middle', () => {
  expect(ratio('#000000', '#ffffff')).toBe(21);
  // WCAG 2.2 technique G18 names #767676 on white as the lightest grey that passes 4.5:1 (value common in practice).
  expect(ratio('#767676', '#ffffff')).toBeGreaterThan(4.5);
  expect(ratio('#777777', '#ffffff')).toBeLessThan(4.5);
});

describe.each([
  ['day', tokens('/* Two inks')],
  ['night', { ...tokens('/* Two inks'), ...tokens('@media (prefers-color-scheme: dark)') }],
])('by %s', (_, colour) => {
  test('all tokens are there', () => {
    expect(Object.keys(colour).length).toBeGreaterThanOrEqual(13);
  });
  test.each(PAIRS)('%s on %s reaches %f', (ink, ground, least) => {
    const text = colour[ink];
    const under = colour[ground];
    if (!text || !under) throw new Error(`No such token: ${ink} or ${ground}`);
    expect(ratio(text, under)).toBeGreaterThanOrEqual(least);
  });
});
