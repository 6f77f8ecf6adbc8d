import type { ReactNode } from 'react';

type FieldFrameProps = {
  id: string;
  label: string;
  hint?: ReactNode;
  errors?: string[];
  optional?: boolean;
  children: ReactNode;
};

/** Label, hint, error and control, tied together by ids: `{id}-description` and `{id}-error` (Conform's names). */
export function FieldFrame({ id, label, hint, errors, optional, children }: FieldFrameProps) {
  return (
    <div className={errors ? 'border-l-4 border-reed pl-4' : ''}>
      <label htmlFor={id} className="block font-semibold">
        {label}
        {optional && <span className="font-normal text-soft"> (optional)</span>}
      </label>
      {hint && (
        <p id={`${id}-description`} className="text-small text-soft">
          {hint}
        </p>
      )}
      {errors && (
        <p id={`${id}-error`} className="font-semibold text-reed">
          {errors.join(' ')}
        </p>
      )}
      <div className="mt-1">{children}</div>
    </div>
  );
}

export const CONTROL =
  'min-h-target w-full rounded border-2 border-edge bg-panel px-3 py-2 text-ink aria-invalid:border-reed';
