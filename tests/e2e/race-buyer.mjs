// One process of the race over HTTP: sends the form under "check your answers" for each of its drafts at once, as a
// browser without JavaScript does, with fields added that no form has.
const [base, path, tokens] = process.argv.slice(2);

const decode = (text) =>
  text
    .replace(/&quot;/g, '"')
    .replace(/&#x27;/g, "'")
    .replace(/&lt;/g, '<')
    .replace(/&gt;/g, '>')
    .replace(/&amp;/g, '&');

/** The hidden fields of the form whose button holds the place. */
async function readForm(cookie) {
  const page = await (await fetch(base + path, { headers: { cookie } })).text();
  const form = page.split('<form').find((part) => part.includes('Hold my place and pay'));
  if (!form) throw new Error('the page has no form to hold a place');
  return [...form.matchAll(/<input type="hidden"[^>]*>/g)].map(([input]) => [
    decode(/ name="([^"]*)"/.exec(input)?.[1] ?? ''),
    decode(/ value="([^"]*)"/.exec(input)?.[1] ?? ''),
  ]);
}

async function press(fields, cookie) {
  const body = new FormData();
  for (const [name, value] of fields) body.append(name, value);
  for (const [name, value] of Object.entries({
    price: '1',
    total: '0',
    paid: 'true',
    role: 'organiser',
    state: 'confirmed',
  }))
    body.append(name, value);
  const answer = await fetch(base + path, {
    method: 'POST',
    body,
    redirect: 'manual',
    headers: { cookie, origin: base },
  });
  const to = answer.headers.get('location') ?? '';
  if (answer.status === 303 && to.includes('/register/pay?order=')) return 'held';
  const text = await answer.text();
  if (answer.status === 200 && text.includes('The last place went while you were answering'))
    return 'told it is full';
  return `error: ${answer.status} ${to}`;
}

const cookies = tokens.split(',').map((token) => `combwood_draft=${token}`);
const fields = await readForm(cookies[0]);
process.once('message', async () => {
  const told = {};
  const outcomes = await Promise.all(
    cookies.map((cookie) =>
      press(fields, cookie).catch((error) => `error: ${error.cause?.code ?? error.message}`),
    ),
  );
  for (const outcome of outcomes) told[outcome] = (told[outcome] ?? 0) + 1;
  process.send(told, () => process.exit(0));
});
process.send('ready');
