import type { IncomingMessage, ServerResponse } from 'node:http';
import { sendPage } from '../web/page';
import type { Mail } from './answer-mail-api';
import { deletePage, listPage, messagePage, missingPage, rawPage } from './mail-pages';
import { readMessage } from './read-message';
import { sendBody } from './send-body';

function goTo(res: ServerResponse, location: string): void {
  res.writeHead(303, { location }).end();
}

async function oneMessage(
  { mailbox }: Mail,
  res: ServerResponse,
  origin: string,
  id: string,
  what: string | undefined,
) {
  const opened = await readMessage(mailbox, id);
  if (!opened) sendPage(res, 404, missingPage);
  else if (what === undefined) sendPage(res, 200, messagePage(opened.message));
  else if (what === 'body') sendBody(res, opened.message, origin);
  else if (what === 'raw')
    sendPage(res, 200, rawPage(opened.message, mailbox.raw(id)?.toString('utf8') ?? ''));
  else sendPage(res, 404, missingPage);
}

/** What a person reads. */
export async function answerMailPages(
  mail: Mail,
  req: IncomingMessage,
  res: ServerResponse,
  url: URL,
): Promise<void> {
  const { mailbox } = mail;
  const [, first, id = '', what] = url.pathname.split('/');
  const isPost = req.method === 'POST';
  if (first === '' && !isPost) {
    const to = (url.searchParams.get('to') ?? '').trim().slice(0, 254);
    sendPage(res, 200, listPage(mailbox.list(to), to, mailbox.list().length));
  } else if (first === 'delete' && isPost) {
    mailbox.clear();
    goTo(res, '/');
  } else if (first === 'delete') sendPage(res, 200, deletePage(mailbox.list().length));
  else if (first === 'messages' && isPost && what === 'delete') {
    mailbox.remove(id);
    goTo(res, '/');
  } else if (first === 'messages' && !isPost) {
    // As the reader typed it: localhost and 127.0.0.1 are two origins. The guard has let only loopback names in.
    await oneMessage(mail, res, `http://${req.headers.host}`, id, what);
  } else sendPage(res, 404, missingPage);
}
