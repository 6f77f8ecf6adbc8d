import { Temporal } from 'temporal-polyfill';

/**
 * The VTIMEZONE component (RFC 5545, 3.6.5) of an IANA zone, with each change of its offset that bears on the days
 * from `first` to `last` (ISO dates) written out, so that a reader needs no zone data of its own. Lines part by CRLF.
 */
export function vtimezone(timeZone: string, first: string, last: string): string {
  const from = Temporal.PlainDate.from(first).subtract({ days: 1 }).toZonedDateTime(timeZone);
  // Ends may run past midnight of the last day.
  const until = Temporal.PlainDate.from(last).add({ days: 2 }).toZonedDateTime(timeZone);
  const before = from.getTimeZoneTransition('previous');
  const observances = [before ? observance(before) : fixed(from.offset)];
  for (
    let change = from.getTimeZoneTransition('next');
    change && Temporal.ZonedDateTime.compare(change, until) < 0;
    change = change.getTimeZoneTransition('next')
  )
    observances.push(observance(change));
  return ['BEGIN:VTIMEZONE', `TZID:${timeZone}`, ...observances.flat(), 'END:VTIMEZONE'].join('\r\n');
}

function observance(change: Temporal.ZonedDateTime): string[] {
  const earlier = change.subtract({ nanoseconds: 1 });
  const kind = change.offsetNanoseconds > earlier.offsetNanoseconds ? 'DAYLIGHT' : 'STANDARD';
  // The onset is told in the wall time that was in force until then.
  const nanoseconds = earlier.offsetNanoseconds - change.offsetNanoseconds;
  const onset = change.toPlainDateTime().add({ nanoseconds });
  return lines(kind, stamp(onset), earlier.offset, change.offset);
}

/** A zone that has never changed its offset. */
const fixed = (offset: string): string[] => lines('STANDARD', '19700101T000000', offset, offset);

const lines = (kind: string, start: string, from: string, to: string): string[] => [
  `BEGIN:${kind}`,
  `DTSTART:${start}`,
  `TZOFFSETFROM:${from.replaceAll(':', '')}`,
  `TZOFFSETTO:${to.replaceAll(':', '')}`,
  `END:${kind}`,
];

const stamp = (at: Temporal.PlainDateTime): string =>
  at.toString({ smallestUnit: 'second' }).replace(/[-:]/g, '');
