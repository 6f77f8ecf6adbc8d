import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { requireOrganisation } from '@/lib/server/organisations/require-organisation';
import { listInvitations } from '@/lib/server/staff/list-invitations';
import { listStaff } from '@/lib/server/staff/list-staff';
import { InvitationList } from './_components/invitation-list';
import { InviteForm } from './_components/invite-form';
import { StaffList } from './_components/staff-list';

export const metadata: Metadata = { title: 'Staff' };

export default async function StaffPage({
  params,
}: PageProps<'/organise/organisations/[organisationId]/staff'>) {
  const { actor, organisation } = await requireOrganisation((await params).organisationId, 'staff.manage');
  const invitations = listInvitations(actor, organisation.id);
  return (
    <>
      <PageHead
        over={organisation.name}
        title="Staff"
        lead="Who works with you, and what each may do. A role that you take away ends at once."
      />
      <StaffList people={listStaff(actor, organisation.id)} organisationId={organisation.id} />
      {invitations.length > 0 && (
        <Section id="invited" title="Invited">
          <InvitationList invitations={invitations} organisationId={organisation.id} now={Date.now()} />
        </Section>
      )}
      <Section id="invite" title="Invite">
        <InviteForm organisationId={organisation.id} />
      </Section>
    </>
  );
}
