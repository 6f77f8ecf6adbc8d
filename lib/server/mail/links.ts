import 'server-only';
import type { OrderId, RegistrationId } from '@/lib/domain/shared/ids';
import { orderProof } from '../auth/order-grants';
import { env } from '../env';

// Links of mails carry their proof, as nothing else reaches a person without an account (ASVS 14.2.1's exception); the
// page behind each takes it into a cookie and goes on to an address without it.
const at = (path: string): string => `${env().BASE_URL}${path}`;

export const verifyLink = (token: string): string => at(`/verify?token=${encodeURIComponent(token)}`);
export const resetLink = (token: string): string => at(`/reset?token=${encodeURIComponent(token)}`);
export const inviteLink = (token: string): string => at(`/invitations/${encodeURIComponent(token)}`);
export const signInLink = (): string => at('/sign-in');
export const askResetLink = (): string => at('/reset');

/** The payer's: the whole booking. */
export const orderLink = (id: OrderId): string => at(`/o/${id}?key=${orderProof(id)}`);

/** The attendee's: their own ticket, timetable and packing list, not the money. */
export const registrationLink = (id: RegistrationId): string => at(`/r/${id}?key=${orderProof(id)}`);
