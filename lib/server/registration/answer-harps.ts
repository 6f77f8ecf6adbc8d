import 'server-only';
import type { z } from 'zod';
import { ownedHarpIds } from '@/lib/domain/harp/owned-harp-ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { harpsFormSchema } from '@/lib/schemas/registration';
import { type Refusal, refuse } from '../errors';
import { keepAnswer } from './keep-answer';
import { requireOnSale } from './require-on-sale';

/** Takes the harps somebody owns, with the one chosen in the lists whichever button was pressed. None is an answer. */
export async function answerHarps(
  input: z.output<typeof harpsFormSchema>,
  now: number,
): Promise<Result<null, Refusal>> {
  const sale = requireOnSale(input.slug, now);
  if (!sale.ok) return sale;
  if (input.intent === 'add' && input.addKey === undefined)
    return refuse('bad_input', { fields: { addKey: ['Choose the key of the harp to add.'] } });
  await keepAnswer(sale.value.programme.camp, { harps: { harpIds: ownedHarpIds(input) } }, now);
  return ok(null);
}
