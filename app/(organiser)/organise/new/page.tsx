import type { Metadata } from 'next';
import Link from 'next/link';
import { ActionForm } from '@/components/forms/action-form';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { WorkFrame } from '@/components/ui/work-frame';
import { requirePermission } from '@/lib/server/access/require-permission';
import { OrganisationFields } from '../../_components/organisation-fields';
import { createOrganisationAction } from './actions';

export const metadata: Metadata = { title: 'Start an organisation' };

export default async function NewOrganisationPage() {
  const { user } = await requirePermission('organisation.create');
  return (
    <WorkFrame name="Organise" entries={[]}>
      <PageHead
        over={<Link href="/organise">Everything I organise</Link>}
        title="Start an organisation"
        lead="It holds your camps and the people who run them with you. You are its organiser."
      />
      {user && !user.emailVerified && (
        <Notice title="Prove your e-mail first">
          <p>We sent a link to {user.email}. Open it, then come back: invitations go out in your name.</p>
        </Notice>
      )}
      <ActionForm action={createOrganisationAction} submit="Start" defaultValue={{ email: user?.email }}>
        <OrganisationFields />
      </ActionForm>
    </WorkFrame>
  );
}
