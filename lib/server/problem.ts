import 'server-only';
import { ERRORS, type Refusal } from './errors';
import { sentenceOf } from './ladder';

/** RFC 9457 problem details. `errors` names the inputs at fault with their remedy; `instance` is the log's reference. */
export function problem(refusal: Refusal, requestId: string): Response {
  const { status } = ERRORS[refusal.code];
  const body = {
    type: `urn:combwood:problem:${refusal.code}`,
    title: ERRORS[refusal.code].sentence,
    status,
    detail: sentenceOf(refusal),
    instance: `urn:uuid:${requestId}`,
    ...(refusal.fields && { errors: refusal.fields }),
  };
  return new Response(JSON.stringify(body), {
    status,
    headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store' },
  });
}
