import 'server-only';
import { createElement } from 'react';
import { Invite, type InviteProps, inviteSubject } from '@/emails/invite';
import { ROLE_WORDS, STAFF_ROLES } from '@/lib/domain/access/roles';
import { INVITE_DAYS } from '@/lib/domain/account/link-limits';
import type { LoadLetter } from '../letter';
import { inviteLink } from '../links';
import { requirePayload } from './require-payload';

export const loadInvite: LoadLetter = ({ payload }) => {
  const given = requirePayload(payload, 'role');
  const role = STAFF_ROLES.find((known) => known === given);
  const props: InviteProps = {
    organisationName: requirePayload(payload, 'organisationName'),
    role: role ? ROLE_WORDS[role].toLowerCase() : given,
    invitedBy: requirePayload(payload, 'invitedBy'),
    url: inviteLink(requirePayload(payload, 'token')),
    days: INVITE_DAYS,
  };
  return { subject: inviteSubject(props), body: createElement(Invite, props) };
};
