import currencies from 'currency-codes';

/** Money in integer minor units of its currency (cents, yen, fils). */
export type Minor = number & { readonly __minor: true };

/** Throws on anything but a safe whole number: a fraction of a cent is a bug. */
export function minor(amount: number): Minor {
  if (!Number.isSafeInteger(amount)) throw new RangeError(`Not a whole number of minor units: ${amount}`);
  return amount as Minor;
}

export const addMinor = (...parts: Minor[]): Minor => minor(parts.reduce((sum, part) => sum + part, 0));

// The package looks through its whole table for each question; a list of people asks tens of thousands of times.
const DIGITS = new Map(currencies.data.map(({ code, digits }) => [code, digits]));

/** Digits after the point by ISO 4217 (JPY 0, EUR 2, BHD 3); `Intl` differs for HUF and others. Throws if unknown. */
export function currencyDigits(code: string): number {
  const digits = DIGITS.get(code.toUpperCase());
  if (digits === undefined) throw new RangeError(`Unknown currency: ${code}`);
  return digits;
}

export const isCurrency = (code: string): boolean => currencies.code(code) !== undefined;

export const listCurrencies = (): { code: string; name: string }[] =>
  currencies.data.map(({ code, currency }) => ({ code, name: currency }));

/** `formatMoney(46000, 'EUR')` → "€460.00". Digits come from ISO 4217. */
export function formatMoney(amount: Minor, currency: string, locale = 'en-GB'): string {
  const digits = currencyDigits(currency);
  return new Intl.NumberFormat(locale, {
    style: 'currency',
    currency,
    minimumFractionDigits: digits,
    maximumFractionDigits: digits,
  }).format(amount / 10 ** digits);
}

/** `plainMoney(46050, 'EUR')` → "460.50": for spreadsheets and form fields, without a symbol. */
export function plainMoney(amount: Minor, currency: string): string {
  const digits = currencyDigits(currency);
  return (amount / 10 ** digits).toFixed(digits);
}

/**
 * A typed amount ("460", "460.50", "1,250.00") to minor units; null when it is no amount or has more decimals than
 * the currency has. A comma or space is taken as a thousands mark only before groups of three digits.
 */
export function parseMoney(text: string, currency: string): Minor | null {
  const digits = currencyDigits(currency);
  const plain = text.trim().replace(/(?<=\d)[,\u00a0\u202f ](?=\d{3}(\D|$))/g, '');
  const match = /^(\d{1,12})(?:[.,](\d+))?$/.exec(plain);
  if (!match) return null;
  const fraction = match[2] ?? '';
  if (fraction.length > digits) return null;
  return minor(Number(match[1]) * 10 ** digits + Number(fraction.padEnd(digits, '0') || '0'));
}
