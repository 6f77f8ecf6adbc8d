import { currencyDigits, type Minor } from './money';

/** `460.00`, `1200` (yen): for machines, without a currency sign and with a point. */
export function decimalMoney(amount: Minor, currency: string): string {
  const digits = currencyDigits(currency);
  return (amount / 10 ** digits).toFixed(digits);
}
