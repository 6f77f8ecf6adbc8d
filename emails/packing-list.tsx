import type { PackingLine, PackingList } from '@/lib/domain/packing/packing-list';
import { sayDays, sayShortDay } from '@/lib/domain/shared/say-date';
import { LetterFrame } from './parts/letter-frame';
import { Para, Part, PressLink, Small } from './parts/letter-parts';

export type PackingListLetterProps = {
  attendeeName: string;
  camp: { name: string; startsOn: string; endsOn: string; timeZone: string };
  organisationName: string;
  list: Pick<PackingList, 'lines' | 'days'>;
  url: string;
};

export const packingListSubject = ({ camp }: Pick<PackingListLetterProps, 'camp'>): string =>
  `Which harps to pack for ${camp.name}`;

const Harp = ({ line }: { line: PackingLine }) => {
  const [first] = line.uses;
  const more = new Set(line.uses.map(({ meetingId }) => meetingId)).size - 1;
  return (
    <Para>
      <strong>{line.label} harp</strong>
      {first && `: ${first.workshop}, ${sayShortDay(first.day)} ${first.starts}`}
      {first?.sentence.includes('→') && ` (${first.sentence})`}
      {more > 0 && `, and ${more} more ${more === 1 ? 'meeting' : 'meetings'}`}
    </Para>
  );
};

const HarpPart = ({ title, lines }: { title: string; lines: PackingLine[] }) =>
  lines.length > 0 && (
    <Part title={title}>
      {lines.map((line) => (
        <Harp key={line.id} line={line} />
      ))}
    </Part>
  );

export function PackingListLetter({
  attendeeName,
  camp,
  organisationName,
  list,
  url,
}: PackingListLetterProps) {
  const of = (source: PackingLine['source']) =>
    list.lines.filter((line) => line.level === 'required' && line.source === source);
  const helpful = list.lines.filter(({ level }) => level === 'helpful');
  return (
    <LetterFrame
      preview={`${of('bring').length} to get, ${of('owned').length} to pack from your own`}
      title="Your packing list"
      foot={`You get this because you have a place at a camp of ${organisationName}. Questions about a harp? Answer this mail.`}
    >
      <Para>Hello {attendeeName},</Para>
      <Para>
        These are the harps that your own workshops at {camp.name} ({sayDays(camp.startsOn, camp.endsOn)}) ask
        for. Times are local to the camp ({camp.timeZone}).
      </Para>
      {list.lines.length === 0 && (
        <Para>
          {list.days.length > 0
            ? 'They work with a harp in any key. Bring the ones you like to play.'
            : 'None of them asks for a harp so far.'}
        </Para>
      )}
      <HarpPart title="To get before camp" lines={of('bring')} />
      <HarpPart title="Kept for you at camp" lines={of('loaner')} />
      <HarpPart title="Pack from your own" lines={of('owned')} />
      <HarpPart title="Helpful, not required" lines={helpful} />
      {list.lines.some(({ uses }) => uses.some(({ sentence }) => sentence.includes('→'))) && (
        <Para>
          A position says how a song lies on the harp. You need not know it: take the harp after the arrow.
        </Para>
      )}
      <PressLink href={url}>See it day by day</PressLink>
      <Para>
        The page behind the button has your timetable and ticket too. Tell it when you get another harp: the
        list changes with what you own.
      </Para>
      <Small>
        A harp goes in the mouth: play your own, and never share one. If playing makes you light-headed, stop,
        sit down and breathe normally; ask a doctor before camp if you have a breathing condition.
      </Small>
    </LetterFrame>
  );
}
