import type { Answers } from '@/lib/domain/registration/answers';
import { harpsSchema, needsSchema, trackSchema, whoSchema } from './registration';

const STEPS = { who: whoSchema, track: trackSchema, harps: harpsSchema, needs: needsSchema };

/** A draft's answers as they come from the database; an answer that no longer fits its schema counts as not given. */
export function readAnswers(stored: Record<string, unknown>): Answers {
  const answers: Record<string, unknown> = {};
  for (const [step, schema] of Object.entries(STEPS)) {
    const read = schema.safeParse(stored[step]);
    if (read.success) answers[step] = read.data;
  }
  return answers;
}
