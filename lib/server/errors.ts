import 'server-only';

/** Expected refusals that any action or route may answer with. A noun's own use-cases add codes here. */
export const ERRORS = {
  bad_input: { status: 400, sentence: 'Some answers need another look.' },
  wrong_origin: {
    status: 403,
    sentence: 'This request did not come from our own pages. Open the page again and retry.',
  },
  sign_in_first: { status: 401, sentence: 'Sign in to go on.' },
  not_allowed: { status: 403, sentence: 'Your role does not cover this. Ask an organiser.' },
  not_found: { status: 404, sentence: 'There is nothing here, or it is not yours to see.' },
  too_many: { status: 429, sentence: 'That was a lot of tries. Wait a few minutes, then try again.' },
  stale: {
    status: 409,
    sentence:
      'Someone changed this since you opened it. Load the page again to see their version; your text is still here to copy.',
  },
  too_large: { status: 413, sentence: 'That is too large to take. The limit is 10 MB.' },
  unavailable: {
    status: 503,
    sentence: 'This does not answer just now. Nothing was lost; try again in a minute.',
  },
  broken: {
    status: 500,
    sentence:
      'Something went wrong on our side. Nothing was changed. Try again; if it stays, write to us with the reference.',
  },
} as const satisfies Record<string, { status: number; sentence: string }>;

export type ErrorCode = keyof typeof ERRORS;

/** An expected refusal. `sentence` replaces the table's where the noun can say it better; `fields` names inputs. */
export type Refusal = { code: ErrorCode; sentence?: string; fields?: Record<string, string[]> };

export const refuse = (code: ErrorCode, more: Omit<Refusal, 'code'> = {}): { ok: false; error: Refusal } => ({
  ok: false,
  error: { code, ...more },
});
