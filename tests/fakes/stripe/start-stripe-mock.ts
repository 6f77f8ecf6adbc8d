import { createServer, type IncomingMessage, type ServerResponse } from 'node:http';
import { closeServer, listenLocally } from '../web/listen-locally';
import { BodyTooLarge } from '../web/read-body';
import { refuseStranger } from '../web/refuse-stranger';
import { sendFont } from '../web/send-font';
import { sendJson } from '../web/send-json';
import { answerApi } from './answer-api';
import { answerControl } from './answer-control';
import { answerPay } from './answer-pay';
import { expireDue } from './expire-session';
import type { Mock } from './mock';
import { Store } from './store';
import { Webhooks } from './webhooks';

export type StripeMockOptions = {
  /** 0 takes a free port. */
  port: number;
  /** Where webhooks go; without it events are only recorded. Loopback only. */
  webhookUrl?: string;
  webhookSecret?: string;
  /** Keeps state across restarts; without it everything is forgotten at the end. */
  stateFile?: string;
  merchant?: string;
  /** The address that people open, where it differs from http://127.0.0.1:<port>. */
  publicUrl?: string;
  now?: () => number;
};

export type StripeMock = { url: string; port: number; close: () => Promise<void> };

const loopback = new Set(['localhost', '127.0.0.1', '[::1]']);

function webhookTarget({ webhookUrl, webhookSecret }: StripeMockOptions) {
  if (!webhookUrl) return null;
  if (!loopback.has(new URL(webhookUrl).hostname))
    throw new Error(`The stand-in sends webhooks to this machine only, not to ${webhookUrl}.`);
  if (!webhookSecret) throw new Error('A webhook address needs a webhook secret to sign with.');
  return { url: webhookUrl, secret: webhookSecret };
}

async function answer(mock: Mock, req: IncomingMessage, res: ServerResponse): Promise<void> {
  const refusal = refuseStranger(req);
  if (refusal) {
    sendJson(res, 403, { error: refusal });
    return;
  }
  const url = new URL(req.url ?? '/', mock.baseUrl);
  // A timer ends sessions too; asking here as well means nobody can pay in the second before it fires.
  expireDue(mock);
  if (url.pathname.startsWith('/v1/')) await answerApi(mock, req, res, url);
  else if (url.pathname.startsWith('/pay/')) await answerPay(mock, req, res, url);
  else if (url.pathname.startsWith('/_mock')) await answerControl(mock, req, res, url);
  else if (url.pathname === '/') res.writeHead(303, { location: '/_mock' }).end();
  else if (!sendFont(res, url.pathname)) sendJson(res, 404, { error: `Nothing at ${url.pathname}.` });
}

/** Starts the local stand-in for Stripe. It runs only where something asks for it by this name. */
export async function startStripeMock(options: StripeMockOptions): Promise<StripeMock> {
  const now = options.now ?? Date.now;
  const store = new Store(options.stateFile);
  const webhooks = new Webhooks(store, webhookTarget(options), now);
  const mock: Mock = {
    store,
    webhooks,
    faults: [],
    now,
    baseUrl: '',
    merchant: options.merchant ?? 'the camp',
  };
  const server = createServer((req, res) => {
    answer(mock, req, res).catch((error) => {
      if (!(error instanceof BodyTooLarge)) console.error(error);
      if (res.headersSent) res.destroy();
      else sendJson(res, error instanceof BodyTooLarge ? 413 : 500, { error: 'That could not be answered.' });
    });
  });
  const port = await listenLocally(server, options.port);
  const url = `http://127.0.0.1:${port}`;
  mock.baseUrl = options.publicUrl?.replace(/\/$/, '') ?? url;
  const timer = setInterval(() => expireDue(mock), 1000);
  expireDue(mock);
  const close = async () => {
    clearInterval(timer);
    webhooks.close();
    await closeServer(server);
  };
  return { url, port, close };
}
