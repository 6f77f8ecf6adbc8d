import type { RegistrationId } from '@/lib/domain/shared/ids';
import { loadAttendee } from '@/lib/server/packing/load-attendee';
import { buildCamp } from '../builders/build-camp';
import { buildCrowd } from '../builders/build-crowd';
import { buildLargeProgramme } from '../builders/build-large-programme';
import { interleave, timed } from './interleave';
import type { Row } from './report';
import { makeBase, withCopy } from './with-copy';

const SIZES = [30, 300, 3000] as const;

/** Every player's packing list of a camp, one after another as the mails make them: time a list as the camp grows. */
export async function measurePacking(folder: string): Promise<Row[]> {
  const bases = SIZES.map((people) => ({
    people,
    base: makeBase(folder, (db) => {
      const { campId, beginners, benders, hall } = buildCamp(db, { capacity: 4000 });
      const tracks = { campId, trackIds: [beginners, benders] };
      const [, , , workshopId] = buildLargeProgramme(db, 60, { ...tracks, roomId: hall });
      buildCrowd(db, people, { ...tracks, workshopId });
    }),
  }));
  const all = (base: string, people: number) =>
    withCopy(base, () =>
      timed(() => {
        for (let at = 0; at < people; at += 1) {
          const id: RegistrationId = `reg_${String(at).padStart(5, '0')}`;
          if (!loadAttendee(id)?.packing) throw new Error(`${id} has no packing list`);
        }
      }),
    );
  const time = await interleave(
    Object.fromEntries(bases.map(({ people, base }) => [String(people), () => all(base, people)])),
  );
  const each = (people: number) => (time[String(people)] ?? Number.NaN) / people;
  return [
    {
      what: 'packing lists of 3,000 players ÷ of 300, time a list',
      value: time.ratio('3000', '300') / 10,
      unit: 'ratio',
      better: 'down',
      floor: 1.5,
      reach: 1.1,
      figures: SIZES.map((people) => `${people}: ${time[String(people)]?.toFixed(0)} ms`).join(', '),
    },
    {
      what: 'packing list of one player, without HTTP',
      value: each(300),
      unit: 'ms',
      better: 'down',
      floor: null,
      reach: null,
      figures: `60 workshops; 30: ${each(30).toFixed(2)} ms, 3,000: ${each(3000).toFixed(2)} ms a list`,
    },
  ];
}
