import 'server-only';
import { asc, eq } from 'drizzle-orm';
import { paymentEvent } from '@/db/schema/money';
import { type Db, getDb } from '../db';

/** Provider events that wait for a person: wrong amount, unknown order. No violation, but somebody must look. */
export const listSetAside = (db: Db = getDb()) =>
  db
    .select()
    .from(paymentEvent)
    .where(eq(paymentEvent.outcome, 'set-aside'))
    .orderBy(asc(paymentEvent.receivedAt))
    .all();
