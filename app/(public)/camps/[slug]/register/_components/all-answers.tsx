import { HarpRow } from '@/components/harp/harp-row';
import { parseHarpId } from '@/lib/domain/harp/harp-id';
import type { CompleteAnswers } from '@/lib/domain/registration/answers';
import { STEP_WORDS } from '@/lib/domain/registration/steps';
import { listWords } from '@/lib/domain/shared/list-words';
import { sayPhone } from '@/lib/domain/shared/to-e164';
import type { Programme } from '@/lib/domain/timetable/programme';
import { AnswerList } from './answer-list';

/** Everything answered, as it will be kept. */
export function AllAnswers({ programme, answers }: { programme: Programme; answers: CompleteAnswers }) {
  const { who, track, harps, needs } = answers;
  const { slug } = programme.camp;
  const electives = programme.workshops
    .filter(({ id }) => track.electives.includes(id))
    .map(({ title }) => title);
  const owned = harps.harpIds.flatMap((id) => parseHarpId(id) ?? []);
  return (
    <div className="grid gap-8">
      <AnswerList
        slug={slug}
        step="who"
        title={STEP_WORDS.who}
        answers={[
          { term: 'Name', value: who.attendeeName },
          { term: 'E-mail', value: who.attendeeEmail },
          {
            term: 'Payer',
            value: who.payer === 'other' ? `${who.payerName}, ${who.payerEmail}` : 'The same person',
          },
          { term: 'Under 18', value: who.minor ? 'Yes' : 'No' },
        ]}
      />
      <AnswerList
        slug={slug}
        step="track"
        title={STEP_WORDS.track}
        answers={[
          { term: 'Track', value: programme.tracks.find(({ id }) => id === track.trackId)?.name },
          { term: 'Electives', value: electives.length > 0 ? listWords(electives) : 'None' },
        ]}
      />
      <AnswerList
        slug={slug}
        step="harps"
        title={STEP_WORDS.harps}
        answers={[
          {
            term: 'Harps',
            value: owned.length > 0 ? <HarpRow harps={owned} label="Harps you own" /> : 'None yet',
          },
        ]}
      />
      <AnswerList
        slug={slug}
        step="needs"
        title={STEP_WORDS.needs}
        answers={[
          { term: 'Food', value: needs.diet || 'Nothing noted' },
          { term: 'Access and health', value: needs.access || 'Nothing noted' },
          { term: 'In an emergency', value: `${needs.emergencyName}, ${sayPhone(needs.emergencyPhone)}` },
          ...(who.minor
            ? [
                {
                  term: 'Guardian',
                  value: `${needs.guardianName}, ${needs.guardianEmail}, ${sayPhone(needs.guardianPhone)}`,
                },
                { term: 'Consent', value: 'Given' },
              ]
            : []),
        ]}
      />
    </div>
  );
}
