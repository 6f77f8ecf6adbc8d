import { HarpName } from '@/components/harp/harp-name';
import { needSentence } from '@/lib/domain/harp/need-sentence';
import type { TaughtMeeting } from '@/lib/domain/roster/taught-meeting';
import { clockAfter } from '@/lib/domain/shared/local-time';
import { KIND_WORDS } from '@/lib/domain/timetable/workshop-words';
import { Roster } from './roster';

/** One meeting: where, with what, in which keys, and who comes. */
export function TaughtCard({ meeting }: { meeting: TaughtMeeting }) {
  const { players, count, needs } = meeting;
  return (
    <article className="grid gap-x-8 gap-y-3 border-b border-line py-5 lg:grid-cols-[22rem_1fr]">
      <div>
        <p>
          <time>
            {meeting.starts}–{clockAfter(meeting.starts, meeting.lengthMinutes)}
          </time>{' '}
          <span className="font-semibold">{meeting.room}</span>
        </p>
        <h3 className="mt-1 break-words">
          <HarpName>{meeting.title}</HarpName>
        </h3>
        <p className="text-soft">
          {KIND_WORDS[meeting.kind]}, {meeting.whose}
          {meeting.with.length > 0 && `, with ${meeting.with.join(', ')}`}
        </p>
        <p className="mt-2">
          <span className="text-soft">In the room: </span>
          {meeting.kit || 'nothing noted'}
        </p>
      </div>
      <div className="min-w-0">
        <p className="font-semibold">Harps to teach in</p>
        {needs.length === 0 ? (
          <p className="text-soft">None named.</p>
        ) : (
          <ul className="mb-3">
            {needs.map((need) => (
              <li key={needSentence(need)}>
                <HarpName>{needSentence(need)}</HarpName>
              </li>
            ))}
          </ul>
        )}
        {players.length === 0 ? (
          <p className="text-soft">
            {count === 0
              ? 'Nobody confirmed yet.'
              : `Everyone comes: ${count.toLocaleString('en-GB')} players.`}
          </p>
        ) : (
          <details open={players.length <= 12}>
            <summary className="min-h-target py-2 font-semibold">
              {players.length} {players.length === 1 ? 'player' : 'players'}
            </summary>
            <Roster meeting={meeting} />
          </details>
        )}
      </div>
    </article>
  );
}
