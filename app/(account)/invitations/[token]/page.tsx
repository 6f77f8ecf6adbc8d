import type { Metadata, Route } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { ButtonLink } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { ROLE_WORDS } from '@/lib/domain/access/roles';
import { getActor } from '@/lib/server/auth/get-actor';
import { getInvitation } from '@/lib/server/staff/get-invitation';
import { acceptInvitationAction } from './actions';

export const metadata: Metadata = { title: 'Invitation', robots: { index: false } };

/** Opening it changes nothing; the button accepts. */
export default async function InvitationPage({ params }: PageProps<'/invitations/[token]'>) {
  const { token } = await params;
  const offer = getInvitation(token, Date.now());
  if (!offer)
    return (
      <PageHead
        title="This invitation no longer works"
        lead="It was used, taken back, or it is more than a week old. Ask the person who invited you for another one."
      />
    );
  const { user } = await getActor();
  return (
    <>
      <PageHead
        over={offer.organisationName}
        title={`${ROLE_WORDS[offer.role]}: will you join?`}
        lead={
          <>
            {offer.invitedBy} invites <strong className="wrap-anywhere text-ink">{offer.email}</strong> to
            work for {offer.organisationName}.
          </>
        }
      />
      {user?.email === offer.email && user.emailVerified ? (
        <ActionForm action={acceptInvitationAction} submit="Accept" hidden={{ token }} />
      ) : (
        <WayThere user={user} email={offer.email} token={token} />
      )}
    </>
  );
}

type WayThereProps = {
  user: { email: string; emailVerified: boolean } | null;
  email: string;
  token: string;
};

/** What is missing before the invitation can be accepted, and where to do it. */
function WayThere({ user, email, token }: WayThereProps) {
  const next = `?next=${encodeURIComponent(`/invitations/${token}`)}`;
  if (!user)
    return (
      <>
        <p className="mb-4 max-w-prose">
          To accept, sign in with the account of this address. If there is none, open one; the letter that
          confirms it brings you back here.
        </p>
        <p className="flex flex-wrap gap-3">
          <ButtonLink href={`/sign-in${next}` as Route} tone="primary">
            Sign in
          </ButtonLink>
          <ButtonLink href={`/sign-up${next}` as Route}>Open an account</ButtonLink>
        </p>
      </>
    );
  if (user.email === email)
    return (
      <Notice title="First confirm your address">
        <p>
          Press the link in the letter that we sent to <span className="wrap-anywhere">{email}</span>, then
          open this page again.
        </p>
        <p className="mt-3">
          <ButtonLink href={'/account' as Route}>Have it sent again</ButtonLink>
        </p>
      </Notice>
    );
  return (
    <Notice tone="stop" title="This is for another address">
      You are signed in as <span className="wrap-anywhere">{user.email}</span>. Sign out, and sign in or open
      an account as <span className="wrap-anywhere">{email}</span>.
    </Notice>
  );
}
