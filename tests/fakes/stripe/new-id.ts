import { randomBytes } from 'node:crypto';

const alphabet = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789';

const lengths = {
  cs_test_: 58,
  li_: 24,
  price_: 24,
  prod_: 14,
  pi_: 24,
  ch_: 24,
  re_: 24,
  txn_: 24,
  evt_: 24,
  req_: 14,
  pm_: 24,
} as const;

/** Ids look like Stripe's: a prefix and letters and digits. */
export function newId(prefix: keyof typeof lengths): string {
  return prefix + letters(lengths[prefix]);
}

export function letters(count: number): string {
  return Array.from(randomBytes(count), (byte) => alphabet[byte % alphabet.length]).join('');
}
