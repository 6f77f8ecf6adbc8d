import fc from 'fast-check';
import { expect, test } from 'vitest';
import { afterFailure } from '@/lib/domain/mail/after-failure';

const HOUR = 3_600_000;
const jitter = fc.double({ min: 0, max: 1, noNaN: true, maxExcluded: true });

test('the wait doubles from half a minute to an hour, and chance only shortens it by half', () => {
  const waits = (chance: number) =>
    [1, 2, 3, 7, 8, 200].map((attempts) => afterFailure('away', { attempts, createdAt: 0 }, 0, chance));
  expect(waits(1)).toEqual([30_000, 60_000, 120_000, 1_920_000, HOUR, HOUR]);
  expect(waits(0)).toEqual([15_000, 30_000, 60_000, 960_000, HOUR / 2, HOUR / 2]);
});

// RFC 5321, 4.5.4.1: the give-up time generally needs to be at least 4 to 5 days.
test('a server that is away loses nothing for five days', () => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 500 }), jitter, (attempts, chance) => {
      const now = 119 * HOUR;
      const again = afterFailure('away', { attempts, createdAt: 0 }, now, chance);
      expect(again).toBeGreaterThan(now);
      expect(again).toBeLessThanOrEqual(now + HOUR);
      expect(afterFailure('away', { attempts, createdAt: 0 }, 120 * HOUR, chance)).toBeNull();
    }),
  );
});

test('what is refused for good is not tried again; what cannot be written, seven times more', () => {
  expect(afterFailure('refused', { attempts: 1, createdAt: 0 }, 0, 0.5)).toBeNull();
  expect(afterFailure('broken', { attempts: 7, createdAt: 0 }, 0, 0.5)).not.toBeNull();
  expect(afterFailure('broken', { attempts: 8, createdAt: 0 }, 0, 0.5)).toBeNull();
});
