import 'server-only';
import { createElement } from 'react';
import { KnownAddress, knownAddressSubject } from '@/emails/known-address';
import type { LoadLetter } from '../letter';
import { signInLink } from '../links';

export const loadKnownAddress: LoadLetter = ({ toName }) => ({
  subject: knownAddressSubject,
  body: createElement(KnownAddress, { name: toName, signInUrl: signInLink() }),
});
