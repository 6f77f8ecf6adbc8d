import { html, type Markup } from '../web/html';
import type { Page } from '../web/page';
import { intentOf } from './attempt-payment';
import { formatMoney } from './currency-rules';
import type { Mock } from './mock';
import { formatMoment } from './pay-pages';
import { type Delivery, faultKinds } from './records';
import { listDeliveries } from './webhook-controls';

const states: Record<string, { word: string; tone: string }> = {
  open: { word: '○ open', tone: 'wait' },
  complete: { word: '● complete', tone: 'done' },
  expired: { word: '× expired', tone: 'stop' },
  pending: { word: '○ on its way', tone: 'wait' },
  held: { word: '‖ held', tone: 'wait' },
  delivered: { word: '● delivered', tone: 'done' },
  dropped: { word: '× dropped', tone: 'stop' },
  succeeded: { word: '● succeeded', tone: 'done' },
  failed: { word: '× failed', tone: 'stop' },
};

function state(name: string | null): Markup {
  const { word, tone } = states[name ?? ''] ?? { word: name ?? '', tone: 'wait' };
  return html`<span class="state ${tone}">${word}</span>`;
}

const post = (action: string, inside: Markup, label: string) =>
  html`<form method="post" action="${action}" class="row">${inside}<button>${label}</button></form>`;
const hidden = (name: string, value: string) => html`<input type="hidden" name="${name}" value="${value}">`;

function number(id: string, name: string, label: string, value: number): Markup {
  return html`<div class="field"><label for="${id}">${label}</label><input id="${id}" name="${name}" type="number" min="0" max="1000" value="${value}" inputmode="numeric"></div>`;
}

function lastAttempt({ attempts }: Delivery): string {
  const last = attempts.at(-1);
  if (!last) return 'not tried yet';
  return `${attempts.length} ${attempts.length === 1 ? 'try' : 'tries'}, last: ${last.status ?? last.error}`;
}

const settle = (path: string, what: string) =>
  html`<div class="row">${(['succeeded', 'failed'] as const).map(
    (status) =>
      html`<form method="post" action="${path}">${hidden('status', status)}<button aria-label="${what}: ${status}">${status === 'failed' ? 'Let it fail' : 'Let it succeed'}</button></form>`,
  )}</div>`;

function sessionActions(mock: Mock, id: string): Markup | null {
  const record = mock.store.get('session', id);
  if (record?.session.status === 'open')
    return html`<form method="post" action="/_mock/sessions/${id}/expire"><button aria-label="Expire session ${id}">Expire now</button></form>`;
  const slow = record && intentOf(mock, record)?.status === 'processing';
  return slow ? settle(`/_mock/sessions/${id}/settle`, `Slow transfer ${id}`) : null;
}

function sessionRows(mock: Mock): Markup {
  const rows = mock.store.all('session').reverse().slice(0, 50);
  if (rows.length === 0)
    return html`<p class="soft">None yet. They appear when the app starts a payment.</p>`;
  return html`<table class="cards"><caption>Newest first, at most 50</caption>
<thead><tr><th scope="col">Session</th><th scope="col">Amount</th><th scope="col">State</th><th scope="col">Ends</th><th scope="col">Do</th></tr></thead>
<tbody>${rows.map(
    ({
      session,
    }) => html`<tr><th scope="row"><a href="/pay/${session.id}" class="mono small">${session.client_reference_id ?? session.id.slice(0, 22)}</a></th>
<td class="mono">${formatMoney(session.amount_total ?? 0, session.currency ?? 'usd')}</td><td>${state(session.status)}${session.status === 'complete' && session.payment_status === 'unpaid' ? html`<br><span class="soft small">money not here</span>` : null}</td><td class="small">${formatMoment(session.expires_at)}</td><td>${sessionActions(mock, session.id)}</td></tr>`,
  )}</tbody></table>`;
}

