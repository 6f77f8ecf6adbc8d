import type { ProgrammeCamp } from '@/lib/domain/timetable/programme';
import { PlainText } from '../ui/plain-text';

/** Refund terms, whom to write to, the calendar, and the cautions where they matter. */
export function TakingPart({ camp }: { camp: ProgrammeCamp }) {
  return (
    <div className="grid gap-x-10 gap-y-8 lg:grid-cols-2">
      <div>
        <h3 className="mb-2">If you cannot come</h3>
        {camp.refundTerms ? (
          <PlainText text={camp.refundTerms} />
        ) : (
          <p className="text-soft">The organiser has not written the refund terms yet.</p>
        )}
        <p className="mt-2 text-small text-soft">
          These terms are kept with your booking as they stand when you register.
        </p>
      </div>
      <div>
        <h3 className="mb-2">Questions</h3>
        <p>
          Write to {camp.organisationName}:{' '}
          <a href={`mailto:${camp.organisationEmail}`} className="inline-block break-all">
            {camp.organisationEmail}
          </a>
        </p>
        <p className="mt-2">
          <a href={`/camps/${camp.slug}/calendar.ics`}>Programme for your calendar</a>{' '}
          <span className="text-soft">
            (iCalendar; subscribe to its address and changes arrive by themselves)
          </span>
        </p>
      </div>
      <div className="lg:col-span-2">
        <h3 className="mb-2">Playing with care</h3>
        <p className="max-w-prose">
          If you feel light-headed from playing, stop, sit down and breathe normally; ask your doctor first if
          you have a breathing condition. Bring ear plugs for amplified sessions. A borrowed harp is yours
          alone for the whole camp and is cleaned and rested before the next player.{' '}
          <a href="/about/cautions">More on care</a>
        </p>
      </div>
    </div>
  );
}
