import { describe, expect, test } from 'vitest';
import { requireTransition } from '@/lib/domain/registration/require-transition';
import { REGISTRATION_STATES, SEATED_STATES } from '@/lib/domain/registration/states';
import { REGISTRATION_EVENTS, TRANSITIONS, transition } from '@/lib/domain/registration/transitions';

// The whole machine, written out a second time by hand: a change of the table must be meant twice.
const LEGAL = `
  new: hold → held, confirm → confirmed, wait → waitlisted
  held: confirm → confirmed, lapse → expired, cancel → cancelled
  waitlisted: offer → offered, cancel → cancelled
  offered: hold → held, confirm → confirmed, lapse → expired, cancel → cancelled
  confirmed: cancel → cancelled, transfer → transferred
  expired: seat-again → confirmed
  cancelled:
  transferred:`;
const legal = new Map(
  LEGAL.trim()
    .split('\n')
    .flatMap((row) => {
      const [from = '', ways = ''] = row.trim().split(/:\s*/);
      return ways
        .split(', ')
        .filter(Boolean)
        .map((way) => [`${from} ${way.split(' → ')[0]}`, way.split(' → ')[1]] as const);
    }),
);
const pairs = (['new', ...REGISTRATION_STATES] as const).flatMap((from) =>
  REGISTRATION_EVENTS.map((event) => [from, event] as const),
);

describe('every state meets every event', () => {
  test.each(pairs)('%s, %s', (from, event) => {
    const to = legal.get(`${from} ${event}`);
    if (to) {
      expect(transition(from, event)).toEqual({ ok: true, value: to });
      expect(requireTransition(from, event)).toBe(to);
    } else {
      expect(transition(from, event)).toEqual({
        ok: false,
        error: { code: 'illegal_transition', from, event },
      });
      expect(() => requireTransition(from, event)).toThrow(event);
    }
  });
});

test('every state can be reached, and only a hold, a confirmation or an offer takes a place', () => {
  const reached = new Set(Object.values(TRANSITIONS).flatMap((ways) => Object.values(ways)));
  expect([...reached].sort()).toEqual([...REGISTRATION_STATES].sort());
  expect(SEATED_STATES).toEqual(['held', 'confirmed', 'offered']);
});
