import type { Db } from '@/db/client';
import { block, camp, instructor, room, track } from '@/db/schema/camp';
import { organisation } from '@/db/schema/organisation';
import { minor } from '@/lib/domain/shared/money';

export const NOW = Date.UTC(2026, 4, 1, 9, 0);

/** An organisation, camp, two tracks, two rooms, an instructor and three blocks with fixed ids; published unless said otherwise. */
export function buildCamp(db: Db, overrides: Partial<typeof camp.$inferInsert> = {}) {
  const id = overrides.id ?? 'cmp_1';
  const organisationId = overrides.organisationId ?? 'org_1';
  const tail = id.slice(4);
  db.insert(organisation)
    .values({
      id: organisationId,
      slug: organisationId,
      name: 'Slate Ridge Harp Society',
      email: 'office@slateridge.example',
      createdAt: NOW,
    })
    .onConflictDoNothing()
    .run();
  db.insert(camp)
    .values({
      slug: `kettle-lake-${tail}`,
      name: 'Kettle Lake Harp Week',
      summary: 'Five days of harmonica by the lake.',
      description: 'Bring a chair for the jam.',
      startsOn: '2026-06-08',
      endsOn: '2026-06-12',
      timeZone: 'Europe/Berlin',
      currency: 'EUR',
      venueName: 'Kettle Lake Hall',
      venueAddress: '1 Lake Road',
      capacity: 60,
      price: minor(46_000),
      refundTerms: 'Until 60 days before: all but 50 EUR.',
      state: 'published',
      publishedAt: NOW,
      createdAt: NOW,
      updatedAt: NOW,
      ...overrides,
      id,
      organisationId,
    })
    .run();
  const ids = {
    organisationId,
    campId: id,
    beginners: `trk_${tail}a`,
    benders: `trk_${tail}b`,
    hall: `rom_${tail}a`,
    barn: `rom_${tail}b`,
    instructorId: `ins_${tail}a`,
  } as const;
  db.insert(track)
    .values([
      {
        id: ids.beginners,
        campId: id,
        name: 'First breath',
        level: 'start',
        gate: 'None.',
        capacity: 40,
        position: 1,
      },
      {
        id: ids.benders,
        campId: id,
        name: 'Bending',
        level: 'bending',
        gate: 'Bends 4 draw.',
        capacity: 40,
        position: 2,
      },
    ])
    .run();
  db.insert(room)
    .values([
      { id: ids.hall, campId: id, name: 'Hall', seats: 80, loudness: 'amplified', position: 1 },
      { id: ids.barn, campId: id, name: 'Barn', seats: 20, loudness: 'quiet', position: 2 },
    ])
    .run();
  db.insert(instructor).values({ id: ids.instructorId, campId: id, name: 'Ana Teixeira', position: 1 }).run();
  db.insert(block)
    .values([
      { id: `blk_${tail}a`, campId: id, starts: '09:30', ends: '10:45' },
      { id: `blk_${tail}b`, campId: id, starts: '11:00', ends: '12:15' },
      { id: `blk_${tail}c`, campId: id, starts: '20:00', ends: '21:30', label: 'Evening' },
    ])
    .run();
  return ids;
}
