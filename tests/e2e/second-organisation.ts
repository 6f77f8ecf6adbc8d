import { openDatabase } from '@/db/client';
import { buildCamp } from '@/tests/builders/build-camp';
import { buildUser } from '@/tests/builders/build-user';

// An organisation beside the demo's own, with a draft that nobody else sees and an organiser. A process of its own,
// because the server's rooms cannot be imported into a browser test.
const db = openDatabase(process.env.COMBWOOD_DB ?? '');
const { organisationId } = buildCamp(db, {
  id: 'cmp_second',
  organisationId: 'org_second',
  state: 'draft',
  publishedAt: null,
  startsOn: '2099-06-08',
  endsOn: '2099-06-12',
});
buildUser(db, { id: 'usr_second', name: 'Ida Størmer', in: organisationId, roles: ['organiser'] });
db.$client.close();
