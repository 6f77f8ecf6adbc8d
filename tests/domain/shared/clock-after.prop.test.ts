import fc from 'fast-check';
import { Temporal } from 'temporal-polyfill';
import { expect, test } from 'vitest';
import { clockAfter } from '@/lib/domain/shared/local-time';

test('clockAfter agrees with Temporal.PlainTime, past midnight too', () => {
  fc.assert(
    fc.property(fc.nat(23), fc.nat(59), fc.integer({ min: 0, max: 4000 }), (hour, minute, minutes) => {
      const starts = Temporal.PlainTime.from({ hour, minute }).toString({ smallestUnit: 'minute' });
      const want = Temporal.PlainTime.from(starts).add({ minutes }).toString({ smallestUnit: 'minute' });
      expect(clockAfter(starts, minutes)).toBe(want);
    }),
  );
});
