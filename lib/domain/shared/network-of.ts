/**
 * What one subscriber holds, for counting tries: an IPv4 address as such, an IPv6 one by its /64, of which every home has
 * all 2^64 to walk through (RFC 6177). An IPv4 address in IPv6's clothes (`::ffff:`) is taken out of them.
 */
export function networkOf(address: string): string {
  const plain = address.trim().replace(/^::ffff:(?=\d+\.)/i, '');
  if (!/^[0-9a-f:.]+(%.*)?$/i.test(plain) || !plain.includes(':')) return plain;
  const [head = '', tail] = plain.split('::');
  const left = head.split(':').filter(Boolean);
  const right = (tail ?? '').split(':').filter(Boolean);
  const gap = tail === undefined ? 0 : Math.max(0, 8 - left.length - right.length);
  const groups = [...left, ...Array<string>(gap).fill('0'), ...right].slice(0, 4);
  return `${groups.map((group) => Number.parseInt(group, 16).toString(16)).join(':')}::/64`;
}
