import { beforeEach, expect, test } from 'vitest';
import { audit } from '@/db/schema/audit';
import { registrationNeeds } from '@/db/schema/order';
import { VISITOR } from '@/lib/domain/access/actor';
import { getPerson } from '@/lib/server/people/get-person';
import { readNeeds } from '@/lib/server/people/read-needs';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildOrder } from '../../builders/build-order';
import { staff } from '../../builders/staff';
import { useTestDatabase } from '../../setup/test-database';

const at = useTestDatabase();
beforeEach(() => {
  buildCamp(at.db);
  buildCamp(at.db, { id: 'cmp_2', organisationId: 'org_2' });
  buildOrder(at.db, { attendees: ['Noor Haddad', 'Mei Chou'] });
  at.db.insert(registrationNeeds).values({ registrationId: 'reg_1a', diet: 'No peanuts' }).run();
});

// OWASP ASVS 5.0, 8.2.3 and 15.3.1: health fields only where they are needed.
test('an organiser of the camp sees needs, and each look is written down without what was seen', () => {
  expect(readNeeds(staff('organiser'), 'cmp_1', 'reg_1a', NOW)).toMatchObject({
    needs: { diet: 'No peanuts' },
  });
  expect(readNeeds(staff('organiser'), 'cmp_1', 'reg_1b', NOW)).toMatchObject({ needs: null });
  const notes = at.db.select().from(audit).all();
  expect(notes.map(({ sentence }) => sentence)).toEqual([
    'Looked at the needs of Noor Haddad.',
    'Looked at the needs of Mei Chou.',
  ]);
  expect(JSON.stringify(notes)).not.toContain('peanuts');
});

test('nobody else does, and no look is noted that was none', () => {
  for (const actor of [
    VISITOR,
    staff('treasurer'),
    staff('instructor'),
    staff('door'),
    staff('organiser', 'org_2'),
  ])
    expect(readNeeds(actor, 'cmp_1', 'reg_1a', NOW)).toBeNull();
  expect(readNeeds(staff('organiser', 'org_2'), 'cmp_2', 'reg_1a', NOW)).toBeNull();
  expect(at.db.select().from(audit).all()).toEqual([]);
});

test('a person’s details are of this camp only, with the order and no health', () => {
  const person = getPerson('cmp_1', 'reg_1a');
  expect(person).toMatchObject({ name: 'Noor Haddad', total: 92_000, others: [{ name: 'Mei Chou' }] });
  expect(person?.lines).toHaveLength(2);
  expect(JSON.stringify(person)).not.toContain('peanuts');
  expect(getPerson('cmp_2', 'reg_1a')).toBeNull();
});
