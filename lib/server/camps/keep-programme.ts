import 'server-only';
import { type TrackHarps, trackHarps } from '@/lib/domain/packing/track-harps';
import type { CampId } from '@/lib/domain/shared/ids';
import type { Programme } from '@/lib/domain/timetable/programme';
import { type Db, getDb } from '../db';
import { loadProgramme } from './load-programme';

type Kept = { stamp: string; programme: Programme; harps: TrackHarps };

const kept = new WeakMap<Db, Map<CampId, Kept>>();
const MOST = 200;

/** Differs after any write to the file: by another connection (`data_version`) or by this one (`total_changes`). */
const stampOf = ({ $client }: Db): string =>
  `${$client.pragma('data_version', { simple: true })} ${$client.prepare('select total_changes()').pluck().get()}`;

/**
 * A camp's programme and the harps of its tracks, worked out once for as long as nothing at all is written to the
 * database, since the public page is read far more often. Shared between requests: read it, never change it.
 */
export function keepProgramme(campId: CampId): Omit<Kept, 'stamp'> | null {
  const db = getDb();
  const camps = kept.get(db) ?? new Map<CampId, Kept>();
  kept.set(db, camps);
  const stamp = stampOf(db);
  const held = camps.get(campId);
  if (held?.stamp === stamp) return held;
  const programme = loadProgramme(campId);
  if (!programme) return null;
  const harps = new Map(programme.tracks.map(({ id }) => [id, trackHarps(programme, id)]));
  if (camps.size >= MOST) camps.clear();
  camps.set(campId, { stamp, programme, harps });
  return { programme, harps };
}
