import 'server-only';
import { z } from 'zod';
import type { NeedsAnswer } from '@/lib/domain/registration/answers';
import { ok, type Result } from '@/lib/domain/shared/result';
import { countryOfZone, toE164 } from '@/lib/domain/shared/to-e164';
import { type Refusal, refuse } from '../errors';
import { readDraftToken } from './draft-cookie';
import { findDraft } from './find-draft';
import { keepAnswer } from './keep-answer';
import { requireOnSale } from './require-on-sale';

/** Takes food, access and who to call; for a minor also the guardian and their consent. */
export async function answerNeeds(
  slug: string,
  given: NeedsAnswer,
  now: number,
): Promise<Result<null, Refusal>> {
  const sale = requireOnSale(slug, now);
  if (!sale.ok) return sale;
  const { camp } = sale.value.programme;
  const minor = findDraft(await readDraftToken(), camp.id)?.answers.who?.minor ?? false;
  const checked = checkNeeds(given, { minor, timeZone: camp.timeZone });
  if (!checked.ok) return checked;
  await keepAnswer(camp, { needs: checked.value }, now);
  return ok(null);
}

/** The answer with phone numbers in E.164 and nothing of a guardian for an adult, or what is missing by field. */
export function checkNeeds(
  given: NeedsAnswer,
  about: { minor: boolean; timeZone: string },
): Result<NeedsAnswer, Refusal> {
  const fields: Record<string, string[]> = {};
  const country = countryOfZone(about.timeZone);
  const phone = (field: 'emergencyPhone' | 'guardianPhone'): string => {
    const read = toE164(given[field], country);
    if (!read)
      fields[field] = [
        `“${given[field].slice(0, 40)}” is not a phone number we can read: begin with + and the country code, like +44 20 7946 0018.`,
      ];
    return read ?? '';
  };
  if (given.emergencyName === '')
    fields.emergencyName = ['Give the name of somebody to call if anything happens.'];
  const emergencyPhone = given.emergencyPhone === '' ? '' : phone('emergencyPhone');
  if (given.emergencyPhone === '') fields.emergencyPhone = ['Give their phone number.'];
  if (!about.minor) {
    const adult = {
      ...given,
      emergencyPhone,
      guardianName: '',
      guardianEmail: '',
      guardianPhone: '',
      consent: false,
    };
    return Object.keys(fields).length > 0 ? refuse('bad_input', { fields }) : ok(adult);
  }
  if (given.guardianName === '') fields.guardianName = ['Give the full name of a parent or guardian.'];
  if (!z.email().safeParse(given.guardianEmail).success)
    fields.guardianEmail = ['Give the guardian’s e-mail address, like noor@example.org.'];
  const guardianPhone = given.guardianPhone === '' ? '' : phone('guardianPhone');
  if (given.guardianPhone === '') fields.guardianPhone = ['Give the guardian’s phone number.'];
  if (!given.consent)
    fields.consent = ['A parent or guardian must agree before somebody under 18 can have a place.'];
  if (Object.keys(fields).length > 0) return refuse('bad_input', { fields });
  return ok({ ...given, emergencyPhone, guardianPhone });
}
