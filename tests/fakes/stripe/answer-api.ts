import { createHash } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { readBody } from '../web/read-body';
import { ApiError, badRequest, unauthorized, unknownUrl } from './api-error';
import { API_VERSION } from './emit-event';
import { endpoints } from './endpoints';
import { expandObject } from './expand-object';
import { commit, type Mock } from './mock';
import { newId } from './new-id';
import { type FormObject, parseForm } from './parse-form';
import type { FaultKind, SavedAnswer } from './records';
import { takeFault } from './take-fault';

type Outcome = { status: number; body: string; requestId: string; headers: Record<string, string> };

const callFaults: FaultKind[] = [
  'rate-limit',
  'server-error',
  'timeout-before-work',
  'timeout-after-success',
  'cut-after-success',
];
const DAY_MS = 24 * 60 * 60 * 1000;

function checkKey(req: IncomingMessage): void {
  const key = /^Bearer (.+)$/.exec(req.headers.authorization ?? '')?.[1];
  if (key === undefined)
    throw unauthorized('You did not provide an API key. Use an Authorization header with the Bearer scheme.');
  if (/^(sk|rk)_live_/.test(key))
    throw unauthorized('This is a live key. The local stand-in takes test keys only; no money moves here.');
  if (!/^(sk|rk)_test_\w+$/.test(key)) throw unauthorized('Invalid API Key provided.');
}

function checkVersion(req: IncomingMessage): void {
  const asked = req.headers['stripe-version'];
  if (asked !== undefined && asked !== API_VERSION)
    throw badRequest(`Invalid Stripe API version: ${String(asked)}. This stand-in speaks ${API_VERSION}.`);
}

const toText = (body: object) => `${JSON.stringify(body, null, 2)}\n`;

function work(mock: Mock, req: IncomingMessage, url: URL, form: FormObject, requestId: string): string {
  const method = req.method ?? 'GET';
  const key = req.headers['idempotency-key'];
  const cause = { id: requestId, idempotency_key: typeof key === 'string' ? key : null };
  for (const endpoint of endpoints) {
    const match = endpoint.method === method ? endpoint.path.exec(url.pathname) : null;
    if (!match) continue;
    const { object, expand } = endpoint.run({ mock, id: decodeURIComponent(match[1] ?? ''), form, cause });
    return toText(expandObject(mock, object, expand));
  }
  throw unknownUrl(method, url.pathname);
}

function replay(saved: SavedAnswer, fingerprint: string, key: string): Outcome {
  if (saved.fingerprint !== fingerprint)
    throw new ApiError(400, {
      type: 'idempotency_error',
      message: `Keys for idempotent requests can only be used with the same parameters they were first used with. Try using a key other than '${key}' if you meant to execute a different request.`,
    });
  const headers = { 'idempotent-replayed': 'true', 'original-request': saved.requestId };
  return { status: saved.status, body: saved.body, requestId: saved.requestId, headers };
}

function answer(mock: Mock, req: IncomingMessage, url: URL, body: string, requestId: string): Outcome {
  const form = parseForm(req.method === 'GET' ? url.search : body);
  const key = req.method === 'POST' ? req.headers['idempotency-key'] : undefined;
  if (typeof key !== 'string')
    return { status: 200, body: work(mock, req, url, form, requestId), requestId, headers: {} };
  if (key.length > 255) throw badRequest('Idempotency keys may be at most 255 characters long.');
  const fingerprint = createHash('sha256')
    .update(`${url.pathname}\n${JSON.stringify(form)}`)
    .digest('hex');
  const saved = mock.store.get('answer', key);
  if (saved && saved.at > mock.now() - DAY_MS) return replay(saved, fingerprint, key);
  const save = (status: number, text: string): Outcome => {
    mock.store.put('answer', key, { fingerprint, status, body: text, requestId, at: mock.now() });
    return { status, body: text, requestId, headers: {} };
  };
  try {
    return save(200, work(mock, req, url, form, requestId));
  } catch (error) {
    if (error instanceof ApiError && error.saved) return save(error.status, toText({ error: error.body }));
    throw error;
  }
}

function failure(error: unknown, requestId: string): Outcome {
  if (error instanceof ApiError)
    return { status: error.status, body: toText({ error: error.body }), requestId, headers: {} };
  console.error(error);
  const body = { type: 'api_error', message: 'The stand-in itself failed; its output says why.' };
  return { status: 500, body: toText({ error: body }), requestId, headers: {} };
}

function faultError(kind: FaultKind | undefined): ApiError | null {
  if (kind === 'rate-limit')
    return new ApiError(429, {
      type: 'invalid_request_error',
      code: 'rate_limit',
      message: 'Too many requests hit the API too quickly. (A fault asked for by a test.)',
    });
  if (kind === 'server-error')
    return new ApiError(500, {
      type: 'api_error',
      message: 'Something went wrong. (A fault asked for by a test.)',
    });
  return null;
}

/** One /v1 call: key, version, faults, idempotency, endpoint, and all its changes written before it is answered. */
export async function answerApi(
  mock: Mock,
  req: IncomingMessage,
  res: ServerResponse,
  url: URL,
): Promise<void> {
  const body = await readBody(req);
  const requestId = newId('req_');
  let outcome: Outcome;
  let fault: FaultKind | undefined;
  try {
    checkKey(req);
    checkVersion(req);
    fault = takeFault(mock, callFaults, { method: req.method ?? 'GET', path: url.pathname })?.kind;
    const injected = faultError(fault);
    if (injected) throw injected;
    // Left hanging: the caller's own timeout ends it.
    if (fault === 'timeout-before-work') return;
    outcome = answer(mock, req, url, body, requestId);
  } catch (error) {
    mock.store.rollback();
    outcome = failure(error, requestId);
  }
  commit(mock);
  if (fault === 'timeout-after-success') return;
  if (fault === 'cut-after-success') {
    res.destroy();
    return;
  }
  const key = req.headers['idempotency-key'];
  res.writeHead(outcome.status, {
    'content-type': 'application/json',
    'content-length': Buffer.byteLength(outcome.body),
    'cache-control': 'no-cache, no-store',
    'request-id': outcome.requestId,
    'stripe-version': API_VERSION,
    ...(typeof key === 'string' ? { 'idempotency-key': key } : {}),
    ...outcome.headers,
  });
  res.end(outcome.body);
}
