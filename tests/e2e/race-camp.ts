import { openDatabase } from '@/db/client';
import { buildCamp } from '@/tests/builders/build-camp';
import { answersFor, buildDraft } from '@/tests/builders/build-draft';

// Makes the camp of the race, with a browser's answers for each person. A process of its own, because the server's
// rooms cannot be imported into a browser test.
const [people = '0', places = '0'] = process.argv.slice(2);
const db = openDatabase(process.env.COMBWOOD_DB ?? '');
const { campId, benders } = buildCamp(db, {
  id: 'cmp_race',
  startsOn: '2099-06-08',
  endsOn: '2099-06-12',
  capacity: Number(places),
});
db.$client.exec(`update track set capacity = ${Number(people)} where camp_id = 'cmp_race'`);
for (let person = 0; person < Number(people); person += 1) {
  const token = `race-${person}`;
  const answers = answersFor(benders, { email: `${token}@example.test` });
  buildDraft(db, { token, campId, answers, now: Date.now() });
}
db.$client.close();
