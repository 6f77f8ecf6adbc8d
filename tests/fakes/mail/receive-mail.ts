import type { Socket } from 'node:net';
import type { AddressObject } from 'mailparser';
import { simpleParser } from 'mailparser';
import { SMTPServer, type SMTPServerSession } from 'smtp-server';
import type { MailFault, MailFaults } from './mail-faults';
import type { Mailbox } from './mailbox';

const MAX_BYTES = 25 * 1024 * 1024;

type Refusal = Error & { responseCode?: number };

function refusal(fault: MailFault): Refusal {
  return Object.assign(new Error(fault.message), { responseCode: fault.code });
}

function addresses(header: AddressObject | AddressObject[] | undefined): string[] {
  return [header ?? []]
    .flat()
    .flatMap(({ value }) => value.flatMap(({ address }) => (address ? [address] : [])));
}

async function keep(mailbox: Mailbox, raw: Buffer, session: SMTPServerSession): Promise<string> {
  const parsed = await simpleParser(raw, {
    skipImageLinks: true,
    skipHtmlToText: true,
    skipTextToHtml: true,
  });
  const { mailFrom, rcptTo } = session.envelope;
  const summary = mailbox.add(raw, {
    envelope: { from: mailFrom ? mailFrom.address : '', to: rcptTo.map(({ address }) => address) },
    subject: parsed.subject ?? '',
    from: parsed.from?.text ?? '',
    to: addresses(parsed.to),
    messageId: parsed.messageId ?? null,
    attachments: parsed.attachments.length,
  });
  return summary.id;
}

/** The SMTP side: takes every message for anyone, with or without a sign-in, and keeps it. */
export function receiveMail(mailbox: Mailbox, faults: MailFaults): SMTPServer {
  // By the sender's port, which names a connection here: everyone comes from 127.0.0.1.
  const sockets = new Map<number, Socket>();
  const server = new SMTPServer({
    name: 'mail.combwood.test',
    banner: 'local mail server: keeps every message, sends none on',
    size: MAX_BYTES,
    authOptional: true,
    allowInsecureAuth: true,
    // Without a certificate worth the name STARTTLS would only make senders fail.
    disabledCommands: ['STARTTLS'],
    disableReverseLookup: true,
    closeTimeout: 500,
    onAuth: (auth, _session, done) => done(null, { user: auth.username ?? 'anyone' }),
    onConnect: (session, done) => answer('connect', session, [], done),
    onMailFrom: (_address, session, done) => answer('mail', session, [], done),
    onRcptTo: ({ address }, session, done) => answer('rcpt', session, [address], done),
    onData(stream, session, done) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', async () => {
        if (stream.sizeExceeded) {
          done(Object.assign(new Error('Message is larger than 25 MB'), { responseCode: 552 }));
          return;
        }
        const fault = faults.take(
          'data',
          session.envelope.rcptTo.map(({ address }) => address),
        );
        if (fault?.kind === 'refuse') {
          done(refusal(fault));
          return;
        }
        try {
          const id = await keep(mailbox, Buffer.concat(chunks), session);
          if (fault) cut(session);
          else done(null, `Kept as ${id}`);
        } catch (error) {
          console.error(error);
          done(Object.assign(new Error('Could not keep the message'), { responseCode: 451 }));
        }
      });
    },
  });
  const cut = (session: SMTPServerSession) => sockets.get(session.remotePort)?.destroy();
  server.server.on('connection', (socket: Socket) => {
    const port = socket.remotePort ?? 0;
    sockets.set(port, socket);
    socket.on('close', () => sockets.delete(port));
  });
  function answer(
    step: MailFault['step'],
    session: SMTPServerSession,
    recipients: string[],
    done: (error?: Error | null) => void,
  ): void {
    const fault = faults.take(step, recipients);
    if (!fault) done();
    else if (fault.kind === 'cut') cut(session);
    else done(refusal(fault));
  }
  // A sender that hangs up in the middle is its own business.
  server.on('error', (error) => console.error(`smtp: ${error.message}`));
  return server;
}
