import { mkdtempSync, readdirSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { eq } from 'drizzle-orm';
import sharp from 'sharp';
import { afterAll, beforeEach, describe, expect, test } from 'vitest';
import { camp, campPicture } from '@/db/schema/camp';
import { VISITOR } from '@/lib/domain/access/actor';
import { env } from '@/lib/server/env';
import { addPicture } from '@/lib/server/pictures/add-picture';
import { deletePicture } from '@/lib/server/pictures/delete-picture';
import { encodePicture } from '@/lib/server/pictures/encode-picture';
import { findPicture } from '@/lib/server/pictures/find-picture';
import { pictureFile } from '@/lib/server/pictures/picture-file';
import { pictureResponse } from '@/lib/server/pictures/picture-response';
import { sweepPictures } from '@/lib/server/pictures/sweep-pictures';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildUser } from '../../builders/build-user';
import { staff } from '../../builders/staff';
import { useTestDatabase } from '../../setup/test-database';

const held = useTestDatabase();
const files = mkdtempSync(join(tmpdir(), 'combwood-files-'));
const folder = join(files, 'pictures');
const context = { actor: staff('organiser'), now: NOW };
const plain = (width = 60, height = 40) =>
  sharp({ create: { width, height, channels: 3, background: '#b5402a' } });
const upload = (bytes: Uint8Array | string, name = 'hall.jpg') =>
  addPicture(
    { campId: 'cmp_1', alt: 'The hall', file: new File([bytes as Uint8Array<ArrayBuffer>], name) },
    context,
  );
const listFiles = () => readdirSync(folder);
afterAll(() => rmSync(files, { recursive: true, force: true }));

beforeEach(() => {
  rmSync(folder, { recursive: true, force: true });
  Object.assign(env(), { COMBWOOD_FILES: files });
  buildCamp(held.db, { state: 'draft' });
  buildUser(held.db, { id: 'usr_organiser', roles: ['organiser'] });
});

describe('what comes out', () => {
  test('is WebP, upright, without EXIF, whatever the name said', async () => {
    const photo = await plain(60, 40)
      .jpeg()
      .withExif({ IFD0: { Copyright: 'secret place' } })
      .withMetadata({ orientation: 6 })
      .toBuffer();
    expect((await sharp(photo).metadata()).exif).toBeDefined();
    const added = await upload(photo, '../../evil.svg');
    if (!added.ok) throw new Error('refused');
    const made = await sharp(pictureFile(added.value.pictureId)).metadata();
    expect(made).toMatchObject({ format: 'webp', width: 40, height: 60 });
    expect(made.exif).toBeUndefined();
    expect(held.db.select().from(campPicture).get()).toMatchObject({
      width: 40,
      height: 60,
      alt: 'The hall',
    });
    expect(listFiles()).toEqual([`${added.value.pictureId}.webp`]);
  });
  test('is at most 2400 a side', async () => {
    const made = await encodePicture(await plain(3000, 600).png().toBuffer());
    expect(made).toMatchObject({ ok: true, value: { width: 2400, height: 480 } });
  });
});

// ASVS 5.2.2, 5.2.6, 1.3.4: by content, not by name; floods and markup refused before they are decoded.
describe('what is refused leaves neither row nor file', () => {
  const svg = '<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>';
  const cases: [string, () => Promise<Uint8Array | string> | Uint8Array | string, RegExp][] = [
    ['SVG named .png', () => svg, /not a JPEG, PNG or WebP/],
    ['HTML named .jpg', () => '<!doctype html><script>1</script>', /not a JPEG/],
    ['GIF', () => plain().gif().toBuffer(), /not a JPEG/],
    ['AVIF', () => plain().avif().toBuffer(), /not a JPEG/],
    ['TIFF', () => plain().tiff().toBuffer(), /not a JPEG/],
    [
      'a JPEG cut short',
      async () => (await plain(600, 600).jpeg().toBuffer()).subarray(0, 400),
      /damaged|cut short/,
    ],
    [
      'the head of a PNG and nothing else',
      () => new Uint8Array([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 1]),
      /damaged/,
    ],
    [
      '81 million pixels in a small file',
      () => plain(9000, 9000).png({ compressionLevel: 9 }).toBuffer(),
      /64 million pixels/,
    ],
  ];
  test.each(cases)('%s', async (_, make, said) => {
    const refused = await upload(await make(), 'photo.png');
    expect(refused.ok).toBe(false);
    expect(!refused.ok && refused.error.fields?.file?.[0]).toMatch(said);
    expect(held.db.select().from(campPicture).all()).toEqual([]);
    expect(() => listFiles()).toThrow();
  });
  test('a row that cannot be written takes its file away', async () => {
    held.db.$client.exec(
      "create trigger no before insert on camp_picture begin select raise(abort, 'disk'); end",
    );
    await expect(upload(await plain().png().toBuffer())).rejects.toThrow('disk');
    expect(listFiles()).toEqual([]);
  });
});

test('a draft’s picture is for its staff and kept by no cache; a public one is for everyone', async () => {
  const added = await upload(await plain().png().toBuffer());
  if (!added.ok) throw new Error('refused');
  const id = added.value.pictureId;
  expect(await findPicture(id, VISITOR)).toBeNull();
  expect(await findPicture(id, staff('organiser', 'org_2'))).toBeNull();
  const own = await findPicture(id, staff('door'));
  expect(own?.open).toBe(false);
  expect(own && pictureResponse(own).headers.get('cache-control')).toBe('private, no-store');
  held.db.update(camp).set({ state: 'published' }).where(eq(camp.id, 'cmp_1')).run();
  const open = await findPicture(id, VISITOR);
  const headers = open && pictureResponse(open).headers;
  expect(headers?.get('cache-control')).toMatch(/^public, .*immutable/);
  expect(headers?.get('content-type')).toBe('image/webp');
  expect(headers?.get('x-content-type-options')).toBe('nosniff');
});

test('deleting takes the row and the file', async () => {
  const added = await upload(await plain().png().toBuffer());
  if (!added.ok) throw new Error('refused');
  expect((await deletePicture({ campId: 'cmp_1', pictureId: added.value.pictureId }, context)).ok).toBe(true);
  expect(held.db.select().from(campPicture).all()).toEqual([]);
  expect(listFiles()).toEqual([]);
});

test('the sweep removes old files without a row, and nothing else', async () => {
  const added = await upload(await plain().png().toBuffer());
  if (!added.ok) throw new Error('refused');
  const kept = `${added.value.pictureId}.webp`;
  const old = new Date(NOW - 7_200_000);
  for (const name of ['pic_gone.webp', 'pic_gone.webp.0a1b.part', 'README']) {
    writeFileSync(join(folder, name), 'x');
    utimesSync(join(folder, name), old, old);
  }
  utimesSync(join(folder, kept), old, old);
  writeFileSync(join(folder, 'pic_new.webp'), 'x');
  utimesSync(join(folder, 'pic_new.webp'), new Date(NOW), new Date(NOW));
  expect(await sweepPictures(NOW)).toBe(2);
  expect(listFiles().sort()).toEqual(['README', kept, 'pic_new.webp'].sort());
});
