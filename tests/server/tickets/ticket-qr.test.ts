import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import jsQR from 'jsqr';
import QRCode from 'qrcode';
import sharp, { type Sharp } from 'sharp';
import { beforeAll, expect, test } from 'vitest';
import { prepareZXingModule, readBarcodes } from 'zxing-wasm/reader';
import { newId } from '@/lib/server/new-id';
import { signTicket } from '@/lib/server/tickets/sign-ticket';
import { ticketPng, ticketQr } from '@/lib/server/tickets/ticket-qr';

const TEXT = signTicket({ campId: newId('cmp'), ticketId: newId('tkt'), issuedAt: Date.UTC(2026, 4, 1) });

beforeAll(() => {
  const wasm = createRequire(import.meta.url).resolve('zxing-wasm/reader/zxing_reader.wasm');
  prepareZXingModule({ overrides: { wasmBinary: readFileSync(wasm).buffer as ArrayBuffer } });
});

async function readWithJsqr(png: Buffer): Promise<string | undefined> {
  const { data, info } = await sharp(png).ensureAlpha().raw().toBuffer({ resolveWithObject: true });
  return jsQR(new Uint8ClampedArray(data), info.width, info.height)?.data;
}
async function readWithZxing(png: Buffer) {
  const [found] = await readBarcodes(new Uint8Array(png), { formats: ['QRCode'] });
  return found;
}
const svg = ({ size, path }: { size: number; path: string }, pixels: number) =>
  Buffer.from(
    `<svg xmlns="http://www.w3.org/2000/svg" width="${pixels}" height="${pixels}" viewBox="0 0 ${size} ${size}" shape-rendering="crispEdges"><rect width="100%" height="100%" fill="#fff"/><path d="${path}"/></svg>`,
  );

// ISO/IEC 18004:2015, annex I: "01234567" is a version 1-M symbol.
test('the encoder chooses version 1 for the example of the standard', () => {
  expect(QRCode.create('01234567', { errorCorrectionLevel: 'M' }).version).toBe(1);
});

test('the code stays at version 7, level M, in alphanumeric mode', async () => {
  const made = QRCode.create([{ data: TEXT, mode: 'alphanumeric' }], { errorCorrectionLevel: 'M' });
  expect(made.version).toBe(7);
  const found = await readWithZxing(await ticketPng(TEXT));
  expect(found).toMatchObject({ text: TEXT, format: 'QRCode', ecLevel: 'M', version: '7' });
});

test.each([
  ['as it is mailed', (png: Sharp) => png],
  ['halved', (png: Sharp) => png.resize(212)],
  ['at three pixels a module', (png: Sharp) => png.resize(159)],
  ['doubled', (png: Sharp) => png.resize(848)],
  ['upside down', (png: Sharp) => png.rotate(180)],
  ['on grey, dim', (png: Sharp) => png.linear(0.35, 70)],
  ['blurred by a shaky hand', (png: Sharp) => png.blur(2)],
  [
    'in a larger grey picture',
    (png: Sharp) => png.extend({ top: 90, bottom: 40, left: 60, right: 120, background: '#777' }),
  ],
])('two readers read it %s', async (_how, change) => {
  const png = await change(sharp(await ticketPng(TEXT)))
    .png()
    .toBuffer();
  expect(await readWithJsqr(png)).toBe(TEXT);
  expect((await readWithZxing(png))?.text).toBe(TEXT);
});

test('the path drawn on pages and paper is the same code, quiet zone included', async () => {
  const png = await sharp(svg(ticketQr(TEXT), 424))
    .png()
    .toBuffer();
  expect(await readWithJsqr(png)).toBe(TEXT);
  expect((await readWithZxing(png))?.text).toBe(TEXT);
  const [drawn, mailed] = await Promise.all(
    [png, await ticketPng(TEXT)].map((image) =>
      sharp(image).flatten().greyscale().threshold().raw().toBuffer(),
    ),
  );
  expect(drawn?.equals(mailed ?? Buffer.alloc(0))).toBe(true);
});

test('without its quiet zone on a dark page it would be lost; with it, it is read', async () => {
  const png = await sharp(await ticketPng(TEXT))
    .extend({ top: 100, bottom: 100, left: 100, right: 100, background: '#12201f' })
    .png()
    .toBuffer();
  expect(await readWithJsqr(png)).toBe(TEXT);
  expect((await readWithZxing(png))?.text).toBe(TEXT);
});
