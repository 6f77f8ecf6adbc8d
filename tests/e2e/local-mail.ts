export type Letter = { id: string; subject: string };

const base = (): string => process.env.E2E_MAIL_URL ?? 'http://localhost:3003';

/** The first mail to an address whose subject fits; the mail server holds its answer until mail comes. */
export async function waitForMail(to: string, subject: RegExp): Promise<Letter> {
  const until = Date.now() + 45_000;
  while (Date.now() < until) {
    const answer = await fetch(`${base()}/api/messages?to=${encodeURIComponent(to)}&wait=10`);
    const { messages } = (await answer.json()) as { messages: Letter[] };
    const found = messages.find((letter) => subject.test(letter.subject));
    if (found) return found;
    // Mail is there, only not this one: ask again when the next second's run of the outbox is over.
    if (messages.length > 0) await new Promise((done) => setTimeout(done, 500));
  }
  throw new Error(`No mail to ${to} like ${subject}`);
}

export const mailPage = (id: string): string => `${base()}/messages/${id}`;

type Part = { contentType: string; cid: string | null; url: string };

/** The QR picture that a ticket mail shows inline. */
export async function ticketPicture(id: string): Promise<Buffer> {
  const letter = (await (await fetch(`${base()}/api/messages/${id}`)).json()) as {
    parts: Part[];
    html: string;
  };
  const qr = letter.parts.find(
    (part) => part.contentType === 'image/png' && part.cid && letter.html.includes(`cid:${part.cid}`),
  );
  if (!qr) throw new Error('The mail shows no picture by cid');
  return Buffer.from(await (await fetch(base() + qr.url)).arrayBuffer());
}

/** The plain text part of a mail. */
export async function letterText(id: string): Promise<string> {
  const letter = (await (await fetch(`${base()}/api/messages/${id}`)).json()) as { text: string | null };
  return letter.text ?? '';
}
