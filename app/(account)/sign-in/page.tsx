import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { ActionForm } from '@/components/forms/action-form';
import { TextField } from '@/components/forms/text-field';
import { PageHead } from '@/components/ui/page-head';
import { homeFor } from '@/lib/domain/account/home-for';
import { safeNext } from '@/lib/domain/account/safe-next';
import { getActor } from '@/lib/server/auth/get-actor';
import { signInAction } from './actions';

export const metadata: Metadata = { title: 'Sign in', robots: { index: false } };

type SignInPageProps = { searchParams: Promise<{ next?: string | string[] }> };

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const asked = (await searchParams).next;
  const next = safeNext(typeof asked === 'string' ? asked : null);
  const actor = await getActor();
  if (actor.user) redirect((next ?? homeFor(actor.roles)) as Route);
  const onward = next ? `?next=${encodeURIComponent(next)}` : '';
  return (
    <>
      <PageHead
        title="Sign in"
        lead={next ? 'The page you asked for needs to know who you are.' : undefined}
      />
      <ActionForm action={signInAction} submit="Sign in" hidden={next ? { next } : {}}>
        <TextField name="email" label="E-mail" type="email" autoComplete="username" spellCheck={false} />
        <TextField name="password" label="Password" type="password" autoComplete="current-password" />
      </ActionForm>
      <ul className="mt-8 grid gap-1">
        <li>
          <Link className="inline-flex min-h-target items-center" href={'/reset' as Route}>
            Set a new password by mail
          </Link>
        </li>
        <li>
          <Link className="inline-flex min-h-target items-center" href={`/sign-up${onward}` as Route}>
            Open an account
          </Link>
        </li>
      </ul>
    </>
  );
}
