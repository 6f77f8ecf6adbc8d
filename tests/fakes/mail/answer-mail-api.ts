import type { IncomingMessage, ServerResponse } from 'node:http';
import { z } from 'zod';
import { readBody } from '../web/read-body';
import { sendJson } from '../web/send-json';
import { faultSchema, type MailFaults } from './mail-faults';
import type { Mailbox } from './mailbox';
import { readMessage } from './read-message';
import { sendPart } from './send-part';

export type Mail = { mailbox: Mailbox; faults: MailFaults; url: string };

const MAX_WAIT = 30;

/** With `wait` (seconds) the answer comes when there is something to show, or when the time is over. */
async function list({ mailbox }: Mail, res: ServerResponse, url: URL): Promise<void> {
  const to = url.searchParams.get('to') ?? '';
  const wait = Math.min(MAX_WAIT, Math.max(0, Number(url.searchParams.get('wait') ?? 0) || 0));
  const until = Date.now() + wait * 1000;
  let messages = mailbox.list(to);
  while (messages.length === 0 && Date.now() < until && !res.destroyed) {
    await mailbox.change(until - Date.now());
    messages = mailbox.list(to);
  }
  sendJson(res, 200, { messages });
}

async function oneMessage(
  mail: Mail,
  req: IncomingMessage,
  res: ServerResponse,
  rest: string[],
): Promise<boolean> {
  const [id = '', what, n] = rest;
  if (req.method === 'DELETE' && what === undefined) {
    if (!mail.mailbox.remove(id)) return false;
    sendJson(res, 200, { deleted: 1 });
    return true;
  }
  if (req.method !== 'GET') return false;
  if (what === 'raw') {
    const raw = mail.mailbox.raw(id);
    if (!raw) return false;
    res.writeHead(200, {
      'content-type': 'message/rfc822',
      'content-disposition': `attachment; filename="${id}.eml"`,
      'x-content-type-options': 'nosniff',
    });
    res.end(raw);
    return true;
  }
  const opened = await readMessage(mail.mailbox, id);
  if (!opened) return false;
  if (what === undefined) sendJson(res, 200, opened.message);
  else if (what !== 'parts' || !/^\d+$/.test(n ?? '')) return false;
  else return sendPart(res, opened, Number(n));
  return true;
}

async function faults({ faults: set }: Mail, req: IncomingMessage, res: ServerResponse): Promise<void> {
  if (req.method === 'DELETE') set.waiting.length = 0;
  if (req.method === 'POST') {
    let input: unknown;
    try {
      input = JSON.parse((await readBody(req)) || '{}');
    } catch {
      sendJson(res, 400, { error: 'The body must be JSON.' });
      return;
    }
    const parsed = faultSchema.safeParse(input);
    if (!parsed.success) {
      sendJson(res, 400, { error: z.prettifyError(parsed.error) });
      return;
    }
    set.waiting.push(parsed.data);
  }
  sendJson(res, 200, { faults: set.waiting });
}

/** /api/…: what tests read. */
export async function answerMailApi(
  mail: Mail,
  req: IncomingMessage,
  res: ServerResponse,
  url: URL,
): Promise<void> {
  const [, , noun, ...rest] = url.pathname.split('/');
  if (noun === 'health' && req.method === 'GET')
    sendJson(res, 200, { status: 'ok', service: 'local mail server' });
  else if (noun === 'faults' && rest.length === 0) await faults(mail, req, res);
  else if (noun === 'messages' && rest.length === 0 && req.method === 'GET') await list(mail, res, url);
  else if (noun === 'messages' && rest.length === 0 && req.method === 'DELETE')
    sendJson(res, 200, { deleted: mail.mailbox.clear() });
  else if (noun !== 'messages' || !(await oneMessage(mail, req, res, rest)))
    sendJson(res, 404, { error: `Nothing at ${req.method} ${url.pathname}.` });
}
