import { stringify } from 'csv-stringify/sync';
import { ALL_PEOPLE } from '@/lib/domain/people/people-query';
import { exportPeople } from '@/lib/server/people/export-people';
import { buildCamp, NOW } from '../builders/build-camp';
import { buildCrowd } from '../builders/build-crowd';
import { buildLargeProgramme } from '../builders/build-large-programme';
import { buildUser } from '../builders/build-user';
import { staff } from '../builders/staff';
import { recordStatements } from '../setup/record-statements';
import { PEOPLE } from './fill-bench';
import { interleave, timed } from './interleave';
import { replay } from './replay';
import type { Row } from './report';
import { makeBase, withCopy } from './with-copy';

/** The whole roster as CSV, read to its end, against its statements raw and the same library's plain stringify. */
export async function measureRoster(folder: string): Promise<Row[]> {
  const base = makeBase(folder, (db) => {
    const { campId, beginners, benders, hall } = buildCamp(db, { capacity: 2 * PEOPLE });
    const tracks = { campId, trackIds: [beginners, benders] };
    const [, , , workshopId] = buildLargeProgramme(db, 20, { ...tracks, roomId: hall });
    buildCrowd(db, PEOPLE, { ...tracks, workshopId });
    buildUser(db, { id: 'usr_organiser' });
  });
  const camp = { id: 'cmp_1', organisationId: 'org_1', timeZone: 'Europe/Berlin' } as const;
  const take = async () => {
    const csv = await new Response(
      exportPeople(camp, ALL_PEOPLE, { actor: staff('organiser'), now: NOW }),
    ).text();
    const lines = csv.split('\r\n').length - 2;
    if (lines !== PEOPLE) throw new Error(`The export has ${lines} lines`);
  };
  const recorded = await withCopy(base, async (db) => {
    const seen = recordStatements(db);
    await take();
    seen.stop();
    return seen.executed;
  });
  const time = await interleave({
    ours: () => withCopy(base, () => timed(take)),
    raw: () =>
      withCopy(base, (db) =>
        timed(() => {
          const [answers] = replay(db, [recorded]) as unknown[][][];
          const rows = answers?.[0] as unknown[][];
          if (stringify(rows).length < PEOPLE) throw new Error('The raw export is empty');
        }),
      ),
  });
  return [
    {
      what: `roster export of ${PEOPLE} ÷ raw query + stringify, time`,
      value: time.ratio('ours', 'raw'),
      unit: 'ratio',
      better: 'down',
      floor: 3,
      reach: 1.5,
      figures: `${time.ours.toFixed(0)} ms ÷ ${time.raw.toFixed(0)} ms; ours adds harp names, money, local times, formula guard`,
    },
  ];
}
