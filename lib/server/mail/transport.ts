import 'server-only';
import { createTransport, type SendMailOptions } from 'nodemailer';
import { env } from '../env';

export type SendMail = (message: SendMailOptions) => Promise<unknown>;

const TIMEOUTS = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 30_000 };

function open(url: string) {
  return createTransport({
    url,
    pool: true,
    maxConnections: 2,
    maxMessages: 200,
    ...TIMEOUTS,
    // A letter never makes the server read a file or fetch an address.
    disableFileAccess: true,
    disableUrlAccess: true,
  });
}

let held: { url: string; transport: ReturnType<typeof open> } | undefined;

/** Sends over one pool of connections to SMTP_URL; a changed address (tests) opens another. */
export const sendBySmtp: SendMail = (message) => {
  const url = env().SMTP_URL;
  if (held?.url !== url) {
    held?.transport.close();
    held = { url, transport: open(url) };
  }
  return held.transport.sendMail(message);
};

export function closeTransport(): void {
  held?.transport.close();
  held = undefined;
}