function webhookRows(mock: Mock): Markup {
  const rows = listDeliveries(mock).slice(0, 50);
  if (rows.length === 0) return html`<p class="soft">None yet.</p>`;
  return html`<table class="cards"><caption>Newest first, at most 50</caption>
<thead><tr><th scope="col">Event</th><th scope="col">State</th><th scope="col">Tries</th><th scope="col">Do</th></tr></thead>
<tbody>${rows.map(
    (
      row,
    ) => html`<tr><th scope="row" class="mono small">${row.type}<br><span class="soft">${row.id}</span></th><td>${state(row.state)}</td>
<td class="small">${lastAttempt(row)}</td><td><form method="post" action="/_mock/webhooks/${row.id}/deliver"><button aria-label="Send ${row.type} ${row.id} now">Send now</button></form></td></tr>`,
  )}</tbody></table>`;
}

function refundRows(mock: Mock): Markup {
  const rows = mock.store.all('refund').reverse().slice(0, 50);
  if (rows.length === 0) return html`<p class="soft">None yet.</p>`;
  return html`<table class="cards"><caption>Newest first, at most 50</caption>
<thead><tr><th scope="col">Refund</th><th scope="col">Amount</th><th scope="col">State</th><th scope="col">Do</th></tr></thead>
<tbody>${rows.map(
    (
      row,
    ) => html`<tr><th scope="row" class="mono small">${row.id}</th><td class="mono">${formatMoney(row.amount, row.currency)}</td><td>${state(row.status)}</td>
<td>${
      row.status === 'pending' ? settle(`/_mock/refunds/${row.id}/settle`, `Refund ${row.id}`) : ''
    }</td></tr>`,
  )}</tbody></table>`;
}

function faultForm(mock: Mock): Markup {
  const waiting = mock.faults.map(({ kind, remaining }) => html`<li>${kind}, ${remaining} to come</li>`);
  return html`${waiting.length > 0 ? html`<ul>${waiting}</ul>${post('/_mock/faults/clear', html``, 'Forget these')}` : null}
${post(
  '/_mock/faults',
  html`<div class="field"><label for="kind">Fault</label><select id="kind" name="kind">${faultKinds.map((kind) => html`<option>${kind}</option>`)}</select></div>
${number('fault-count', 'count', 'Calls', 1)}`,
  'Set for the next calls',
)}`;
}

/** A person's view of the stand-in, and its switches. */
export function controlPage(mock: Mock): Page {
  const { hold, dropNext, times } = mock.webhooks.switches;
  return {
    title: 'Stand-in for Stripe',
    notice: 'Stand-in for Stripe on this machine. No money moves here.',
    width: 'wide',
    body: html`<h1>Stand-in for Stripe</h1>
<p>Webhooks go to <span class="mono">${mock.webhooks.url ?? 'nowhere: no address was given'}</span>.</p>
<h2>Payments</h2>${sessionRows(mock)}
<h2>Webhooks</h2>
<p>Now: ${hold ? 'held until you release them' : 'sent at once'}, each ${times === 1 ? 'once' : `${times} times`}${dropNext > 0 ? `, the next ${dropNext} dropped` : ''}.</p>
<div class="row">${post('/_mock/webhooks/hold', hidden('on', hold ? 'false' : 'true'), hold ? 'Stop holding and send' : 'Hold new ones')}
${post('/_mock/webhooks/release', hidden('order', 'forward'), 'Release in order')}
${post('/_mock/webhooks/release', hidden('order', 'reverse'), 'Release in reverse')}</div>
${post('/_mock/webhooks/duplicate', number('times', 'times', 'Send each this many times', times), 'Set')}
${post('/_mock/webhooks/drop', number('drop', 'count', 'Drop the next', dropNext), 'Set')}
${webhookRows(mock)}
<h2>Refunds</h2>${refundRows(mock)}
<h2>Faults</h2>${faultForm(mock)}
<h2>Start over</h2><p>Forgets all payments, refunds, events and switches.</p>${post('/_mock/reset', html``, 'Forget everything')}`,
  };
}
