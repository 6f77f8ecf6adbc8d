'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { isHere, type RailEntry } from './rail-link';

const MOST = 4;
const CELL =
  'flex min-h-14 w-full items-center justify-center border-t-4 border-transparent px-1 text-center text-small font-semibold leading-tight text-ink no-underline aria-[current]:border-pine aria-[current]:text-pine';

/** The rail on a phone: the nearest entries in a bar under the thumb, the rest behind "More", which needs no script. */
export function BottomBar({ name, entries }: { name: string; entries: readonly RailEntry[] }) {
  const path = usePathname();
  const near = entries.length <= MOST + 1 ? entries : entries.filter((entry) => entry.near).slice(0, MOST);
  const far = entries.filter((entry) => !near.includes(entry));
  const farHere = far.some((entry) => isHere(path, entry));
  return (
    <nav
      aria-label={name}
      className="no-print fixed inset-x-0 bottom-0 z-40 flex border-t-2 border-ink bg-board pb-[env(safe-area-inset-bottom)] lg:hidden"
    >
      <ul className="flex flex-[4]">
        {near.map((entry) => (
          <li key={entry.href} className="flex flex-1">
            <Link
              href={entry.href}
              prefetch={false}
              aria-current={isHere(path, entry) ? 'page' : undefined}
              className={CELL}
            >
              {entry.word}
            </Link>
          </li>
        ))}
      </ul>
      {far.length > 0 && (
        // Another address is another list, and that one is closed.
        <details key={path} className="flex-1">
          <summary className={`${CELL} list-none`} aria-current={farHere || undefined}>
            More
          </summary>
          <ul className="absolute inset-x-0 bottom-full grid max-h-[70dvh] grid-cols-2 overflow-y-auto border-t-2 border-ink bg-panel py-2">
            {far.map((entry) => (
              <li key={entry.href}>
                <Link
                  href={entry.href}
                  prefetch={false}
                  aria-current={isHere(path, entry) ? 'page' : undefined}
                  className="flex min-h-target items-center px-6 text-ink no-underline aria-[current]:font-bold"
                >
                  {entry.word}
                </Link>
              </li>
            ))}
          </ul>
        </details>
      )}
    </nav>
  );
}
