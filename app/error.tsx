'use client';

import { BrokenPage } from './_components/broken-page';

type ErrorProps = { error: Error & { digest?: string }; reset: () => void };

export default function ErrorPage({ error, reset }: ErrorProps) {
  return <BrokenPage reference={error.digest} again={reset} />;
}
