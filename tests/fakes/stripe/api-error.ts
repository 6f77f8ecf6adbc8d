export type StripeErrorBody = {
  type: 'invalid_request_error' | 'idempotency_error' | 'api_error' | 'card_error';
  message: string;
  code?: string;
  param?: string;
  doc_url?: string;
};

/**
 * `saved` tells whether the answer is kept for its idempotency key: Stripe keeps what an endpoint answered once it
 * began its work, and not what failed before that (key, parameters, rate limit).
 */
export class ApiError extends Error {
  constructor(
    readonly status: number,
    readonly body: StripeErrorBody,
    readonly saved = false,
  ) {
    super(body.message);
  }
}

type Detail = { code?: string; param?: string };

/** 400 before the work began. */
export function badRequest(message: string, detail: Detail = {}): ApiError {
  return new ApiError(400, { type: 'invalid_request_error', message, ...detail });
}

/** 400 that the work itself ended in. */
export function refused(message: string, detail: Detail = {}): ApiError {
  return new ApiError(400, { type: 'invalid_request_error', message, ...detail }, true);
}

export function noSuch(noun: string, id: string, param: string): ApiError {
  return new ApiError(404, {
    type: 'invalid_request_error',
    code: 'resource_missing',
    message: `No such ${noun}: '${id}'`,
    param,
  });
}

export function unknownUrl(method: string, path: string): ApiError {
  return new ApiError(404, {
    type: 'invalid_request_error',
    message: `Unrecognized request URL (${method}: ${path}). This local stand-in speaks only the part of the API that the app uses.`,
  });
}

export function unauthorized(message: string): ApiError {
  return new ApiError(401, { type: 'invalid_request_error', message });
}
