import 'server-only';
import { judgePassword } from '@/lib/domain/account/judge-password';
import { type Refusal, refuse } from '../errors';
import { isCommonPassword } from './is-common-password';

/** The refusal at the password's field when a new one will not do. */
export function passwordRefusal(
  password: string,
  person: { email: string; name: string },
): { ok: false; error: Refusal } | null {
  const said = judgePassword(password, person, isCommonPassword);
  return said ? refuse('bad_input', { fields: { password: [said] } }) : null;
}
