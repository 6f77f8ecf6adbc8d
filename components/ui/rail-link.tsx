'use client';

import type { Route } from 'next';
import Link from 'next/link';
import { usePathname } from 'next/navigation';

export type RailEntry = {
  href: Route;
  word: string;
  /** Only this very page is "here", not those below it. */
  exact?: boolean;
  /** Begins a new group. */
  apart?: boolean;
  /** One of the few that a phone's bar has room for. */
  near?: boolean;
};

export const isHere = (path: string, { href, exact }: Pick<RailEntry, 'href' | 'exact'>): boolean =>
  path === href || (!exact && path.startsWith(`${href}/`));

/**
 * An entry of the rail; the one we are at has a thick bar at its edge. Nothing is fetched ahead, here and in the other
 * menus: each page is made anew, and a menu would have a dozen made that nobody opens.
 */
export function RailLink({ href, word, exact }: RailEntry) {
  const here = isHere(usePathname(), { href, exact });
  return (
    <Link
      href={href}
      prefetch={false}
      aria-current={here ? 'page' : undefined}
      className="-mr-0.5 flex min-h-target items-center border-r-4 border-transparent pr-4 text-ink no-underline hover:border-line hover:underline aria-[current]:border-pine aria-[current]:font-bold"
    >
      {word}
    </Link>
  );
}
