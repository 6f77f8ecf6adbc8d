import type { IncomingMessage, ServerResponse } from 'node:http';
import { z } from 'zod';
import { type Page, sendPage } from '../web/page';
import { readBody } from '../web/read-body';
import { intentOf } from './attempt-payment';
import { commit, type Mock } from './mock';
import {
  completePage,
  confirmPage,
  expiredPage,
  openPage,
  type PayView,
  problemPage,
  successUrl,
  unknownPage,
} from './pay-pages';
import { outcomes, paySession } from './pay-session';
import type { SessionRecord } from './records';

const outcomeField = z.enum(outcomes);
const emailField = z.email().max(254);

// The page's form may be answered by a redirect to the merchant, so the merchant's origins are allowed targets.
function origins({ session }: SessionRecord): string[] {
  return [session.success_url, session.cancel_url].flatMap((url) => (url ? [new URL(url).origin] : []));
}

function pageFor(view: PayView, step: string | undefined): Page {
  const { status } = view.record.session;
  if (status === 'complete') return completePage(view);
  if (status === 'expired') return expiredPage(view);
  return step === 'confirm' && view.intent?.status === 'requires_action' ? confirmPage(view) : openPage(view);
}

function redirect(res: ServerResponse, to: string): void {
  res.writeHead(303, { location: to, 'cache-control': 'no-store', 'referrer-policy': 'no-referrer' }).end();
}

function postOutcome(mock: Mock, res: ServerResponse, view: PayView, form: URLSearchParams): void {
  const { record } = view;
  const { id } = record.session;
  const outcome = outcomeField.safeParse(form.get('outcome'));
  if (!outcome.success) {
    sendPage(res, 400, problemPage('That is not one of the choices. Go back and press one of the buttons.'));
    return;
  }
  const typed = (form.get('email') ?? '').trim();
  if (typed !== '' && !emailField.safeParse(typed).success) {
    const error = `“${typed}” is not an e-mail address. Write it like name@example.org, or leave it empty.`;
    sendPage(res, 422, openPage({ ...view, email: { value: typed, error } }), origins(record));
    return;
  }
  const done = paySession(mock, id, outcome.data, typed || null);
  commit(mock);
  const now = mock.store.get('session', id) ?? record;
  if (done && now.session.status === 'complete') redirect(res, successUrl(now));
  else redirect(res, outcome.data === 'needs-step' && done ? `/pay/${id}/confirm` : `/pay/${id}`);
}

/** The hosted payment page: /pay/<session> and /pay/<session>/confirm. */
export async function answerPay(
  mock: Mock,
  req: IncomingMessage,
  res: ServerResponse,
  url: URL,
): Promise<void> {
  const [, , id = '', step] = url.pathname.split('/');
  const record = mock.store.get('session', id);
  if (!record || (step !== undefined && step !== 'confirm')) {
    sendPage(res, 404, unknownPage);
    return;
  }
  const view: PayView = { record, intent: intentOf(mock, record), merchant: mock.merchant };
  if (req.method === 'GET') sendPage(res, 200, pageFor(view, step), origins(record));
  else if (req.method === 'POST') postOutcome(mock, res, view, new URLSearchParams(await readBody(req)));
  else sendPage(res, 405, problemPage('This page is read and posted to, nothing else.'));
}
