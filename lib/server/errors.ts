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
  not_ready: {
    status: 409,
    sentence: 'Something is still missing for this. Look at the list and mend it first.',
  },
  in_use: { status: 409, sentence: 'Something else still uses this. Change that first.' },
  clash: { status: 409, sentence: 'That does not fit the timetable. Nothing was changed.' },
  too_large: { status: 413, sentence: 'That is too large to take. The limit is 10 MB.' },
  camp_full: {
    status: 409,
    sentence:
      'The last place went while you were answering. Write to the organisers to hear if one comes free.',
  },
  track_full: {
    status: 409,
    sentence: 'This track filled up while you were answering. Choose another; your answers are kept.',
  },
  elective_full: {
    status: 409,
    sentence:
      'An elective filled up while you were answering. Take it out or swap it; your answers are kept.',
  },
  camp_closed: { status: 409, sentence: 'Registration for this camp is closed.' },
  hold_over: {
    status: 409,
    sentence:
      'The time for paying ran out and the place went back. Your answers are kept: try again with them.',
  },
  not_payable: { status: 409, sentence: 'There is nothing to pay on this order any more.' },
  payment_down: {
    status: 503,
    sentence:
      'The payment service does not answer just now. Your place stays held; press Pay again in a minute.',
  },
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
