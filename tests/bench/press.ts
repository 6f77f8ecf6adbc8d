import autocannon from 'autocannon';

const CONNECTIONS = 8;
const SECONDS = 4;

type Result = Awaited<ReturnType<typeof autocannon>>;

function perSecond(url: string, result: Result, started: number): number {
  const wrong = result.non2xx + result.errors + result.timeouts;
  if (wrong > 0) throw new Error(`${wrong} of ${result.requests.total} requests to ${url} failed`);
  return (result.requests.total * 1000) / (performance.now() - started);
}

/** Requests a second of a GET, over a few kept connections; throws when any request fails. */
export async function pressGet(url: string, headers: Record<string, string> = {}): Promise<number> {
  const started = performance.now();
  return perSecond(
    url,
    await autocannon({ url, headers, connections: CONNECTIONS, duration: SECONDS }),
    started,
  );
}

/** Requests a second of so many POSTs, each with a body of its own. */
export async function pressPost(
  url: string,
  amount: number,
  headers: Record<string, string>,
  body: () => unknown,
): Promise<number> {
  const started = performance.now();
  const result = await autocannon({
    url,
    connections: CONNECTIONS,
    amount,
    requests: [
      {
        method: 'POST',
        headers: { 'content-type': 'application/json', ...headers },
        setupRequest: (request) => ({ ...request, body: JSON.stringify(body()) }),
      },
    ],
  });
  return perSecond(url, result, started);
}
