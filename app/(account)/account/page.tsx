import type { Metadata } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { TextField } from '@/components/forms/text-field';
import { PageHead } from '@/components/ui/page-head';
import { PASSWORD_LEAST } from '@/lib/domain/account/account-limits';
import { requirePermission } from '@/lib/server/access/require-permission';
import { AddressSection } from './_components/address-section';
import { SignInsSection } from './_components/sign-ins-section';
import { changeNameAction, changePasswordAction } from './actions';

export const metadata: Metadata = { title: 'Your account', robots: { index: false } };

export default async function AccountPage() {
  const { user } = await requirePermission('account.own');
  if (!user) return null;
  return (
    <>
      <PageHead title="Your account" lead={<span className="wrap-anywhere">{user.email}</span>} />
      <div className="grid gap-x-16 gap-y-12 lg:grid-cols-2">
        <section aria-labelledby="name">
          <h2 id="name" className="mb-4 text-h3">
            Name
          </h2>
          <ActionForm
            action={changeNameAction}
            submit="Save the name"
            tone="plain"
            defaultValue={{ name: user.name }}
            done="The name is saved."
          >
            <TextField name="name" label="Name" autoComplete="name" hint="As people call you." />
          </ActionForm>
        </section>
        <AddressSection email={user.email} verified={user.emailVerified} />
        <section aria-labelledby="password">
          <h2 id="password" className="mb-4 text-h3">
            Password
          </h2>
          <ActionForm
            action={changePasswordAction}
            submit="Change the password"
            tone="plain"
            done="The password is changed. Every other sign-in has ended."
          >
            <input type="email" name="username" autoComplete="username" defaultValue={user.email} hidden />
            <TextField
              name="current"
              label="Present password"
              type="password"
              autoComplete="current-password"
            />
            <TextField
              name="password"
              label="New password"
              type="password"
              autoComplete="new-password"
              hint={`${PASSWORD_LEAST} characters or more. Changing it ends your sign-ins on other devices.`}
            />
          </ActionForm>
        </section>
        <SignInsSection userId={user.id} />
      </div>
    </>
  );
}
