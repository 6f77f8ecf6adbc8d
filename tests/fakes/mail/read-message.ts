import { type ParsedMail, simpleParser } from 'mailparser';
import type { Mailbox, MessageSummary } from './mailbox';

export type Part = {
  n: number;
  filename: string | null;
  contentType: string;
  size: number;
  cid: string | null;
  disposition: string | null;
  url: string;
};

export type Message = MessageSummary & {
  headers: { name: string; value: string }[];
  date: string | null;
  cc: string[];
  replyTo: string | null;
  text: string | null;
  html: string | null;
  parts: Part[];
};

export type OpenedMessage = { message: Message; contents: Buffer[] };

function headerLines(parsed: ParsedMail): Message['headers'] {
  return parsed.headerLines.map(({ line }) => {
    const colon = line.indexOf(':');
    return {
      name: line.slice(0, colon),
      value: line
        .slice(colon + 1)
        .replace(/\r?\n[ \t]+/g, ' ')
        .trim(),
    };
  });
}

/** Parses one kept message; the HTML is as it was sent, cid: links and all. Null when there is no such message. */
export async function readMessage(mailbox: Mailbox, id: string): Promise<OpenedMessage | null> {
  const summary = mailbox.get(id);
  const raw = mailbox.raw(id);
  if (!summary || !raw) return null;
  const parsed = await simpleParser(raw, { keepCidLinks: true, skipTextToHtml: true, skipHtmlToText: true });
  const parts = parsed.attachments.map((attachment, n) => ({
    n,
    filename: attachment.filename ?? null,
    contentType: attachment.contentType,
    size: attachment.size,
    cid: attachment.cid ?? null,
    disposition: attachment.contentDisposition ?? null,
    url: `/api/messages/${id}/parts/${n}`,
  }));
  const message: Message = {
    ...summary,
    headers: headerLines(parsed),
    date: parsed.date?.toISOString() ?? null,
    cc: [parsed.cc ?? []].flat().map(({ text }) => text),
    replyTo: parsed.replyTo?.text ?? null,
    text: parsed.text ?? null,
    html: parsed.html === false ? null : (parsed.html ?? null),
    parts,
  };
  return { message, contents: parsed.attachments.map(({ content }) => content) };
}
