import fc from 'fast-check';
import { expect, test } from 'vitest';
import { safeNext } from '@/lib/domain/account/safe-next';

// ASVS 5.0, 3.7.2: only addresses of our own. Forms that browsers read as another host: WHATWG URL, "relative state".
test.each([
  '//evil.example',
  '/\\evil.example',
  '\\\\evil.example',
  'https:evil.example',
  'https://evil.example/my',
  'javascript:alert(1)',
  'data:text/html,x',
  '/.//evil.example',
  '/a/..//evil.example',
  '/\t/evil.example',
  '/\n/evil.example',
  '\u0000/my',
  ' /my',
  'my',
  '',
  '?next=/my',
  `/${'a'.repeat(600)}`,
])('refuses %j', (next) => expect(safeNext(next)).toBeNull());

test.each([
  ['/my', '/my'],
  ['/my/orders/ord_1?x=1#pay', '/my/orders/ord_1?x=1#pay'],
  ['/organise/../my', '/my'],
  ['/camps/kettle-lake?next=https://evil.example', '/camps/kettle-lake?next=https://evil.example'],
])('lets %j through as %j', (next, path) => expect(safeNext(next)).toBe(path));

test('whatever it lets through stays on the host it is opened from', () => {
  const part = fc.oneof(
    fc.constantFrom('/', '\\', '//', '..', '.', '@', ':', '%2f', '%5c', '\t'),
    fc.string(),
  );
  fc.assert(
    fc.property(fc.array(part, { maxLength: 8 }), (parts) => {
      const path = safeNext(`/${parts.join('')}`);
      if (path === null) return;
      expect(new URL(path, 'https://camps.example.org').origin).toBe('https://camps.example.org');
    }),
    { numRuns: 5000 },
  );
});
