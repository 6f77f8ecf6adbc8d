'use client';

import { type ReactNode, useActionState } from 'react';
import { type ButtonTone, buttonClass } from '../ui/button-class';
import type { FormState } from './action-form';

type ActionButtonProps = {
  action: (previous: FormState, form: FormData) => Promise<FormState>;
  hidden: Record<string, string>;
  children: ReactNode;
  /** Where the words alone do not say which row: "Move Bending up". */
  label?: string;
  tone?: ButtonTone;
  className?: string;
};

/** One press that does one thing, with its refusal beside it; works without JavaScript. */
export function ActionButton({
  action,
  hidden,
  children,
  label,
  tone = 'plain',
  className,
}: ActionButtonProps) {
  const [state, send, pending] = useActionState(action, null);
  const said = state?.status === 'error' ? Object.values(state.error ?? {}).flat() : [];
  return (
    <form action={send}>
      {Object.entries(hidden).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <button
        type="submit"
        aria-label={label}
        aria-disabled={pending}
        className={buttonClass(tone, className)}
      >
        {children}
      </button>
      <div role="alert" className="empty:hidden">
        {said.length > 0 && (
          <p className="mt-2 max-w-prose border-l-4 border-reed pl-3 text-reed">{said.join(' ')}</p>
        )}
      </div>
    </form>
  );
}
