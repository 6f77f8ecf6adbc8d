import 'server-only';
import type { ticket } from '@/db/schema/order';
import { signTicket } from './sign-ticket';

/** The text of a ticket row's code. */
export const ticketText = ({
  id,
  campId,
  issuedAt,
}: Pick<typeof ticket.$inferSelect, 'id' | 'campId' | 'issuedAt'>): string =>
  signTicket({ ticketId: id, campId, issuedAt });
