import 'server-only';
import { createElement } from 'react';
import { Verify, verifySubject } from '@/emails/verify';
import { VERIFY_HOURS } from '@/lib/domain/account/link-limits';
import type { LoadLetter } from '../letter';
import { verifyLink } from '../links';
import { requirePayload } from './require-payload';

export const loadVerify: LoadLetter = ({ payload, toName }) => ({
  subject: verifySubject,
  body: createElement(Verify, {
    name: toName,
    url: verifyLink(requirePayload(payload, 'token')),
    hours: VERIFY_HOURS,
  }),
});
