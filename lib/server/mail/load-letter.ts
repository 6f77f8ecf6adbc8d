import 'server-only';
import type { MailKind } from '@/db/schema/mail';
import { oneLine } from '@/lib/domain/mail/mail-address';
import type { MailRow } from './lease-mail';
import type { Letter, LoadLetter } from './letter';
import { loadAccountChanged } from './letters/account-changed';
import { loadBookingLink } from './letters/booking-link';
import { loadInvite } from './letters/invite';
import { loadKnownAddress } from './letters/known-address';
import { loadLatePayment } from './letters/late-payment';
import { loadOrderConfirmed } from './letters/order-confirmed';
import { loadPackingList } from './letters/packing-list';
import { loadReset } from './letters/reset';
import { loadVerify } from './letters/verify';

/** Who writes which letter. */
const LOADERS: Record<MailKind, LoadLetter> = {
  verify: loadVerify,
  'known-address': loadKnownAddress,
  reset: loadReset,
  'account-changed': loadAccountChanged,
  invite: loadInvite,
  'order-confirmed': loadOrderConfirmed,
  'packing-list': loadPackingList,
  'late-payment': loadLatePayment,
  'booking-link': loadBookingLink,
};

export const loadLetter = async (row: MailRow, now: number): Promise<Letter> =>
  LOADERS[row.kind]({ payload: row.payload, toName: oneLine(row.toName), now });
