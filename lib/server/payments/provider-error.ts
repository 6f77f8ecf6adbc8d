import 'server-only';
import Stripe from 'stripe';
import { err } from '@/lib/domain/shared/result';
import { log } from '../log';

/**
 * unavailable: no answer, or one that says to come back; the outcome may be either, so ask again with the same key ·
 * refused: it understood and said no; asking the same again changes nothing.
 */
export type ProviderError = 'unavailable' | 'refused';

/** Turns what the SDK throws into a value; a bug of ours goes on as it is. */
export function toProviderError(error: unknown, asked: string): { ok: false; error: ProviderError } {
  if (!(error instanceof Stripe.errors.StripeError)) throw error;
  const refused =
    error instanceof Stripe.errors.StripeInvalidRequestError ||
    error instanceof Stripe.errors.StripeCardError;
  // The SDK's message may quote an address: code and type only.
  log.warn(
    {
      asked,
      type: error.type,
      code: error.code ?? null,
      param: error.param ?? null,
      providerRequest: error.requestId ?? null,
    },
    'payment service',
  );
  return err(refused ? 'refused' : 'unavailable');
}
