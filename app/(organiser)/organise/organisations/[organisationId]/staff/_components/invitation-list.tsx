import { ActionForm } from '@/components/forms/action-form';
import { Instant } from '@/components/ui/instant';
import { StateMark } from '@/components/ui/state-mark';
import { ROLE_WORDS } from '@/lib/domain/access/roles';
import type { OrganisationId } from '@/lib/domain/shared/ids';
import type { InvitationRow } from '@/lib/server/staff/list-invitations';
import { resendInvitationAction, revokeInvitationAction } from '../actions';

type InvitationListProps = {
  invitations: readonly InvitationRow[];
  organisationId: OrganisationId;
  now: number;
};

/** Invitations without an answer, each to be sent again or taken back. */
export function InvitationList({ invitations, organisationId, now }: InvitationListProps) {
  return (
    <ul aria-label="Invitations" className="border-t border-line">
      {invitations.map(({ id, email, role, expiresAt }) => {
        const hidden = { organisationId, invitationId: id };
        const who = `${email}, ${ROLE_WORDS[role]}`;
        return (
          <li
            key={id}
            className="flex flex-wrap items-center justify-between gap-x-8 gap-y-2 border-b border-line py-3"
          >
            <div className="min-w-0">
              <p className="wrap-anywhere font-semibold">{email}</p>
              <p className="text-small text-soft">
                {ROLE_WORDS[role]} · the link {expiresAt > now ? 'works until' : 'worked until'}{' '}
                <Instant at={expiresAt} />
              </p>
              <StateMark tone={expiresAt > now ? 'wait' : 'off'}>
                {expiresAt > now ? 'no answer yet' : 'ran out'}
              </StateMark>
            </div>
            <div className="flex flex-wrap items-start gap-3">
              <ActionForm
                action={resendInvitationAction}
                submit="Send again"
                submitLabel={`Send again: ${who}`}
                tone="plain"
                hidden={hidden}
                done="Sent. The new link works for a week."
              />
              <ActionForm
                action={revokeInvitationAction}
                submit="Take back"
                submitLabel={`Take back: ${who}`}
                tone="danger"
                hidden={hidden}
              />
            </div>
          </li>
        );
      })}
    </ul>
  );
}
