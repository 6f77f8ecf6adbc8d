import 'server-only';
import { render } from '@react-email/render';
import type { SendMailOptions } from 'nodemailer';
import { mailAddress, oneLine } from '@/lib/domain/mail/mail-address';
import { env } from '../env';
import type { MailRow } from './lease-mail';
import { loadLetter } from './load-letter';

/** The whole message of an outbox row. Throws when the row cannot be turned into one: the caller counts it as broken. */
export async function composeMail(row: MailRow, now: number): Promise<SendMailOptions> {
  const { MAIL_FROM_NAME, MAIL_FROM_ADDRESS } = env();
  const to = mailAddress(row.toName, row.toEmail);
  if (!to) throw new Error('The address is not one address');
  const letter = await loadLetter(row, now);
  const [html, text] = await Promise.all([
    render(letter.body),
    render(letter.body, { plainText: true, htmlToTextOptions: TEXT }),
  ]);
  return {
    from: { name: MAIL_FROM_NAME, address: MAIL_FROM_ADDRESS },
    to: [to],
    replyTo: letter.replyTo && [letter.replyTo],
    subject: oneLine(letter.subject),
    html,
    text,
    // From the row, so that a letter sent twice after a crash is one letter to the reader's program.
    messageId: `<${row.id}@${MAIL_FROM_ADDRESS.split('@')[1]}>`,
    date: new Date(now),
    // RFC 3834: no out-of-office notes in return.
    headers: { 'Auto-Submitted': 'auto-generated' },
    attachments: letter.parts?.map(({ cid, ...part }) => ({
      ...part,
      ...(cid && { cid, contentDisposition: 'inline' as const }),
    })),
  };
}

// Headings as they are written: capitals are hard to read, and wrong in some languages.
const TEXT = {
  wordwrap: 78,
  selectors: [
    { selector: 'img', format: 'skip' },
    { selector: 'h1', options: { uppercase: false } },
    { selector: 'h2', options: { uppercase: false } },
  ],
};
