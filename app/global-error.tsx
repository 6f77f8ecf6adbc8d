'use client';

import './globals.css';
import { BrokenPage } from './_components/broken-page';

type GlobalErrorProps = { error: Error & { digest?: string }; reset: () => void };

/** Shown when the layout itself breaks, so it brings a page of its own. */
export default function GlobalError({ error, reset }: GlobalErrorProps) {
  return (
    <html lang="en">
      <body>
        <title>Something went wrong · Combwood</title>
        <BrokenPage reference={error.digest} again={reset} />
      </body>
    </html>
  );
}
