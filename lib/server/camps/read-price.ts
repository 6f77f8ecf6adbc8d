import 'server-only';
import { formatMoney, type Minor, minor, parseMoney } from '@/lib/domain/shared/money';
import { ok, type Result } from '@/lib/domain/shared/result';

/** What one payment by card may come to at most, in minor units: the provider's own bound. */
const MOST = minor(99_999_999);

/** A typed price in a currency; empty is null. The error is the sentence for its field. */
export function readPrice(text: string, currency: string): Result<Minor | null, string> {
  if (text === '') return ok(null);
  const price = parseMoney(text, currency);
  if (price === null)
    return {
      ok: false,
      error: `Price: “${text}” is no amount in ${currency}. Write it like ${example(currency)}.`,
    };
  if (price > MOST)
    return {
      ok: false,
      error: `Price: “${text}” is more than ${formatMoney(MOST, currency)}, the most we take.`,
    };
  return ok(price);
}

const example = (currency: string): string => priceText(parseMoney('460', currency), currency);

/** A price as a form shows it for editing: "460.00" in EUR, "46000" in JPY. */
export function priceText(price: Minor | null, currency: string): string {
  if (price === null) return '';
  return formatMoney(price, currency).replace(/[^\d.]/g, '');
}
