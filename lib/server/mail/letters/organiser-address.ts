import 'server-only';
import { type MailAddress, mailAddress } from '@/lib/domain/mail/mail-address';

/** Answers to a letter about a camp go to its organiser. */
export const organiserAddress = (organisation: { name: string; email: string }): MailAddress | undefined =>
  mailAddress(organisation.name, organisation.email) ?? undefined;
