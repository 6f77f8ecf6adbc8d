'use client';

import { getCollectionProps, useField } from '@conform-to/react';
import type { ReactNode } from 'react';

export type RichChoice = { value: string; label: ReactNode; hint?: ReactNode; disabled?: boolean };

type ChoiceFieldProps = {
  name: string;
  legend: string;
  /** `radio` takes one, `checkbox` any number. */
  type: 'radio' | 'checkbox';
  choices: readonly RichChoice[];
  hint?: ReactNode;
};

/** A group of radio buttons or checkboxes with room for a line about each. */
export function ChoiceField({ name, legend, type, choices, hint }: ChoiceFieldProps) {
  const [field] = useField<string | string[]>(name);
  const options = choices.map((choice) => choice.value);
  const inputs = getCollectionProps(field, { type, options });
  return (
    <fieldset
      id={field.id}
      tabIndex={-1}
      aria-describedby={
        [hint ? field.descriptionId : '', field.errors ? field.errorId : ''].filter(Boolean).join(' ') ||
        undefined
      }
      className={field.errors ? 'border-l-4 border-reed pl-4' : ''}
    >
      <legend className="font-semibold">{legend}</legend>
      {hint && (
        <p id={field.descriptionId} className="text-small text-soft">
          {hint}
        </p>
      )}
      {field.errors && (
        <p id={field.errorId} className="font-semibold text-reed">
          {field.errors.join(' ')}
        </p>
      )}
      <div className="mt-2 grid gap-2">
        {inputs.map((input, at) => {
          const choice = choices[at];
          if (!choice) return null;
          const { key, ...props } = input;
          return (
            <label
              key={`${field.key}-${key}`}
              className="flex min-h-target items-start gap-3 rounded border-2 border-line px-3 py-2 has-checked:border-pine has-disabled:border-dashed has-disabled:text-soft"
            >
              <input {...props} disabled={choice.disabled} className="mt-1 size-5 shrink-0 accent-pine" />
              <span>
                <span className="font-semibold">{choice.label}</span>
                {choice.hint && <span className="block text-small text-soft">{choice.hint}</span>}
              </span>
            </label>
          );
        })}
      </div>
    </fieldset>
  );
}
