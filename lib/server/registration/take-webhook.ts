import 'server-only';
import { brokenBy } from '../ladder';
import { log } from '../log';
import { readEvent } from '../payments/read-event';
import { requestId } from '../peer-address';
import { problem } from '../problem';
import { readRawBody } from '../read-raw-body';
import { applyEvent } from './apply-event';

/** The provider's events are a few kilobytes. */
const LIMIT = 256 * 1024;

/**
 * One event from the provider. Its signature over the raw body is the proof, instead of a sign-in or an origin, and
 * is checked before anything is parsed. Anything but 2xx makes the provider send it again, so that is said only where
 * another try can help; what a person must look at is kept and answered with 200.
 */
export async function takeWebhook(request: Request, now: number): Promise<Response> {
  const id = requestId(request.headers);
  const body = await readRawBody(request, LIMIT);
  if (body === null) return problem({ code: 'too_large' }, id);
  const event = readEvent(body, request.headers.get('stripe-signature'), now);
  if (!event.ok) {
    log.warn({ requestId: id, why: event.error }, 'webhook refused');
    return problem({ code: 'bad_input', sentence: 'The signature is missing, wrong or out of time.' }, id);
  }
  try {
    const { outcome } = applyEvent(event.value, now);
    log.info({ requestId: id, event: event.value.id, type: event.value.type, outcome }, 'webhook');
    return Response.json({ outcome }, { headers: { 'cache-control': 'no-store' } });
  } catch (error) {
    return problem(brokenBy(error, id), id);
  }
}
