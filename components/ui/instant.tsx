'use client';

import { useSyncExternalStore } from 'react';
import { sayInstant } from '@/lib/domain/shared/say-date';

const never = () => () => {};
const ownZone = (): string => Intl.DateTimeFormat().resolvedOptions().timeZone || 'UTC';

/** A moment that belongs to no camp: in the reader's own zone once the browser says which, else in UTC; always named. */
export function Instant({ at }: { at: number }) {
  const zone = useSyncExternalStore(never, ownZone, () => 'UTC');
  return (
    <time dateTime={new Date(at).toISOString()} className="font-body tracking-normal">
      {sayInstant(at, zone)}
    </time>
  );
}
