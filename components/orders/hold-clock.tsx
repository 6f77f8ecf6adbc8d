'use client';

import { useEffect, useState } from 'react';

type HoldClockProps = {
  /** Epoch ms at which the place goes back. */
  until: number;
  /** The same in words with day and zone. */
  untilWords: string;
  /** The server's clock when the page was made: what stands here without JavaScript, and the start with it. */
  now: number;
};

const WARN_AT = [5, 2, 1];

const leftWords = (ms: number): string => {
  const seconds = Math.max(0, Math.ceil(ms / 1000));
  const minutes = Math.floor(seconds / 60);
  return `${minutes}:${String(seconds % 60).padStart(2, '0')}`;
};

const minuteWords = (minutes: number): string => `${minutes} ${minutes === 1 ? 'minute' : 'minutes'}`;

/** How long a place is still held: counts down to the eye, is said at five, two and one minute, and at the end. */
export function HoldClock({ until, untilWords, now }: HoldClockProps) {
  const [left, setLeft] = useState(until - now);
  useEffect(() => {
    // From the server's clock, moved on by our own: a phone that is an hour off still counts right.
    const started = performance.now();
    const timer = setInterval(() => setLeft(until - now - (performance.now() - started)), 1000);
    return () => clearInterval(timer);
  }, [until, now]);

  const warned = WARN_AT.filter((minutes) => left <= minutes * 60_000).at(-1);
  const over = left <= 0;
  return (
    <div className={`border-l-8 bg-panel px-5 py-4 ${warned || over ? 'border-reed' : 'border-lake'}`}>
      <p className="font-bold">{over ? 'The time is over' : 'Your place is held'}</p>
      {over ? (
        <p>
          The place goes back for others. <a href="?">Load the page again</a> to see what you can do.
        </p>
      ) : (
        <p>
          Until{' '}
          <time dateTime={new Date(until).toISOString()} className="font-body tracking-normal">
            {untilWords}
          </time>
          :{' '}
          <span aria-hidden="true">
            <span className="figures font-bold">{leftWords(left)}</span> minutes left.
          </span>
          <span className="sr-only">{minuteWords(Math.ceil(left / 60_000))} left.</span>
        </p>
      )}
      <p role="status" className="font-semibold text-reed empty:hidden">
        {!over && warned && `Less than ${minuteWords(warned)} left to pay.`}
      </p>
    </div>
  );
}
