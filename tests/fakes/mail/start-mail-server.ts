import { createServer, type IncomingMessage, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { SMTPServer } from 'smtp-server';
import { closeServer, listenLocally } from '../web/listen-locally';
import { refuseStranger } from '../web/refuse-stranger';
import { sendFont } from '../web/send-font';
import { sendJson } from '../web/send-json';
import { answerMailApi, type Mail } from './answer-mail-api';
import { answerMailPages } from './answer-mail-pages';
import { MailFaults } from './mail-faults';
import { Mailbox } from './mailbox';
import { receiveMail } from './receive-mail';

export type MailServerOptions = {
  /** 0 takes a free port. */
  smtpPort: number;
  webPort: number;
  /** Folder of the kept messages; without it they are forgotten at the end. */
  stateFolder?: string;
};

export type MailServer = {
  /** Of the page and the JSON API. */
  url: string;
  webPort: number;
  smtpPort: number;
  smtpUrl: string;
  close: () => Promise<void>;
};

function listenSmtp(server: SMTPServer, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.server.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve((server.server.address() as AddressInfo).port));
  });
}

async function answer(mail: Mail, req: IncomingMessage, res: ServerResponse): Promise<void> {
  const refusal = refuseStranger(req);
  const url = new URL(req.url ?? '/', mail.url);
  if (refusal) sendJson(res, 403, { error: refusal });
  else if (url.pathname.startsWith('/api/')) await answerMailApi(mail, req, res, url);
  else if (!sendFont(res, url.pathname)) await answerMailPages(mail, req, res, url);
}

/** Starts the local mail server: SMTP that keeps everything, and a page and an API to read it. */
export async function startMailServer(options: MailServerOptions): Promise<MailServer> {
  const mailbox = new Mailbox(options.stateFolder);
  const faults = new MailFaults();
  const mail: Mail = { mailbox, faults, url: '' };
  const web = createServer((req, res) => {
    answer(mail, req, res).catch((error) => {
      console.error(error);
      if (res.headersSent) res.destroy();
      else sendJson(res, 500, { error: 'That could not be answered.' });
    });
  });
  const webPort = await listenLocally(web, options.webPort);
  mail.url = `http://127.0.0.1:${webPort}`;
  const smtp = receiveMail(mailbox, faults);
  const smtpPort = await listenSmtp(smtp, options.smtpPort).catch(async (error) => {
    await closeServer(web);
    throw error;
  });
  const close = async () => {
    await closeServer(web);
    await new Promise<void>((resolve) => smtp.close(() => resolve()));
    mailbox.close();
  };
  return { url: mail.url, webPort, smtpPort, smtpUrl: `smtp://127.0.0.1:${smtpPort}`, close };
}
