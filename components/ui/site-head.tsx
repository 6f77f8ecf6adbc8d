import type { Route } from 'next';
import Link from 'next/link';
import type { Actor } from '@/lib/domain/access/actor';
import { TenHoleStrip } from '../harp/ten-hole-strip';
import { NavLink } from './nav-link';

type SiteHeadProps = {
  actor: Pick<Actor, 'user' | 'roles'>;
  /** As wide as the window, as work pages are. */
  wide?: boolean;
  /** Ends the session; without it there is no button. */
  signOut?: (form: FormData) => Promise<void>;
};

/** The board's top edge: name, the places one may go, and who one is. */
export function SiteHead({ actor, wide = false, signOut }: SiteHeadProps) {
  const staff = actor.roles.length > 0;
  const door = actor.roles.some(({ role }) => role === 'door' || role === 'organiser');
  return (
    <header className="no-print border-b-2 border-ink">
      <div
        className={`mx-auto flex flex-wrap items-end justify-between gap-x-3 px-4 pt-2 sm:gap-x-8 sm:px-6 sm:pt-3 ${wide ? '' : 'max-w-page'}`}
      >
        <Link
          href="/"
          className="mb-2 inline-block shrink-0 pt-0.5 font-head text-[1.45rem] font-extrabold leading-none tracking-tight text-pine no-underline sm:text-[1.75rem]"
        >
          Combwood
          <TenHoleStrip mode="mark" className="mt-1 max-w-[6.55rem] sm:max-w-[7.9rem]" />
        </Link>
        <nav
          aria-label="Site"
          className="order-3 -ml-1 flex w-full flex-wrap gap-x-5 sm:order-2 sm:ml-0 sm:w-auto"
        >
          <NavLink href="/" exact>
            Camps
          </NavLink>
          <NavLink href={'/my' as Route}>My bookings</NavLink>
          {staff && <NavLink href={'/organise' as Route}>Organise</NavLink>}
          {door && <NavLink href={'/door' as Route}>Door</NavLink>}
        </nav>
        <div className="order-2 flex min-h-target min-w-0 flex-1 items-center justify-end gap-x-2 sm:order-3 sm:ml-auto sm:flex-none sm:gap-x-4">
          {actor.user ? (
            <>
              <NavLink href={'/account' as Route}>
                <span className="max-w-[11rem] truncate">{actor.user.name}</span>
              </NavLink>
              {signOut && (
                <form action={signOut} className="shrink-0">
                  <button
                    type="submit"
                    className="inline-flex min-h-target items-center whitespace-nowrap px-1 text-lake underline underline-offset-4 hover:decoration-2"
                  >
                    Sign out
                  </button>
                </form>
              )}
            </>
          ) : (
            <NavLink href={'/sign-in' as Route}>Sign in</NavLink>
          )}
        </div>
      </div>
    </header>
  );
}
