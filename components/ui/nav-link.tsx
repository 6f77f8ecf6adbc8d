'use client';

import type { Route } from 'next';
import Link from 'next/link';
import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';

type NavLinkProps = {
  href: Route;
  children: ReactNode /** Only this very page counts as "here", not those below it. */;
  exact?: boolean;
};

/** A place of the site, in plain words; the one we are at has a thick line under it and says so. */
export function NavLink({ href, children, exact = false }: NavLinkProps) {
  const path = usePathname();
  const here = path === href || (!exact && path.startsWith(`${href}/`));
  return (
    <Link
      href={href}
      prefetch={false}
      aria-current={here ? 'page' : undefined}
      className="inline-flex min-h-target min-w-0 items-center border-b-4 border-transparent px-1 pt-1 font-semibold text-ink no-underline hover:border-line aria-[current]:border-pine"
    >
      {children}
    </Link>
  );
}
