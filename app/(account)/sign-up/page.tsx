import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { ActionForm } from '@/components/forms/action-form';
import { TextField } from '@/components/forms/text-field';
import { PageHead } from '@/components/ui/page-head';
import { PASSWORD_LEAST } from '@/lib/domain/account/account-limits';
import { safeNext } from '@/lib/domain/account/safe-next';
import { getActor } from '@/lib/server/auth/get-actor';
import { signUpAction } from './actions';

export const metadata: Metadata = { title: 'Open an account', robots: { index: false } };

type SignUpPageProps = { searchParams: Promise<{ next?: string | string[] }> };

export default async function SignUpPage({ searchParams }: SignUpPageProps) {
  const asked = (await searchParams).next;
  const next = safeNext(typeof asked === 'string' ? asked : null);
  if ((await getActor()).user) redirect((next ?? '/account') as Route);
  return (
    <>
      <PageHead
        title="Open an account"
        lead="One account keeps all your bookings, tickets and packing lists. Organisers and crew need one to work."
      />
      <ActionForm action={signUpAction} submit="Open the account" hidden={next ? { next } : {}}>
        <TextField name="name" label="Name" autoComplete="name" hint="As people call you." />
        <TextField
          name="email"
          label="E-mail"
          type="email"
          autoComplete="email"
          spellCheck={false}
          hint="We write to it once, to see that it is yours."
        />
        <TextField
          name="password"
          label="Password"
          type="password"
          autoComplete="new-password"
          hint={`${PASSWORD_LEAST} characters or more. Three or four words are easy to keep in mind.`}
        />
      </ActionForm>
      <p className="mt-8">
        <Link
          className="inline-flex min-h-target items-center"
          href={`/sign-in${next ? `?next=${encodeURIComponent(next)}` : ''}` as Route}
        >
          I have an account
        </Link>
      </p>
    </>
  );
}
