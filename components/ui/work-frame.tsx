import type { ReactNode } from 'react';
import { BottomBar } from './bottom-bar';
import { type RailEntry, RailLink } from './rail-link';

type WorkFrameProps = {
  /** Whose rail it is, for those who hear it: the camp's name. */
  name: string;
  /** Above the entries: where one is. */
  head?: ReactNode;
  /** The same on a phone, where the page's own title follows at once. */
  phoneHead?: ReactNode;
  entries: readonly RailEntry[];
  children: ReactNode;
};

/** A work page: a left rail of plain words on wide screens, a bottom bar on phones, and the page itself. */
export function WorkFrame({ name, head, phoneHead, entries, children }: WorkFrameProps) {
  return (
    <div className="flex min-h-[75dvh]">
      {entries.length > 0 && (
        <div className="no-print hidden w-56 shrink-0 border-r-2 border-line lg:block">
          <nav aria-label={name} className="sticky top-0 max-h-dvh overflow-y-auto py-8 pl-6">
            {head && <div className="mb-4 pr-4">{head}</div>}
            <ul>
              {entries.map((entry) => (
                <li key={entry.href} className={entry.apart ? 'mt-3 border-t border-line pt-3' : ''}>
                  <RailLink {...entry} />
                </li>
              ))}
            </ul>
          </nav>
        </div>
      )}
      <main
        id="main"
        tabIndex={-1}
        className="min-w-0 flex-1 px-4 pt-6 outline-none sm:px-6 lg:px-10 lg:pt-8"
      >
        {phoneHead && <div className="no-print mb-2 lg:hidden">{phoneHead}</div>}
        {children}
      </main>
      {entries.length > 0 && <BottomBar name={name} entries={entries} />}
    </div>
  );
}
