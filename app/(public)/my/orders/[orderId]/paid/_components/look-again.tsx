'use client';

import { useRouter } from 'next/navigation';
import { useEffect, useState } from 'react';

const EVERY = 3_000;
const TIMES = 40;

/** Loads the page's news afresh every few seconds for two minutes; without JavaScript the browser loads it again itself. */
export function LookAgain() {
  const router = useRouter();
  const [times, setTimes] = useState(0);
  useEffect(() => {
    if (times >= TIMES) return;
    const timer = setTimeout(() => {
      router.refresh();
      setTimes(times + 1);
    }, EVERY);
    return () => clearTimeout(timer);
  }, [times, router]);
  return (
    <>
      <noscript>
        <meta httpEquiv="refresh" content="4" />
      </noscript>
      <a href="?" className="inline-flex min-h-target items-center">
        Look again now
      </a>
    </>
  );
}
