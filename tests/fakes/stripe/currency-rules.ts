import { code as isoCurrency } from 'currency-codes';

// Published: Stripe documentation, "Supported currencies", zero-decimal and three-decimal lists and the ISK case.
const zeroDecimal = new Set('bif clp djf gnf jpy kmf krw mga pyg rwf ugx vnd vuv xaf xof xpf'.split(' '));
const threeDecimal = new Set('bhd jod kwd omr tnd'.split(' '));
const wholeOnly = new Set(['isk']);

// Minimum charges of the same page, in the smallest unit, from memory; a currency not listed has none here.
const minimums: Record<string, number> = {
  aed: 200,
  aud: 50,
  bgn: 100,
  brl: 50,
  cad: 50,
  chf: 50,
  czk: 1500,
  dkk: 250,
  eur: 50,
  gbp: 30,
  hkd: 400,
  huf: 17500,
  inr: 50,
  jpy: 50,
  mxn: 1000,
  myr: 200,
  nok: 300,
  nzd: 50,
  pln: 200,
  ron: 200,
  sek: 300,
  sgd: 50,
  thb: 1000,
  usd: 50,
};

export const MAX_AMOUNT = 99_999_999;

export function isCurrency(lower: string): boolean {
  return /^[a-z]{3}$/.test(lower) && isoCurrency(lower.toUpperCase()) !== undefined;
}

export function minimumCharge(currency: string): number {
  return minimums[currency] ?? 1;
}

/** What Stripe asks of an amount beyond being whole: the last digits that must be 0. Null when it may be charged. */
export function amountProblem(amount: number, currency: string): string | null {
  if (threeDecimal.has(currency) && amount % 10 !== 0)
    return `Amounts in ${currency} have three decimals and must end in 0.`;
  if (wholeOnly.has(currency) && amount % 100 !== 0) return `Amounts in ${currency} must end in 00.`;
  return null;
}

export function formatMoney(amount: number, currency: string): string {
  const decimals = zeroDecimal.has(currency) ? 0 : threeDecimal.has(currency) ? 3 : 2;
  const style = { style: 'currency', currency: currency.toUpperCase(), currencyDisplay: 'code' } as const;
  return new Intl.NumberFormat('en', {
    ...style,
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
  }).format(amount / 10 ** decimals);
}
