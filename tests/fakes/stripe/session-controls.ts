import { z } from 'zod';
import { type Control, ControlError, read } from './control';
import { expireDue, expireSession } from './expire-session';
import { commit, type Mock, noCause } from './mock';
import { outcomes, paySession } from './pay-session';
import { settleSlowPayment } from './pay-slowly';

function requireSession(mock: Mock, id: string) {
  const record = mock.store.get('session', id);
  if (!record) throw new ControlError(404, `No session ${id}.`);
  return record;
}

/** What a person would press on the payment page, and what only time or a bank would do. */
export const sessionControls: Control[] = [
  {
    method: 'GET',
    path: /^\/_mock\/sessions$/,
    run: (mock) => ({ sessions: mock.store.all('session').map(({ session }) => session) }),
  },
  {
    // what a person would press on the payment page
    method: 'POST',
    path: /^\/_mock\/sessions\/([^/]+)\/outcome$/,
    run: (mock, input, id) => {
      requireSession(mock, id);
      const schema = z.object({ outcome: z.enum(outcomes), email: z.email().optional() });
      const { outcome, email } = read(schema, input);
      const done = paySession(mock, id, outcome, email ?? null);
      commit(mock);
      if (!done) throw new ControlError(409, `“${outcome}” does not fit the state of session ${id}.`);
      return requireSession(mock, id).session;
    },
  },
  {
    // ends a payment by a slow method
    method: 'POST',
    path: /^\/_mock\/sessions\/([^/]+)\/settle$/,
    run: (mock, input, id) => {
      requireSession(mock, id);
      const { status } = read(z.object({ status: z.enum(['succeeded', 'failed']) }), input);
      if (!settleSlowPayment(mock, id, status))
        throw new ControlError(409, `No slow payment is on its way for session ${id}.`);
      commit(mock);
      return requireSession(mock, id).session;
    },
  },
  {
    // moves the session's end nearer, so that its hour passes now
    method: 'POST',
    path: /^\/_mock\/sessions\/([^/]+)\/advance$/,
    run: (mock, input, id) => {
      const record = requireSession(mock, id);
      const by = read(z.object({ seconds: z.coerce.number().int().min(1).max(86_400) }), input).seconds;
      const session = { ...record.session, expires_at: record.session.expires_at - by };
      mock.store.put('session', id, { ...record, session });
      expireDue(mock);
      return requireSession(mock, id).session;
    },
  },
  {
    method: 'POST',
    path: /^\/_mock\/sessions\/([^/]+)\/expire$/,
    run: (mock, _input, id) => {
      const record = requireSession(mock, id);
      if (record.session.status !== 'open')
        throw new ControlError(409, `Session ${id} is ${record.session.status}, so it cannot expire.`);
      expireSession(mock, record, noCause);
      commit(mock);
      return requireSession(mock, id).session;
    },
  },
];
