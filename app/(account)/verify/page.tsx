import type { Metadata, Route } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { TextField } from '@/components/forms/text-field';
import { ButtonLink } from '@/components/ui/button';
import { PageHead } from '@/components/ui/page-head';
import { describeLink } from '@/lib/server/auth/describe-link';
import { verifyAction } from './actions';

export const metadata: Metadata = { title: 'Confirm your address', robots: { index: false } };

type VerifyPageProps = { searchParams: Promise<{ token?: string | string[] }> };

/** Opening it changes nothing, since mail programs open links by themselves; the button does. */
export default async function VerifyPage({ searchParams }: VerifyPageProps) {
  const given = (await searchParams).token;
  const token = typeof given === 'string' ? given : '';
  const link = await describeLink(token, Date.now());
  if (!link || link.kind === 'reset') return <Spent />;
  return (
    <>
      <PageHead
        title="Confirm your address"
        lead={
          <>
            {link.kind === 'change' ? 'Your account moves to ' : 'This letter went to '}
            <strong className="wrap-anywhere text-ink">{link.email}</strong>.
          </>
        }
      />
      <ActionForm action={verifyAction} submit="Yes, this address is mine" hidden={{ token }}>
        {link.asksPassword && (
          <>
            <input type="email" name="username" autoComplete="username" defaultValue={link.account} hidden />
            <TextField
              name="password"
              label="Password"
              type="password"
              autoComplete="current-password"
              hint="The one you chose for this account. If you did not open it, leave this page: without the password nobody can use your address."
            />
          </>
        )}
      </ActionForm>
    </>
  );
}

function Spent() {
  return (
    <>
      <PageHead
        title="This link no longer works"
        lead="It was used already, or it is more than 24 hours old, or it was cut short on its way here."
      />
      <p className="max-w-prose">
        If you pressed it before, your address is confirmed: sign in. Otherwise sign in and have another one
        sent from your account page.
      </p>
      <p className="mt-6">
        <ButtonLink href={'/sign-in?next=/account' as Route} tone="primary">
          Sign in
        </ButtonLink>
      </p>
    </>
  );
}
