import type { Answers, CompleteAnswers } from './answers';

/** One subject a page, in this order. */
export const STEPS = ['who', 'track', 'harps', 'needs', 'check', 'pay'] as const;
export type Step = (typeof STEPS)[number];
export type AnswerStep = 'who' | 'track' | 'harps' | 'needs';

export const STEP_WORDS = {
  who: 'Who is coming',
  track: 'Track and electives',
  harps: 'Harps you own',
  needs: 'What we should know',
  check: 'Check your answers',
  pay: 'Pay',
} satisfies Record<Step, string>;

export const nextStep = (step: Exclude<Step, 'pay'>): Step => STEPS[STEPS.indexOf(step) + 1] ?? 'pay';

/** A minor's needs are not answered before a guardian is named and has agreed: ticking "under 18" later asks again. */
const needsAnswered = ({ who, needs }: Answers): boolean =>
  needs !== undefined &&
  (!who?.minor || (needs.consent && needs.guardianName !== '' && needs.guardianPhone !== ''));

/** The first step still to do; `check` when all is answered. */
export function firstUnanswered(answers: Answers): AnswerStep | 'check' {
  if (!answers.who) return 'who';
  if (!answers.track) return 'track';
  if (!answers.harps) return 'harps';
  return needsAnswered(answers) ? 'check' : 'needs';
}

/** May this page be opened yet? Steps cannot be skipped, and may be gone back to. */
export const isReachable = (step: AnswerStep | 'check', answers: Answers): boolean =>
  STEPS.indexOf(step) <= STEPS.indexOf(firstUnanswered(answers));

export const isComplete = (answers: Answers): answers is CompleteAnswers =>
  firstUnanswered(answers) === 'check';
