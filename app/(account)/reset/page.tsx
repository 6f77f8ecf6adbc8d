import type { Metadata } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { TextField } from '@/components/forms/text-field';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { PASSWORD_LEAST } from '@/lib/domain/account/account-limits';
import { describeLink } from '@/lib/server/auth/describe-link';
import { askResetAction, resetAction } from './actions';

export const metadata: Metadata = { title: 'New password', robots: { index: false } };

type ResetPageProps = { searchParams: Promise<{ token?: string | string[] }> };

export default async function ResetPage({ searchParams }: ResetPageProps) {
  const given = (await searchParams).token;
  const token = typeof given === 'string' ? given : null;
  const link = token === null ? null : await describeLink(token, Date.now());
  if (token !== null && link?.kind === 'reset') return <SetPassword token={token} account={link.account} />;
  return (
    <>
      {token !== null && (
        <Notice tone="stop" title="This link no longer works">
          It was used already, or it is more than an hour old. Ask for another one here.
        </Notice>
      )}
      <PageHead
        title="New password"
        lead="Give the address of your account. We send a link that lets you choose a new password."
      />
      <ActionForm
        action={askResetAction}
        submit="Send the link"
        done="If an account has this address, a letter is on its way. Its link works once, for an hour."
      >
        <TextField name="email" label="E-mail" type="email" autoComplete="username" spellCheck={false} />
      </ActionForm>
    </>
  );
}

function SetPassword({ token, account }: { token: string; account: string }) {
  return (
    <>
      <PageHead
        title="Choose a new password"
        lead="It ends every sign-in of this account on every device, then signs you in here."
      />
      <ActionForm action={resetAction} submit="Set the password" hidden={{ token }}>
        <input type="email" name="username" autoComplete="username" defaultValue={account} hidden />
        <TextField
          name="password"
          label="New password"
          type="password"
          autoComplete="new-password"
          hint={`${PASSWORD_LEAST} characters or more. Three or four words are easy to keep in mind.`}
        />
      </ActionForm>
    </>
  );
}
