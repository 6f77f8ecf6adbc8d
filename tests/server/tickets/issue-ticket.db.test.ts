import { expect, test } from 'vitest';
import { ticket } from '@/db/schema/order';
import { inTransaction } from '@/lib/server/db';
import { issueTicket } from '@/lib/server/tickets/issue-ticket';
import { revokeTicket } from '@/lib/server/tickets/revoke-ticket';
import { buildCamp, NOW } from '@/tests/builders/build-camp';
import { buildOrder } from '@/tests/builders/build-order';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();

test('a registration has one valid ticket, however often it is issued; a revoked one stays as history', () => {
  const { campId } = buildCamp(at.db);
  buildOrder(at.db);
  const given = { registrationId: 'reg_1a', campId, now: NOW } as const;
  const first = inTransaction((tx) => issueTicket(tx, given));
  expect(inTransaction((tx) => issueTicket(tx, given))).toBe(first);
  inTransaction((tx) => revokeTicket(tx, { registrationId: 'reg_1a', now: NOW + 5 }));
  const second = inTransaction((tx) => issueTicket(tx, { ...given, now: NOW + 9 }));
  expect(second).not.toBe(first);
  const rows = at.db.select({ id: ticket.id, revokedAt: ticket.revokedAt }).from(ticket).all();
  expect(new Map(rows.map((row) => [row.id, row.revokedAt]))).toEqual(
    new Map([
      [first, NOW + 5],
      [second, null],
    ]),
  );
});

test('the database itself refuses a second valid ticket', () => {
  const { campId } = buildCamp(at.db);
  buildOrder(at.db);
  const row = { registrationId: 'reg_1a', campId, issuedAt: NOW } as const;
  at.db
    .insert(ticket)
    .values({ id: 'tkt_1', ...row })
    .run();
  expect(() =>
    at.db
      .insert(ticket)
      .values({ id: 'tkt_2', ...row })
      .run(),
  ).toThrow(/UNIQUE/);
});
