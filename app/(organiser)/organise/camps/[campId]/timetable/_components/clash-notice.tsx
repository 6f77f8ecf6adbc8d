import { Notice } from '@/components/ui/notice';
import { type Clash, isRefused } from '@/lib/domain/timetable/clash';
import { clashSentence } from '@/lib/domain/timetable/clash-sentence';
import type { Programme } from '@/lib/domain/timetable/programme';
import { titleOfMeeting } from './title-of-meeting';

type ClashNoticeProps = { clashes: readonly Clash[]; programme: Programme; changeover: number };

/** What cannot stand (possible when a track or an instructor changed after placing), and what is worth a look. */
export function ClashNotice({ clashes, programme, changeover }: ClashNoticeProps) {
  const refused = clashes.filter(isRefused);
  const looks = clashes.filter((clash) => !isRefused(clash));
  const list = (some: readonly Clash[]) => (
    <ul className="mt-1 list-disc pl-5">
      {some.map((clash) => (
        <li key={JSON.stringify(clash)}>
          {'otherId' in clash && `${titleOfMeeting(programme, clash.meetingId)}: `}
          {clashSentence(clash, programme)}
        </li>
      ))}
    </ul>
  );
  return (
    <div className="no-print">
      {refused.length > 0 && (
        <Notice
          tone="stop"
          title={refused.length === 1 ? '1 clash to resolve' : `${refused.length} clashes to resolve`}
        >
          {list(refused)}
        </Notice>
      )}
      {looks.length > 0 && (
        <Notice title="Worth a look">
          {looks.length > 3 ? (
            <details>
              <summary className="min-h-target py-2">
                {looks.length} meetings in rooms that are small or quiet for them
              </summary>
              {list(looks)}
            </details>
          ) : (
            list(looks)
          )}
        </Notice>
      )}
      {clashes.length === 0 && programme.meetings.length > 0 && (
        <p className="mb-6 text-soft">
          No clashes among {programme.meetings.length} meetings
          {changeover > 0 && `; ${changeover} minutes kept to change over`}.
        </p>
      )}
    </div>
  );
}
