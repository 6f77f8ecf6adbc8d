import { ActionForm } from '@/components/forms/action-form';
import { Instant } from '@/components/ui/instant';
import { StateMark } from '@/components/ui/state-mark';
import type { UserId } from '@/lib/domain/shared/ids';
import { listSessions } from '@/lib/server/auth/list-sessions';
import { signOutEverywhereAction } from '../../sign-out/actions';
import { endSessionAction } from '../actions';

/** Where one is signed in, each with a button that ends it. */
export async function SignInsSection({ userId }: { userId: UserId }) {
  const rows = await listSessions(userId, Date.now());
  return (
    <section aria-labelledby="sign-ins">
      <h2 id="sign-ins" className="mb-4 text-h3">
        Where you are signed in
      </h2>
      <ul className="mb-6 max-w-prose border-t border-line">
        {rows.map((row) => (
          <li
            key={row.id}
            className="flex min-h-target flex-wrap items-center justify-between gap-x-6 gap-y-1 border-b border-line py-2"
          >
            <div>
              <p className="font-semibold">{row.device}</p>
              <p className="text-small text-soft">
                since <Instant at={row.createdAt} />
              </p>
            </div>
            {row.here ? (
              <StateMark tone="done">this browser</StateMark>
            ) : (
              <ActionForm
                action={endSessionAction}
                submit="End it"
                tone="quiet"
                hidden={{ sessionId: row.id }}
                submitLabel={`End it: the sign-in of ${row.device}`}
                className=""
              />
            )}
          </li>
        ))}
      </ul>
      <p className="mb-4 max-w-prose text-soft">
        A sign-in ends by itself after a week without use, and after 30 days in any case.
      </p>
      <ActionForm action={signOutEverywhereAction} submit="Sign out everywhere" tone="danger" />
    </section>
  );
}
