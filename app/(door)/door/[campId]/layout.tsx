import type { Route } from 'next';
import Link from 'next/link';
import type { ReactNode } from 'react';

/** The door has the whole phone to itself: one way back, nothing else. */
export default function DoorLayout({ children }: { children: ReactNode }) {
  return (
    <div className="mx-auto w-full max-w-xl px-4 pb-10">
      <nav aria-label="Site" className="flex justify-between border-b-2 border-ink">
        <Link href={'/door' as Route} className="inline-flex min-h-target items-center font-semibold">
          All doors
        </Link>
      </nav>
      <main id="main" tabIndex={-1} className="pt-4 outline-none">
        {children}
      </main>
    </div>
  );
}
