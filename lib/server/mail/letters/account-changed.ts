import 'server-only';
import { createElement } from 'react';
import { AccountChanged, type AccountChangedProps, accountChangedSubject } from '@/emails/account-changed';
import type { LoadLetter } from '../letter';
import { askResetLink } from '../links';
import { requirePayload } from './require-payload';

export const loadAccountChanged: LoadLetter = ({ payload, toName }) => {
  const change = requirePayload(payload, 'change') === 'address' ? 'address' : 'password';
  const props: AccountChangedProps = { name: toName, change, resetUrl: askResetLink() };
  return { subject: accountChangedSubject(props), body: createElement(AccountChanged, props) };
};
