import sharp from 'sharp';

const W = 1600;
const H = 1000;
const INK = '#14211f';
const PINE = '#0e4a45';
const BRASS = '#e3a008';
const BOARD = '#f3f5f1';

const svg = (inside: string): string =>
  `<svg xmlns="http://www.w3.org/2000/svg" width="${W}" height="${H}" viewBox="0 0 ${W} ${H}"><rect width="${W}" height="${H}" fill="${BOARD}"/>${inside}</svg>`;

const fir = (x: number, base: number, height: number): string =>
  [0, 0.28, 0.54]
    .map((from) => {
      const top = base - height * (1 - from);
      const half = height * (0.16 + from * 0.22);
      return `<path d="M${x} ${top} L${x + half} ${top + height * 0.42} L${x - half} ${top + height * 0.42}Z" fill="${PINE}"/>`;
    })
    .join('');

const windows = (x: number, y: number, size: number, gap: number): string =>
  Array.from(
    { length: 10 },
    (_, at) =>
      `<rect x="${x + at * (size + gap)}" y="${y}" width="${size}" height="${size}" fill="${BRASS}"/>`,
  ).join('');

/** The hall at the lake by night: ten lit windows in a row, and their light in the water. */
function hall(): string {
  const ripples = Array.from({ length: 13 }, (_, at) => {
    const y = 700 + at * 22;
    return `<rect x="${380 + at * 14}" y="${y}" width="${840 - at * 28}" height="7" fill="${at % 3 === 1 ? BRASS : BOARD}" opacity="${1 - at / 16}"/>`;
  }).join('');
  const firs = [60, 150, 262, 340, 1268, 1352, 1450, 1545]
    .map((x, at) => fir(x, 660, 300 + ((at * 73) % 170)))
    .join('');
  return svg(
    `<circle cx="1230" cy="190" r="92" fill="${BRASS}"/>${firs}<path d="M360 470 L800 300 L1240 470Z" fill="${INK}"/><rect x="390" y="470" width="820" height="190" fill="${PINE}"/>${windows(438, 530, 54, 19)}<rect y="660" width="${W}" height="340" fill="${PINE}"/>${ripples}`,
  );
}

/** The porch in the morning: chairs in a half circle under a long roof. */
function porch(): string {
  const posts = Array.from(
    { length: 6 },
    (_, at) => `<rect x="${130 + at * 262}" y="300" width="26" height="440" fill="${INK}"/>`,
  ).join('');
  const chairs = Array.from({ length: 9 }, (_, at) => {
    const x = 230 + at * 128;
    const y = 640 + Math.round(70 * Math.sin((Math.PI * at) / 8));
    return `<path d="M${x} ${y} h64 v84 h-10 v-40 h-44 v40 h-10z M${x} ${y} v-78 h10 v78z" fill="${at % 2 === 0 ? PINE : INK}"/>`;
  }).join('');
  return svg(
    `<circle cx="800" cy="430" r="150" fill="${BRASS}"/><path d="M0 560 Q420 420 820 540 T1600 500 V1000 H0Z" fill="${PINE}" opacity="0.28"/><path d="M40 300 L190 160 H1410 L1560 300Z" fill="${PINE}"/>${posts}<rect x="60" y="810" width="1480" height="46" fill="${INK}"/>${chairs}`,
  );
}

export const DEMO_PICTURES = [
  {
    alt: 'The long hall at the lake at night, ten lit windows in a row and their light on the water.',
    draw: hall,
  },
  { alt: 'Nine chairs in a half circle on the porch, the sun coming up behind the lake.', draw: porch },
] as const;

/** A drawing as a PNG file, to be uploaded like anybody's picture. */
export const pngOf = async (draw: () => string): Promise<File> =>
  new File([new Uint8Array(await sharp(Buffer.from(draw())).png().toBuffer())], 'drawing.png', {
    type: 'image/png',
  });
