import 'server-only';
import type { SubmissionResult } from '@conform-to/react';
import { parseWithZod } from '@conform-to/zod/v4';
import { headers } from 'next/headers';
import { unstable_rethrow } from 'next/navigation';
import type { z } from 'zod';
import type { Permission } from '@/lib/domain/access/permissions';
import type { Result } from '@/lib/domain/shared/result';
import type { TargetKind } from './access/find-target';
import type { Refusal } from './errors';
import { brokenBy, type Context, climb, isRefusal, sentenceOf } from './ladder';
import { requestId } from './peer-address';
import type { Budget } from './rate-limit';
import { refuseFormShape } from './refuse-form-shape';

/** What a form's `useActionState` holds; null before the first send. */
export type FormState = SubmissionResult<string[]> | null;

type Spec<Schema extends z.ZodType, Value> = {
  schema: Schema;
  permission: Permission;
  /** The kind of row, and the form field that holds its id. */
  on?: { kind: TargetKind; field: string };
  rate?: Budget;
  /** Form fields whose values never go back to the page (passwords). */
  hide?: string[];
  run: (
    input: z.output<Schema>,
    context: Context,
  ) => Result<Value, Refusal> | Promise<Result<Value, Refusal>>;
  /** Usually a redirect; without one the form says it is saved. */
  onOk?: (value: Value, input: z.output<Schema>) => void | Promise<void>;
};

export type Action = ((previous: FormState, form: FormData) => Promise<FormState>) & {
  access: { permission: Permission; on: TargetKind | null };
};

/**
 * Wraps a use-case as a server action: origin → rate limit → sign-in → permission → parse → run → map error.
 * Bad input comes back by field with everything that was typed. `access` lets a test walk every action there is.
 */
export function action<Schema extends z.ZodType, Value>(spec: Spec<Schema, Value>): Action {
  const handle = async (_previous: FormState, form: FormData): Promise<FormState> => {
    const odd = refuseFormShape(form);
    if (odd) return { status: 'error', error: { '': [sentenceOf(odd)] } };
    const submission = parseWithZod(form, { schema: spec.schema });
    const say = (refusal: Refusal): FormState =>
      submission.reply({
        formErrors: [sentenceOf(refusal)],
        fieldErrors: refusal.fields ?? {},
        hideFields: spec.hide ?? [],
      });
    const known = await headers();
    const on = spec.on && { kind: spec.on.kind, id: String(form.get(spec.on.field) ?? '') };
    try {
      const climbed = await climb(known, {
        permission: spec.permission,
        on,
        rate: spec.rate ?? 'edit',
        sameOrigin: true,
      });
      if (isRefusal(climbed)) return say(climbed);
      if (submission.status !== 'success') return submission.reply({ hideFields: spec.hide ?? [] });
      const result = await spec.run(submission.value as z.output<Schema>, climbed);
      if (!result.ok) return say(result.error);
      await spec.onOk?.(result.value, submission.value as z.output<Schema>);
      return { ...submission.reply({ hideFields: spec.hide ?? [] }), status: 'success' };
    } catch (error) {
      unstable_rethrow(error);
      return say(brokenBy(error, requestId(known)));
    }
  };
  return Object.assign(handle, { access: { permission: spec.permission, on: spec.on?.kind ?? null } });
}
