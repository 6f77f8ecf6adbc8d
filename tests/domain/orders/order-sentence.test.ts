import { expect, test } from 'vitest';
import { orderSentence } from '@/lib/domain/orders/order-sentence';
import { minor } from '@/lib/domain/shared/money';

test('an expired booking says both things that late money can do: take a free place, or go back', () => {
  const facts = { heldUntil: null, timeZone: 'Europe/Berlin', currency: 'EUR', due: minor(0) } as const;
  const says = orderSentence({ ...facts, state: 'expired' }, 0);
  expect(says).toMatch(/not paid in time/);
  expect(says).toMatch(/a place again while one is free/);
  expect(says).toMatch(/goes back to you/);
});
