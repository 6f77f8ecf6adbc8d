import { html, type Markup } from '../web/html';
import type { Page } from '../web/page';
import type { MessageSummary } from './mailbox';
import type { Message, Part } from './read-message';

const notice = 'Local mail server. It keeps every message here and sends none on.';
const page = (title: string, body: Markup): Page => ({ title, notice, width: 'wide', body });

function moment(iso: string): Markup {
  const words = new Intl.DateTimeFormat('en-GB', {
    weekday: 'short',
    day: 'numeric',
    month: 'short',
    hour: '2-digit',
    minute: '2-digit',
    second: '2-digit',
    timeZoneName: 'short',
  }).format(new Date(iso));
  return html`<time datetime="${iso}">${words}</time>`;
}

const subjectOf = ({ subject }: MessageSummary) => subject || '(no subject)';

function size(bytes: number): string {
  return bytes < 1024 ? `${bytes} bytes` : `${(bytes / 1024).toFixed(bytes < 10_240 ? 1 : 0)} kB`;
}

function table(messages: MessageSummary[]): Markup {
  return html`<table class="cards"><caption>Newest first</caption>
<thead><tr><th scope="col">Subject</th><th scope="col">To</th><th scope="col">Came in</th></tr></thead>
<tbody>${messages.map(
    (message) => html`<tr><th scope="row"><a href="/messages/${message.id}">${subjectOf(message)}</a></th>
<td>${message.envelope.to.join(', ')}</td><td class="small">${moment(message.receivedAt)}${message.attachments > 0 ? html`<br><span class="soft">${message.attachments} ${message.attachments === 1 ? 'part' : 'parts'} attached or inline</span>` : null}</td></tr>`,
  )}</tbody></table>`;
}

const SHOWN = 200;

export function listPage(messages: MessageSummary[], to: string, total: number): Page {
  const none =
    total === 0
      ? html`<p>No mail yet. Whatever the app sends appears here. <a href="/">Look again</a></p>`
      : html`<p>No mail to “${to}”. Write a shorter part of the address, or <a href="/">show all ${total}</a>.</p>`;
  return page(
    to ? `Mail to ${to}` : 'Mail',
    html`<h1>Mail</h1>
<form method="get" action="/" class="row" role="search">
<div class="field"><label for="to">Recipient</label><input id="to" name="to" type="search" value="${to}" autocomplete="off" autocapitalize="off" spellcheck="false"></div>
<button class="main">Find</button>${to ? html`<a class="button" href="/">Show all</a>` : null}</form>
<p class="soft" role="status">${messages.length} of ${total} ${total === 1 ? 'message' : 'messages'}${messages.length > SHOWN ? `, the newest ${SHOWN} shown` : ''}</p>
${messages.length === 0 ? none : table(messages.slice(0, SHOWN))}
${total > 0 ? html`<p class="after"><a class="button" href="/delete">Delete all…</a></p>` : null}`,
  );
}

function attached(parts: Part[]): Markup | null {
  if (parts.length === 0) return null;
  return html`<h2>Attached and inline parts</h2>
<ul class="plain">${parts.map(
    ({ n, filename, contentType, size: bytes, cid, url }) =>
      html`<li><a href="${url}" download="${filename ?? `part-${n}`}">${filename ?? `part ${n}`}</a><br><span class="soft small">${contentType}, ${size(bytes)}${cid ? html`, inline as <span class="mono">${cid}</span>` : null}</span></li>`,
  )}</ul>`;
}

export function messagePage(message: Message): Page {
  const { id, envelope } = message;
  return page(
    subjectOf(message),
    html`<p><a href="/">All mail</a></p>
<h1>${subjectOf(message)}</h1>
<dl><dt>From</dt><dd>${message.from || envelope.from}</dd><dt>To</dt><dd>${envelope.to.join(', ')}</dd><dt>Came in</dt><dd>${moment(message.receivedAt)}</dd></dl>
<div class="row">${message.html === null ? null : html`<a class="button" href="/messages/${id}/body" target="_blank" rel="noopener">Open alone in a new tab</a>`}
<a class="button" href="/messages/${id}/raw">Raw source</a>
<form method="post" action="/messages/${id}/delete"><button>Delete</button></form></div>
${message.html === null ? html`<p class="soft">This message has no HTML part.</p>` : html`<h2>As HTML</h2><iframe title="The message as HTML" src="/messages/${id}/body" sandbox="allow-popups allow-popups-to-escape-sandbox"></iframe>`}
<h2>As text</h2>
${message.text === null ? html`<p class="soft">This message has no text part.</p>` : html`<div class="panel"><pre>${message.text}</pre></div>`}
${attached(message.parts)}`,
  );
}

export function rawPage(message: MessageSummary, raw: string): Page {
  return page(
    `Raw source: ${subjectOf(message)}`,
    html`<p><a href="/messages/${message.id}">Back to the message</a></p><h1>Raw source</h1>
<p><a class="button" href="/api/messages/${message.id}/raw" download="${message.id}.eml">Save as a file</a></p><div class="panel"><pre>${raw}</pre></div>`,
  );
}

export function deletePage(total: number): Page {
  return page(
    'Delete all mail',
    html`<h1>Delete all mail</h1><p>${total} ${total === 1 ? 'message' : 'messages'} will be gone for good.</p>
<div class="row"><form method="post" action="/delete"><button class="main">Delete ${total}</button></form><a class="button" href="/">Keep them</a></div>`,
  );
}

export const missingPage: Page = page(
  'Not here',
  html`<h1>Not here</h1><p>There is no such message. It may have been deleted. <a href="/">All mail</a></p>`,
);
