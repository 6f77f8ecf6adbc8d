import 'server-only';
import { createElement } from 'react';
import { PackingListLetter, packingListSubject } from '@/emails/packing-list';
import { isId } from '@/lib/domain/shared/ids';
import { loadAttendee } from '../../packing/load-attendee';
import type { LoadLetter } from '../letter';
import { registrationLink } from '../links';
import { organiserAddress } from './organiser-address';
import { requirePayload } from './require-payload';

export const loadPackingList: LoadLetter = ({ payload, toName }) => {
  const id = requirePayload(payload, 'registrationId');
  const attendee = isId('reg', id) ? loadAttendee(id) : null;
  if (!attendee) throw new Error('There is no such registration');
  const { camp } = attendee.programme;
  return {
    subject: packingListSubject({ camp }),
    replyTo: organiserAddress({ name: camp.organisationName, email: camp.organisationEmail }),
    body: createElement(PackingListLetter, {
      attendeeName: toName,
      camp,
      organisationName: camp.organisationName,
      list: attendee.packing,
      url: registrationLink(attendee.person.id),
    }),
  };
};
