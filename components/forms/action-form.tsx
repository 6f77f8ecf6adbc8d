'use client';

import {
  type DefaultValue,
  FormProvider,
  getFormProps,
  type SubmissionResult,
  useForm,
} from '@conform-to/react';
import { type FormEvent, type ReactNode, startTransition, useActionState, useEffect, useRef } from 'react';
import { type ButtonTone, buttonClass } from '../ui/button-class';
import { ErrorSummary } from './error-summary';

export type FormState = SubmissionResult<string[]> | null;

type ActionFormProps = {
  action: (previous: FormState, form: FormData) => Promise<FormState>;
  children?: ReactNode;
  /** The submit button's words. */
  submit: string;
  /** What the button is called where several alike stand on a page; starts with the words of `submit`. */
  submitLabel?: string;
  tone?: ButtonTone;
  /** Values the page knows already; what the person typed wins after a refusal. */
  defaultValue?: Record<string, unknown>;
  /** Ids and the like. Never trusted: the action checks them again. */
  hidden?: Record<string, string | number>;
  /** Said after it worked, where the action stays on the page. */
  done?: string;
  /** Words for each field name in the error summary; a field's own label otherwise. */
  labels?: Record<string, string>;
  /** More buttons or links beside the submit. */
  beside?: ReactNode;
  className?: string;
};

/**
 * The form of the product: works without JavaScript, keeps what was typed, names each error at its field and in a
 * summary that takes the focus, and says when it is done.
 */
export function ActionForm(props: ActionFormProps) {
  const [state, send, pending] = useActionState(props.action, null);
  const [form] = useForm<Record<string, unknown>>({
    lastResult: state,
    // Conform's type for an untyped form allows flat strings only; nested values work all the same.
    defaultValue: props.defaultValue as DefaultValue<Record<string, unknown>>,
    // The page's own words, not the browser's bubbles.
    defaultNoValidate: true,
  });
  const summary = useRef<HTMLDivElement>(null);
  const adds = props.defaultValue === undefined;
  useEffect(() => {
    if (state?.status === 'error') summary.current?.focus();
    // A form that adds something is empty for the next; one that edits goes on showing what was saved.
    if (state?.status === 'success' && adds) summary.current?.closest('form')?.reset();
  }, [state, adds]);

  const { onSubmit, ...bound } = getFormProps(form);
  // Sent by hand: React empties a form after its action, refused or not, and with it all that was typed.
  const sendTyped = (event: FormEvent<HTMLFormElement>) => {
    onSubmit(event);
    if (event.defaultPrevented) return;
    event.preventDefault();
    const { submitter } = event.nativeEvent as SubmitEvent;
    const typed = new FormData(event.currentTarget, submitter);
    startTransition(() => send(typed));
  };

  return (
    <FormProvider context={form.context}>
      <form
        {...bound}
        onSubmit={sendTyped}
        action={send}
        noValidate
        className={props.className ?? 'grid max-w-prose gap-6'}
      >
        <ErrorSummary ref={summary} errors={form.allErrors} formId={form.id} labels={props.labels} />
        <div role="status" className="empty:hidden">
          {state?.status === 'success' && props.done && (
            <p className="border-l-8 border-moss bg-panel px-5 py-3 font-semibold text-moss">{props.done}</p>
          )}
        </div>
        {Object.entries(props.hidden ?? {}).map(([name, value]) => (
          <input key={name} type="hidden" name={name} value={value} />
        ))}
        {props.children}
        <div className="flex flex-wrap items-center gap-4">
          <button
            type="submit"
            className={buttonClass(props.tone ?? 'primary')}
            aria-disabled={pending}
            aria-label={props.submitLabel}
          >
            {pending ? 'One moment…' : props.submit}
          </button>
          {props.beside}
        </div>
      </form>
    </FormProvider>
  );
}
