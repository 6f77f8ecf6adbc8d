import 'server-only';
import type { WhoAnswer } from '@/lib/domain/registration/answers';
import { ok, type Result } from '@/lib/domain/shared/result';
import { suggestEmail } from '@/lib/domain/shared/suggest-email';
import { type Refusal, refuse } from '../errors';
import { readDraftToken } from './draft-cookie';
import { findDraft } from './find-draft';
import { keepAnswer } from './keep-answer';
import { requireOnSale } from './require-on-sale';

/** Takes who comes and who pays. An address that looks mistyped is asked about once, then taken as it is. */
export async function answerWho(slug: string, who: WhoAnswer, now: number): Promise<Result<null, Refusal>> {
  const sale = requireOnSale(slug, now);
  if (!sale.ok) return sale;
  const { camp } = sale.value.programme;
  const seen = findDraft(await readDraftToken(), camp.id)?.warned.split(' ') ?? [];
  const doubtful = (['attendeeEmail', 'payerEmail'] as const).flatMap((field) => {
    const meant = who[field] === '' || seen.includes(who[field]) ? null : suggestEmail(who[field]);
    return meant ? [{ field, typed: who[field], meant }] : [];
  });
  if (doubtful.length > 0) {
    await keepAnswer(
      camp,
      { warned: [...seen, ...doubtful.map(({ typed }) => typed)].join(' ').trim() },
      now,
    );
    return refuse('bad_input', {
      sentence: 'One address looks mistyped.',
      fields: Object.fromEntries(
        doubtful.map(({ field, typed, meant }) => [
          field,
          [`Did you mean ${meant}? Correct it, or continue again if ${typed} is right.`],
        ]),
      ),
    });
  }
  await keepAnswer(camp, { who }, now);
  return ok(null);
}
