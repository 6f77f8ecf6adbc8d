import type { Stripe } from 'stripe';
import { html, type Markup } from '../web/html';
import type { Page } from '../web/page';
import { formatMoney } from './currency-rules';
import type { SessionRecord } from './records';

const notice = 'Stand-in for Stripe on this machine. No money moves, and no card is asked for.';

export type PayView = {
  record: SessionRecord;
  intent: Stripe.PaymentIntent | undefined;
  merchant: string;
  /** What the person typed and what is wrong with it, when a form comes back. */
  email?: { value: string; error: string };
};

export function formatMoment(seconds: number): string {
  return new Intl.DateTimeFormat('en-GB', { dateStyle: 'full', timeStyle: 'long' }).format(seconds * 1000);
}

const total = ({ session }: SessionRecord) =>
  formatMoney(session.amount_total ?? 0, session.currency ?? 'usd');

const frame = (title: string, body: Markup): Page => ({ title, notice, width: 'narrow', body });

function lines({ record }: PayView): Markup {
  return html`<table>
<caption>What you are paying for</caption>
<thead><tr><th scope="col">For</th><th scope="col">Number</th><th scope="col" class="sum">Amount</th></tr></thead>
<tbody>${record.lineItems.map(
    (item) => html`<tr><td>${item.description}</td><td class="mono">${item.quantity}</td>
<td class="sum">${formatMoney(item.amount_total, item.currency)}</td></tr>`,
  )}</tbody>
<tfoot><tr><th scope="row" colspan="2">Total</th><td class="sum">${total(record)}</td></tr></tfoot>
</table>`;
}

function lastWord({ intent, record }: PayView): Markup | null {
  if (intent?.status === 'requires_action')
    return html`<div class="panel said wait" role="status"><p><strong>Waiting for your bank.</strong> It asked you to confirm and has no answer yet.
<a href="/pay/${record.session.id}/confirm">Answer the bank</a>, or choose again below.</p></div>`;
  if (intent?.last_payment_error?.message)
    return html`<div class="panel said" role="alert"><p><strong>Not paid.</strong> ${intent.last_payment_error.message} Try again, or walk away.</p></div>`;
  return null;
}

function payer({ record, email }: PayView): Markup {
  if (record.session.customer_email)
    return html`<p>Paying as <span class="mono">${record.session.customer_email}</span></p>`;
  return html`<div class="field"><label for="email">E-mail</label>
<p id="email-note" class="soft small">Leave it empty, or give the address that the payment should carry.</p>
${email ? html`<p id="email-error" class="state stop">${email.error}</p>` : null}
<input id="email" name="email" type="email" autocomplete="email" value="${email?.value ?? ''}" aria-describedby="email-note${email ? ' email-error' : ''}"${email ? html` aria-invalid="true"` : null}></div>`;
}

function choices({ record }: PayView): Markup {
  if (record.session.amount_total === 0)
    return html`<h2>Nothing to pay</h2><div class="stack"><button class="main" name="outcome" value="pay">Finish</button></div>`;
  return html`<h2 id="choose">Choose what happens</h2>
<div class="stack" role="group" aria-labelledby="choose">
<button class="main" name="outcome" value="pay">Pay ${total(record)}</button>
<button name="outcome" value="needs-step">Pay, but the bank asks me to confirm first</button>
<button name="outcome" value="pay-later">Pay by a slow transfer: the money comes later</button>
<button name="outcome" value="decline">The bank declines it</button>
<button name="outcome" value="decline-funds">The bank declines it: not enough money</button>
</div>`;
}

export function openPage(view: PayView): Page {
  const { session } = view.record;
  const walkAway = session.cancel_url
    ? html`<a class="button" href="${session.cancel_url}">Walk away without paying</a>`
    : html`<span class="soft">To walk away without paying, close this page.</span>`;
  return frame(
    `Pay ${view.merchant}`,
    html`<h1>Pay ${view.merchant}</h1>
${lastWord(view)}
${lines(view)}
<p class="soft small">This page is open until <time datetime="${new Date(session.expires_at * 1000).toISOString()}">${formatMoment(session.expires_at)}</time>.</p>
<form method="post" action="/pay/${session.id}">
${payer(view)}
${choices(view)}
</form>
<div class="row after">${walkAway}</div>`,
  );
}

export function confirmPage({ record, merchant }: PayView): Page {
  const { id } = record.session;
  return frame(
    'Your bank asks you to confirm',
    html`<h1>Your bank asks you to confirm</h1>
<div class="panel"><p>Pay <strong class="mono">${total(record)}</strong> to <strong>${merchant}</strong>?</p>
<p class="soft">A real bank would ask in its app or by a code. Here you answer with a button.</p></div>
<form method="post" action="/pay/${id}"><div class="stack">
<button class="main" name="outcome" value="approve">Yes, confirm the payment</button>
<button name="outcome" value="refuse">No, refuse it</button>
</div></form>
<p class="after"><a href="/pay/${id}">Back to the payment page</a></p>`,
  );
}

function doneWords(view: PayView): { title: string; tone: 'done' | 'wait' | ''; words: Markup } {
  const { record, merchant, intent } = view;
  const sum = html`<strong class="mono">${total(record)}</strong>`;
  if (record.session.payment_status === 'paid')
    return {
      title: 'Already paid',
      tone: 'done',
      words: html`${sum} went to ${merchant}. Nothing more to pay here.`,
    };
  if (record.session.payment_status === 'no_payment_required')
    return { title: 'Already finished', tone: 'done', words: html`There was nothing to pay.` };
  if (intent?.status === 'processing')
    return {
      title: 'On its way',
      tone: 'wait',
      words: html`${sum} is on its way to ${merchant} by a slow transfer. Whether it arrives is decided on <a href="/_mock">the stand-in’s own page</a>.`,
    };
  return {
    title: 'Not paid',
    tone: '',
    words: html`The slow transfer of ${sum} did not arrive. This page is closed; ask ${merchant} how to pay.`,
  };
}

export function completePage(view: PayView): Page {
  const { title, tone, words } = doneWords(view);
  return frame(
    title,
    html`<h1>${title}</h1>
<div class="panel said ${tone}"><p>${words}</p></div>
${lines(view)}
<p class="after"><a class="button main" href="${successUrl(view.record)}">Go on to ${view.merchant}</a></p>`,
  );
}

export function expiredPage({ record, merchant }: PayView): Page {
  const back = record.session.cancel_url;
  return frame(
    'This payment page has expired',
    html`<h1>This payment page has expired</h1>
<div class="panel said"><p>It was open until ${formatMoment(record.session.expires_at)} or was closed by ${merchant} before. Nothing was paid here. Start again from ${merchant}’s own page.</p></div>
${back ? html`<p><a class="button main" href="${back}">Back to ${merchant}</a></p>` : null}`,
  );
}

export const unknownPage: Page = frame(
  'No such payment page',
  html`<h1>No such payment page</h1><p>The address is wrong, or the stand-in was started over since. Go back and begin the payment again.</p>`,
);

export function problemPage(sentence: string): Page {
  return frame('That did not work', html`<h1>That did not work</h1><p>${sentence}</p>`);
}

export function successUrl({ session }: SessionRecord): string {
  return (session.success_url ?? '').replaceAll('{CHECKOUT_SESSION_ID}', session.id);
}
