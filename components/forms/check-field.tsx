'use client';

import { getInputProps, useField } from '@conform-to/react';
import type { ReactNode } from 'react';

type CheckFieldProps = { name: string; label: ReactNode; hint?: ReactNode };

/** One yes-or-no. */
export function CheckField({ name, label, hint }: CheckFieldProps) {
  const [field] = useField<boolean>(name);
  return (
    <div className={field.errors ? 'border-l-4 border-reed pl-4' : ''}>
      {field.errors && (
        <p id={field.errorId} className="font-semibold text-reed">
          {field.errors.join(' ')}
        </p>
      )}
      <label className="flex min-h-target items-start gap-3 py-2">
        <input
          {...getInputProps(field, {
            type: 'checkbox',
            ariaDescribedBy: hint ? field.descriptionId : undefined,
          })}
          key={field.key}
          className="mt-1 size-5 shrink-0 accent-pine"
        />
        <span>{label}</span>
      </label>
      {hint && (
        <p id={field.descriptionId} className="text-small text-soft">
          {hint}
        </p>
      )}
    </div>
  );
}
