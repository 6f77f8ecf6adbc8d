import 'server-only';
import { and, count, eq } from 'drizzle-orm';
import { registration } from '@/db/schema/order';
import type { CampId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

/** How many confirmed people a camp expects in all, and how many of them are in. */
export function countArrivals(campId: CampId): { confirmed: number; arrived: number } {
  const rows = getDb()
    .select({ arrival: registration.arrival, people: count() })
    .from(registration)
    .where(and(eq(registration.campId, campId), eq(registration.state, 'confirmed')))
    .groupBy(registration.arrival)
    .all();
  const confirmed = rows.reduce((sum, row) => sum + row.people, 0);
  return { confirmed, arrived: rows.find((row) => row.arrival === 'arrived')?.people ?? 0 };
}
