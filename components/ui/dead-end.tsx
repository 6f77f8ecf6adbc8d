import type { Route } from 'next';
import type { ReactNode } from 'react';
import { StripHoles } from '../harp/strip-holes';
import { ButtonLink } from './button';

type DeadEndProps = {
  title: string;
  children: ReactNode;
  /** The next thing to do; the list of camps unless said otherwise. */
  way?: { href: string; words: string };
  beside?: ReactNode;
};

// One reed missing: nine holes sound and one is empty.
const LOOKS = [
  'filled',
  'filled',
  'filled',
  'open',
  'filled',
  'filled',
  'filled',
  'filled',
  'filled',
  'filled',
] as const;

/** A page that cannot be shown: what happened, and where to go on. */
export function DeadEnd({
  title,
  children,
  way = { href: '/', words: 'See all camps' },
  beside,
}: DeadEndProps) {
  return (
    <div className="max-w-prose py-6 sm:py-12">
      <StripHoles looks={LOOKS} className="max-w-64" />
      <h1 className="mt-6">{title}</h1>
      <div className="mt-4 space-y-3 text-lead">{children}</div>
      <div className="mt-8 flex flex-wrap gap-4">
        <ButtonLink href={way.href as Route}>{way.words}</ButtonLink>
        {beside}
      </div>
    </div>
  );
}
