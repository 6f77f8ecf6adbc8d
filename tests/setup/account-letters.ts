import { asc } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { mail } from '@/db/schema/mail';

/** The outbox, oldest first: kind, recipient and the token of its link. */
export const lettersOf = (db: Db): { kind: string; to: string; token: string }[] =>
  db
    .select()
    .from(mail)
    .orderBy(asc(mail.createdAt), asc(mail.id))
    .all()
    .map(({ kind, toEmail, payload }) => ({ kind, to: toEmail, token: payload.token ?? '' }));

export const lastToken = (db: Db, kind: string): string =>
  lettersOf(db).findLast((letter) => letter.kind === kind)?.token ?? '';
