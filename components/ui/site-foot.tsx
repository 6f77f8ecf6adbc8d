import type { Route } from 'next';
import Link from 'next/link';

const PAGES: { href: Route; name: string }[] = [
  { href: '/about/cautions', name: 'Playing with care' },
  { href: '/about/accessibility', name: 'Accessibility' },
  { href: '/about/privacy', name: 'Privacy in plain words' },
];

/** The board's lower edge: the small print, which is not that small. */
export function SiteFoot({
  wide = false,
}: {
  /** As wide as the window, as work pages are, and clear of their bar on phones. */ wide?: boolean;
}) {
  return (
    <footer className="no-print mt-10 border-t-2 sm:mt-20 border-ink">
      <div
        className={`mx-auto flex flex-wrap items-baseline justify-between gap-x-8 gap-y-2 px-4 py-6 sm:px-6 ${wide ? 'pb-24 lg:pb-6' : 'max-w-page'}`}
      >
        <nav aria-label="About this site" className="flex flex-wrap gap-x-6">
          {PAGES.map(({ href, name }) => (
            <Link key={href} href={href} className="inline-flex min-h-target items-center">
              {name}
            </Link>
          ))}
        </nav>
        <p className="max-w-prose text-small text-soft">
          Light-headed from playing? Stop, sit down, breathe normally. Loaners are one person’s for the whole
          camp.
        </p>
      </div>
    </footer>
  );
}
