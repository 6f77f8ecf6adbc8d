import { Agent, request } from 'node:http';
import autocannon from 'autocannon';

const CONNECTIONS = 8;
const SECONDS = 4;

/** Requests a second of a GET, over a few kept connections; throws when any request fails. */
export async function pressGet(url: string): Promise<number> {
  const started = performance.now();
  const result = await autocannon({ url, connections: CONNECTIONS, duration: SECONDS });
  const wrong = result.non2xx + result.errors + result.timeouts;
  if (wrong > 0) throw new Error(`${wrong} of ${result.requests.total} requests to ${url} failed`);
  return (result.requests.total * 1000) / (performance.now() - started);
}

/** Requests a second of so many POSTs, each sent exactly once with a body of its own. */
export async function pressPost(
  url: string,
  amount: number,
  headers: Record<string, string>,
  body: () => unknown,
): Promise<number> {
  const agent = new Agent({ keepAlive: true, maxSockets: CONNECTIONS });
  const post = () =>
    new Promise<void>((done, fail) => {
      const sent = request(
        url,
        { agent, method: 'POST', headers: { 'content-type': 'application/json', ...headers } },
        (answer) => {
          answer.resume();
          answer.on('end', () =>
            answer.statusCode === 200 ? done() : fail(new Error(`${url} answered ${answer.statusCode}`)),
          );
        },
      );
      sent.on('error', fail);
      sent.end(JSON.stringify(body()));
    });
  let left = amount;
  const one = async () => {
    for (; left > 0; ) {
      left -= 1;
      await post();
    }
  };
  const started = performance.now();
  await Promise.all(Array.from({ length: CONNECTIONS }, one));
  agent.destroy();
  return (amount * 1000) / (performance.now() - started);
}
