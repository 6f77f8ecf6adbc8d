import 'server-only';
import type { Route } from 'next';
import { notFound, redirect } from 'next/navigation';
import type { Answers } from '@/lib/domain/registration/answers';
import { currentAnswers } from '@/lib/domain/registration/current-answers';
import { payPath, stepPath } from '@/lib/domain/registration/step-path';
import { type AnswerStep, firstUnanswered, isReachable } from '@/lib/domain/registration/steps';
import { getPublicCamp, type PublicCamp } from '../camps/get-public-camp';
import { readDraftToken } from './draft-cookie';
import { findDraft } from './find-draft';

export type OpenStep = PublicCamp & { answers: Answers };

/**
 * For the pages of the steps: the camp, its places, and what this browser has answered. Sends on to the first step
 * not yet answered (ASVS 2.3.1), to the payment of a place already held, or to the page that says why nothing is sold.
 */
export async function openStep(slug: string, step: AnswerStep | 'check'): Promise<OpenStep> {
  const found = getPublicCamp(slug);
  if (!found) notFound();
  const draft = findDraft(await readDraftToken(), found.programme.camp.id);
  if (draft?.order?.state === 'held') redirect(payPath(slug, draft.order.id) as Route);
  const answers = draft && !draft.order ? currentAnswers(draft.answers, found.programme) : {};
  // Somebody on the way may finish even if it is full just now: a place may come back before they are done.
  if (found.standing !== 'open' && !(found.standing === 'full' && answers.who))
    redirect(`/camps/${slug}/register` as Route);
  if (!isReachable(step, answers)) redirect(stepPath(slug, firstUnanswered(answers)) as Route);
  return { ...found, answers };
}
