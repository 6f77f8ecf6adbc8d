import 'server-only';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { Font } from '@react-pdf/renderer';
import { unwrapWoff } from './unwrap-woff';

const file = (pack: string, subset: string): string =>
  join(process.cwd(), 'node_modules', '@fontsource', pack, 'files', `${pack}-${subset}-normal.woff`);

// Which letters a family draws, in the order in which a name is tried. The shipped files are subsets by script.
// Vazirmatn for Arabic script: the PDF writer loses letters of faces that draw dots as glyphs of their own.
const SCRIPTS: { family: string; source: string; letters: RegExp }[] = [
  {
    family: 'Latin',
    source: file('atkinson-hyperlegible-next', 'latin-400'),
    letters: /[\0-\xff\u2010-\u2026€→]/u,
  },
  {
    family: 'LatinExt',
    source: file('atkinson-hyperlegible-next', 'latin-ext-400'),
    letters: /[\u0100-\u02ff]/u,
  },
  { family: 'NotoExt', source: file('noto-sans', 'latin-ext-400'), letters: /[\u0100-\u02ff\u1e00-\u1eff]/u },
  {
    family: 'Vietnamese',
    source: file('noto-sans', 'vietnamese-400'),
    letters: /[\u0300-\u036f\u1ea0-\u1ef9Ơ-ư]/u,
  },
  { family: 'Cyrillic', source: file('noto-sans', 'cyrillic-400'), letters: /[\u0400-\u045f\u0490-\u0491]/u },
  { family: 'CyrillicExt', source: file('noto-sans', 'cyrillic-ext-400'), letters: /[\u0460-\u052f]/u },
  { family: 'Greek', source: file('noto-sans', 'greek-400'), letters: /[\u0370-\u03ff]/u },
  { family: 'GreekExt', source: file('noto-sans', 'greek-ext-400'), letters: /[\u1f00-\u1fff]/u },
  { family: 'Devanagari', source: file('noto-sans', 'devanagari-400'), letters: /\p{Script=Devanagari}/u },
  { family: 'Hebrew', source: file('noto-sans-hebrew', 'hebrew-400'), letters: /\p{Script=Hebrew}/u },
  { family: 'Thai', source: file('noto-sans-thai', 'thai-400'), letters: /\p{Script=Thai}/u },
  { family: 'Arabic', source: file('vazirmatn', 'arabic-400'), letters: /\p{Script=Arabic}/u },
];

/** The family for headings and the one for references and times; both draw Latin letters only. */
export const HEAD_FAMILY = 'Head';
export const MONO_FAMILY = 'Mono';
const LAST_RESORT = 'Unifont';

let registered = false;
function registerFonts(): void {
  if (registered) return;
  registered = true;
  for (const { family, source } of SCRIPTS) Font.register({ family, src: source });
  Font.register({ family: HEAD_FAMILY, src: file('bricolage-grotesque', 'latin-700') });
  Font.register({ family: MONO_FAMILY, src: file('atkinson-hyperlegible-mono', 'latin-400') });
  // Words are never parted by a hyphen: names and addresses stay as people write them.
  Font.registerHyphenationCallback((word) => [word]);
}

let lastResort = false;
/** Every other letter there is, in one 16-dot face: plain to look at, but no name is dropped. Read on first need. */
function registerLastResort(): void {
  if (lastResort) return;
  lastResort = true;
  const ttf = unwrapWoff(readFileSync(file('unifontex', 'latin-400')));
  Font.register({ family: LAST_RESORT, src: `data:font/ttf;base64,${ttf.toString('base64')}` });
}

/** The families that draw a text, each letter by the first that has it. */
export function familiesFor(text: string, first?: typeof HEAD_FAMILY | typeof MONO_FAMILY): string[] {
  registerFonts();
  const letters = [...text];
  const used = SCRIPTS.filter(
    (script) => script.family === 'Latin' || letters.some((at) => script.letters.test(at)),
  );
  const families = [...(first ? [first] : []), ...used.map(({ family }) => family)];
  if (letters.every((at) => used.some((script) => script.letters.test(at)))) return families;
  registerLastResort();
  return [...families, LAST_RESORT];
}

// Thai sara am is two glyphs for one letter, and the PDF writer keeps one glyph a letter: so it is given as two letters.
const SARA_AM = /\u0e33/gu;

/** Letters past the sixteen-bit plane, which no shipped face has, as an open square; control characters and those that turn the direction as a space. */
export const drawable = (text: string): string =>
  text
    .replace(/[\u{10000}-\u{10ffff}]/gu, '□')
    .replace(/[\p{Cc}\u202a-\u202e\u2066-\u2069]/gu, ' ')
    .replace(SARA_AM, '\u0e4d\u0e32');
