import 'server-only';
import { count, desc, isNotNull, sql } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { getDb } from '../db';

const LEAST = 5;
const MOST = 20;

/** Mail domains that several proven accounts share: what a mistyped one is compared with. */
export const listCommonDomains = (): string[] =>
  getDb()
    .select({ domain: sql<string>`substr(${user.email}, instr(${user.email}, '@') + 1)` })
    .from(user)
    .where(isNotNull(user.emailVerifiedAt))
    .groupBy(sql`1`)
    .having(sql`${count()} >= ${LEAST}`)
    .orderBy(desc(count()))
    .limit(MOST)
    .all()
    .map(({ domain }) => domain);
