'use client';

import { BrokenPage } from './_components/broken-page';

type ErrorProps = { error: Error & { digest?: string }; reset: () => void };

export default function ErrorPage({ error, reset }: ErrorProps) {
  return (
    <main id="main" className="mx-auto max-w-page px-4 pt-8 sm:px-6">
      <BrokenPage reference={error.digest} again={reset} />
    </main>
  );
}
