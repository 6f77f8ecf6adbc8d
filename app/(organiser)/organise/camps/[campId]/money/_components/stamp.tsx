import { localClock, localDay } from '@/lib/domain/shared/local-time';

/** Day and time as a column of a book shows them; the column's head names the zone. */
export function Stamp({ at, timeZone }: { at: number; timeZone: string }) {
  return (
    <time className="whitespace-nowrap">
      {localDay(at, timeZone)} {localClock(at, timeZone)}
    </time>
  );
}
