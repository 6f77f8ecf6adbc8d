import type { WorkshopId } from '@/lib/domain/shared/ids';
import { holdPlaces } from '@/lib/server/registration/hold-places';
import { buildCamp, NOW } from '../builders/build-camp';
import { answersFor, buildDraft } from '../builders/build-draft';
import { buildLargeProgramme } from '../builders/build-large-programme';
import { type Recorded, recordStatements } from '../setup/record-statements';
import { interleave, timed } from './interleave';
import { replay } from './replay';
import type { Row } from './report';
import { makeBase, withCopy } from './with-copy';

const EACH = 200;
const token = (at: number) => `player-${at}`;

/**
 * The transaction that takes a place (read, decide, write, on disk) against the statements it executes, prepared once
 * and run as they are by the driver, in as many transactions, on a copy of the same file.
 */
export async function measureRegistration(folder: string): Promise<Row[]> {
  const base = makeBase(folder, (db) => {
    const { campId, beginners, benders, hall } = buildCamp(db, { capacity: 2 * EACH });
    const made = buildLargeProgramme(db, 60, { campId, trackIds: [beginners, benders], roomId: hall });
    db.$client.exec(`update track set capacity = ${2 * EACH}`);
    const electives: WorkshopId[] = made.slice(3, 4);
    for (let at = 0; at < EACH; at += 1)
      buildDraft(db, {
        token: token(at),
        campId,
        answers: answersFor(at % 2 ? beginners : benders, { name: `Player ${at}`, electives }),
      });
  });
  const hold = (at: number) => {
    const held = holdPlaces(token(at), 'cmp_1', null, NOW);
    if (!held.ok) throw new Error(`A place was refused: ${held.error.code}`);
  };
  const recorded = await withCopy(base, (db) =>
    Array.from({ length: EACH }, (_, at): Recorded[] => {
      const seen = recordStatements(db);
      hold(at);
      seen.stop();
      return seen.executed;
    }),
  );
  const perSecond = (ms: number) => (EACH * 1000) / ms;
  const speed = await interleave({
    ours: () =>
      withCopy(base, async () =>
        perSecond(
          await timed(() => {
            for (let at = 0; at < EACH; at += 1) hold(at);
          }),
        ),
      ),
    raw: () => withCopy(base, async (db) => perSecond(await timed(() => replay(db, recorded)))),
  });
  return [
    {
      what: 'registration transaction ÷ its statements raw',
      value: speed.ratio('ours', 'raw'),
      unit: 'ratio',
      better: 'up',
      floor: 0.5,
      reach: 0.8,
      figures: `${Math.round(speed.ours)}/s ÷ ${Math.round(speed.raw)}/s; ${recorded[0]?.length} statements each, camp of 60 workshops`,
    },
  ];
}
