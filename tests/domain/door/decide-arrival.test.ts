import { describe, expect, test } from 'vitest';
import { type DoorPerson, decideArrival, decideUndo } from '@/lib/domain/door/decide-arrival';
import { REGISTRATION_STATES } from '@/lib/domain/registration/states';

const person = (over: Partial<DoorPerson> = {}): DoorPerson => ({
  campId: 'cmp_1',
  state: 'confirmed',
  arrival: 'expected',
  consentMissing: false,
  ...over,
});

describe('the verdict at the door', () => {
  test.each([
    ['a confirmed person who is expected', person(), 'arrived'],
    ['one who is in', person({ arrival: 'arrived' }), 'already'],
    ['one who left and comes back', person({ arrival: 'left' }), 'arrived'],
    ['one written off as no-show who comes after all', person({ arrival: 'no-show' }), 'arrived'],
    ['a code that names nobody', null, 'not-valid'],
    ['a ticket of another camp', person({ campId: 'cmp_2' }), 'other-camp'],
    [
      'another camp counts before what became of the place there',
      person({ campId: 'cmp_2', state: 'cancelled' }),
      'other-camp',
    ],
    // Product rule: a minor without consent cannot be marked arrived.
    ['a minor without consent', person({ consentMissing: true }), 'consent-missing'],
    [
      'a minor without consent who is in already',
      person({ consentMissing: true, arrival: 'arrived' }),
      'already',
    ],
  ] as const)('%s', (_, who, verdict) => {
    expect(decideArrival('cmp_1', who)).toBe(verdict);
  });

  test('only a confirmed place lets anyone in', () => {
    const inside = REGISTRATION_STATES.filter(
      (state) => decideArrival('cmp_1', person({ state })) === 'arrived',
    );
    expect(inside).toEqual(['confirmed']);
  });

  test('an undo takes back an arrival of this camp and nothing else', () => {
    expect(decideUndo('cmp_1', person({ arrival: 'arrived' }))).toBe('undone');
    expect(decideUndo('cmp_1', person())).toBe('nothing-to-undo');
    expect(decideUndo('cmp_1', person({ arrival: 'arrived', campId: 'cmp_2' }))).toBe('nothing-to-undo');
    expect(decideUndo('cmp_1', null)).toBe('nothing-to-undo');
  });
});
