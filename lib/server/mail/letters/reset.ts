import 'server-only';
import { createElement } from 'react';
import { Reset, resetSubject } from '@/emails/reset';
import { RESET_MINUTES } from '@/lib/domain/account/link-limits';
import type { LoadLetter } from '../letter';
import { resetLink } from '../links';
import { requirePayload } from './require-payload';

export const loadReset: LoadLetter = ({ payload, toName }) => ({
  subject: resetSubject,
  body: createElement(Reset, {
    name: toName,
    url: resetLink(requirePayload(payload, 'token')),
    minutes: RESET_MINUTES,
  }),
});
