const base = (): string => process.env.E2E_APP_URL ?? 'http://localhost:3000';

const decode = (text: string): string =>
  text
    .replace(/&quot;/g, '"')
    .replace(/&#x27;/g, "'")
    .replace(/&lt;/g, '<')
    .replace(/&gt;/g, '>')
    .replace(/&amp;/g, '&');

export type RawForm = {
  path: string;
  /** What the page itself hides in the form, the action's name among it. */
  hidden: [string, string][];
  /** Names of what a person types into. */
  typed: string[];
  /** Names with a value, of radio buttons, lists and boxes: the first of each. */
  chosen: [string, string][];
};

/** A form of a page as it came from the server, found by the words of its button. */
export async function readForm(path: string, button: string, cookie = ''): Promise<RawForm> {
  const answer = await fetch(base() + path, { headers: { cookie }, redirect: 'manual' });
  const form = (await answer.text())
    .split('<form')
    .slice(1)
    .map((part) => part.split('</form>')[0] ?? '')
    .find((part) => part.includes(`>${button}<`));
  if (!form) throw new Error(`${path} (${answer.status}) has no form with “${button}”`);
  const read: RawForm = { path, hidden: [], typed: [], chosen: [] };
  for (const [tag, kind] of form.matchAll(/<(input|textarea|select)\b[^>]*>/g)) {
    const name = decode(/ name="([^"]*)"/.exec(tag)?.[1] ?? '');
    const type = / type="([^"]*)"/.exec(tag)?.[1] ?? 'text';
    const value = decode(/ value="([^"]*)"/.exec(tag)?.[1] ?? '');
    if (name === '') continue;
    if (type === 'hidden') read.hidden.push([name, value]);
    else if (kind === 'select') {
      const after = form.slice(form.indexOf(tag));
      const options = [
        ...after.slice(0, after.indexOf('</select>')).matchAll(/<option[^>]* value="([^"]+)"/g),
      ];
      read.chosen.push([name, decode(options[0]?.[1] ?? '')]);
    } else if (type === 'radio' || type === 'checkbox') {
      if (type === 'radio' && !read.chosen.some(([known]) => known === name)) read.chosen.push([name, value]);
    } else if (type !== 'file') read.typed.push(name);
  }
  return read;
}

/** `cookie` is what the answer sets, ready to be sent back. */
export type Told = { status: number; to: string; text: string; cookie: string };

/** Sends it as a browser without JavaScript does; `origin` null leaves the header out. */
export async function sendForm(
  form: RawForm,
  values: readonly (readonly [string, string])[],
  { cookie = '', origin = base() as string | null, headers = {} as Record<string, string> } = {},
): Promise<Told> {
  const body = new FormData();
  for (const [name, value] of [...form.hidden, ...values]) body.append(name, value);
  const answer = await fetch(base() + form.path, {
    method: 'POST',
    body,
    redirect: 'manual',
    headers: { ...headers, cookie, ...(origin === null ? {} : { origin }) },
  });
  return {
    status: answer.status,
    to: answer.headers.get('location') ?? '',
    text: await answer.text(),
    cookie: answer.headers
      .getSetCookie()
      .map((line) => line.split(';')[0])
      .join('; '),
  };
}
