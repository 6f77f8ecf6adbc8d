import { eq } from 'drizzle-orm';
import { beforeEach, expect, test } from 'vitest';
import { user } from '@/db/schema/account';
import { type Actor, VISITOR } from '@/lib/domain/access/actor';
import { listOwnBookings } from '@/lib/server/orders/list-own-bookings';
import { buildCamp } from '@/tests/builders/build-camp';
import { buildOrder } from '@/tests/builders/build-order';
import { buildUser } from '@/tests/builders/build-user';
import { useTestDatabase } from '@/tests/setup/test-database';

const at = useTestDatabase();
beforeEach(() => {
  buildCamp(at.db);
  buildUser(at.db, { id: 'usr_1', email: 'noor@example.test' });
  buildOrder(at.db, { id: 'ord_1', attendees: ['Noor Haddad', 'Zoë Ademi'] });
  buildOrder(at.db, {
    id: 'ord_2',
    payer: { payerEmail: 'someone@example.test', payerName: 'Someone Else' },
    attendees: ['Ana Teixeira', 'Łucja Øverland'],
  });
});

const as = (email: string, emailVerified = true): Actor => {
  at.db.update(user).set({ email }).where(eq(user.id, 'usr_1')).run();
  return { ...VISITOR, user: { id: 'usr_1', name: 'Noor Haddad', email, emailVerified } };
};
const seen = (actor: Actor) =>
  listOwnBookings(actor).map(({ orderId, mine, people }) => [orderId, mine, people.map(({ id }) => id)]);

test('a stranger sees nothing', () => {
  expect(seen(VISITOR)).toEqual([]);
});

test('a payer sees the whole order by a proven address, and nothing by one that is not', () => {
  expect(seen(as('noor@example.test'))).toEqual([['ord_1', true, ['reg_1a', 'reg_1b']]]);
  expect(seen(as('noor@example.test', false))).toEqual([]);
});

test('an attendee sees their own place only, and not the order', () => {
  // `b@example.test` attends in both orders and pays in neither.
  expect(seen(as('b@example.test')).sort()).toEqual([
    ['ord_1', false, ['reg_1b']],
    ['ord_2', false, ['reg_2b']],
  ]);
});

test('a link shows what it was made for', () => {
  expect(seen({ ...VISITOR, orders: ['ord_2'] })).toEqual([['ord_2', true, ['reg_2a', 'reg_2b']]]);
  expect(seen({ ...VISITOR, registrations: ['reg_2b'] })).toEqual([['ord_2', false, ['reg_2b']]]);
});

test('the same statements for one booking and for many', () => {
  for (let count = 1010; count < 1040; count += 1) buildOrder(at.db, { id: `ord_${count}` });
  const actor = as('noor@example.test');
  const statements: string[] = [];
  const prepare = at.db.$client.prepare.bind(at.db.$client);
  at.db.$client.prepare = (source: string) => {
    statements.push(source);
    return prepare(source);
  };
  expect(listOwnBookings(actor)).toHaveLength(31);
  expect(statements).toHaveLength(1);
});
