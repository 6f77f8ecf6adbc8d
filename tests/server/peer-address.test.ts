import { createServer, request } from 'node:http';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';

// ASVS 5.0, 4.1.3 and 15.3.4: a client's own X-Forwarded-For decides nothing.
beforeEach(() => vi.resetModules());
afterEach(() => vi.unstubAllEnvs());

const load = async (proxies: number) => {
  vi.stubEnv('TRUSTED_PROXIES', String(proxies));
  return import('@/lib/server/peer-address');
};

test.each([
  [0, '198.51.100.1', '192.0.2.1'],
  [0, '198.51.100.1, 192.0.2.1', '192.0.2.1'],
  [1, '198.51.100.1', '198.51.100.1'],
  [1, '10.9.9.9, 198.51.100.1', '198.51.100.1'],
  [2, '10.9.9.9, 198.51.100.1, 203.0.113.1', '198.51.100.1'],
  // Fewer entries than proxies: somebody came past them, so the socket counts.
  [2, '198.51.100.1', '192.0.2.1'],
  [1, '', '192.0.2.1'],
])('behind %i proxies, %j is %s', async (proxies, forwarded, address) => {
  const { clientAddress } = await load(proxies);
  const headers = new Headers({ 'x-combwood-peer': '192.0.2.1', 'x-forwarded-for': forwarded });
  expect(clientAddress(headers)).toBe(address);
});

test('one home network counts as one: IPv6 by /64, IPv4 as such', async () => {
  const { clientAddress } = await load(0);
  const of = (peer: string) => clientAddress(new Headers({ 'x-combwood-peer': peer }));
  expect(of('2001:db8:1:2:aaaa::1')).toBe(of('2001:db8:1:2:bbbb:cccc:dddd:1'));
  expect(of('2001:db8:1:2::1')).not.toBe(of('2001:db8:1:3::1'));
  expect(of('2001:db8::1')).toBe(of('2001:db8:0:0:5::'));
  expect(of('::ffff:192.0.2.7')).toBe('192.0.2.7');
  expect(of('192.0.2.7')).toBe('192.0.2.7');
  expect(of('::1')).not.toBe(of('2001:db8::1'));
});

test('what a client sends under our own names is overwritten', async () => {
  const { markRequests, clientAddress, requestId } = await load(0);
  markRequests();
  const server = createServer((incoming, answer) => {
    const headers = new Headers(incoming.headers as Record<string, string>);
    answer.end(JSON.stringify([clientAddress(headers), requestId(headers)]));
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const port = (server.address() as { port: number }).port;
  const body = await new Promise<string>((resolve, reject) => {
    const headers = {
      'x-combwood-peer': '6.6.6.6',
      'x-combwood-request': 'forged',
      'x-forwarded-for': '6.6.6.6',
      'x-real-ip': '6.6.6.6',
    };
    request({ port, host: '127.0.0.1', headers }, (answer) => {
      let text = '';
      answer.on('data', (part) => {
        text += part;
      });
      answer.on('end', () => resolve(text));
    })
      .on('error', reject)
      .end();
  });
  server.close();
  const [address, id] = JSON.parse(body) as [string, string];
  expect(address).toBe('127.0.0.1');
  expect(id).toMatch(/^[0-9a-f-]{36}$/);
});
