import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { eq } from 'drizzle-orm';
import sharp from 'sharp';
import { afterAll, beforeEach, expect, test } from 'vitest';
import { camp } from '@/db/schema/camp';
import { registration } from '@/db/schema/order';
import { meeting } from '@/db/schema/workshop';
import { copyCamp } from '@/lib/server/camps/copy-camp';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { env } from '@/lib/server/env';
import { addPicture } from '@/lib/server/pictures/add-picture';
import { pictureFile } from '@/lib/server/pictures/picture-file';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildRegistration } from '../../builders/build-registration';
import { buildUser } from '../../builders/build-user';
import { buildWorkshop } from '../../builders/build-workshop';
import { staff } from '../../builders/staff';
import { useTestDatabase } from '../../setup/test-database';

const held = useTestDatabase();
const context = { actor: staff('organiser'), now: NOW };
const files = mkdtempSync(join(tmpdir(), 'combwood-files-'));
afterAll(() => rmSync(files, { recursive: true, force: true }));

beforeEach(() => {
  Object.assign(env(), { COMBWOOD_FILES: files });
  buildCamp(held.db);
  buildUser(held.db, { id: 'usr_organiser', roles: ['organiser'] });
  const workshopId = buildWorkshop(held.db, {
    id: 'wsh_1a',
    trackIds: ['trk_1a'],
    instructorIds: ['ins_1a'],
    needs: [
      { level: 'required', anyOf: [{ by: 'harp', labelKey: 'A', tuning: 'richter', register: 'standard' }] },
    ],
  });
  held.db
    .insert(meeting)
    .values({
      id: 'mtg_1',
      campId: 'cmp_1',
      workshopId,
      roomId: 'rom_1b',
      day: '2026-06-09',
      starts: '09:30',
      lengthMinutes: 75,
      sequence: 4,
      updatedAt: NOW,
    })
    .run();
  buildRegistration(held.db, { campId: 'cmp_1', organisationId: 'org_1', trackId: 'trk_1a' });
});

const without = (text: string) =>
  text.replace(/"(id|campId|workshopId|roomId|slug)":"[^"]*"|(trk|ins)_\w+/g, '');

test('everything but the people comes along, as a draft, moved with the first day', async () => {
  const png = await sharp({ create: { width: 40, height: 30, channels: 3, background: '#0e4a45' } })
    .png()
    .toBuffer();
  await addPicture(
    { campId: 'cmp_1', alt: 'The hall', file: new File([new Uint8Array(png)], 'hall.png') },
    context,
  );
  const copied = await copyCamp(
    { campId: 'cmp_1', name: 'Next Week', startsOn: '2027-06-07', withPictures: true },
    context,
  );
  if (!copied.ok) throw new Error('refused');
  const old = loadProgramme('cmp_1');
  const made = loadProgramme(copied.value.campId);
  expect(made?.camp).toMatchObject({
    name: 'Next Week',
    slug: 'next-week',
    startsOn: '2027-06-07',
    endsOn: '2027-06-11',
    state: 'draft',
    version: 1,
  });
  expect(made?.meetings).toMatchObject([{ day: '2027-06-08', starts: '09:30', sequence: 0 }]);
  for (const part of ['tracks', 'rooms', 'instructors', 'workshops', 'blocks'] as const)
    expect(without(JSON.stringify(made?.[part]))).toBe(without(JSON.stringify(old?.[part])));
  const newIds = JSON.stringify([made?.tracks, made?.rooms, made?.workshops, made?.meetings]);
  expect(newIds).not.toMatch(/"(trk|rom|ins|wsh|mtg)_1[a-z]?"/);
  expect(made?.workshops[0]?.trackIds).toEqual([made?.tracks[0]?.id]);
  expect(made?.workshops[0]?.instructorIds).toEqual([made?.instructors[0]?.id]);
  expect(made?.pictures[0]?.alt).toBe('The hall');
  const [first] = made?.pictures ?? [];
  expect(await sharp(pictureFile(first?.id as 'pic_x')).metadata()).toMatchObject({
    format: 'webp',
    width: 40,
  });
  expect(
    held.db.select().from(registration).where(eq(registration.campId, copied.value.campId)).all(),
  ).toEqual([]);
});

test('a copy that cannot be made leaves no file behind', async () => {
  const before = readdirSync(join(files, 'pictures')).length;
  held.db.$client.exec("create trigger no before insert on camp begin select raise(abort, 'disk'); end");
  const png = await sharp({ create: { width: 4, height: 3, channels: 3, background: '#000' } })
    .png()
    .toBuffer();
  await addPicture({ campId: 'cmp_1', alt: 'X', file: new File([new Uint8Array(png)], 'x.png') }, context);
  await expect(
    copyCamp({ campId: 'cmp_1', name: 'Y', startsOn: '2027-06-07', withPictures: true }, context),
  ).rejects.toThrow('disk');
  expect(readdirSync(join(files, 'pictures')).length).toBe(before + 1);
  expect(held.db.select().from(camp).all()).toHaveLength(1);
});
