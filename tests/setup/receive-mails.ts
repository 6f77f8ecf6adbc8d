import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';

/** An SMTP server on a free port of loopback that SMTP_URL points at; `take` gives the newest message as it came. */
export function receiveMails() {
  const taken: { raw: string; to: string[] }[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData(stream, session, done) {
      const parts: Buffer[] = [];
      stream.on('data', (part: Buffer) => parts.push(part));
      stream.on('end', () => {
        taken.push({
          raw: Buffer.concat(parts).toString('latin1'),
          to: session.envelope.rcptTo.map(({ address }) => address),
        });
        done();
      });
    },
  });
  return {
    start: () =>
      new Promise<void>((resolve) => {
        server.listen(0, '127.0.0.1', () => {
          process.env.SMTP_URL = `smtp://127.0.0.1:${(server.server.address() as AddressInfo).port}`;
          resolve();
        });
      }),
    stop: () => new Promise<void>((resolve) => server.close(() => resolve())),
    take: () => {
      const message = taken.at(-1);
      if (!message) throw new Error('No message came');
      return message;
    },
  };
}
