'use client';

import { getSelectProps, useField } from '@conform-to/react';
import type { ReactNode } from 'react';
import { CONTROL, FieldFrame } from './field-frame';

export type Choice = { value: string; label: string; disabled?: boolean };

type SelectFieldProps = {
  name: string;
  label: string;
  choices: readonly Choice[];
  hint?: ReactNode;
  optional?: boolean;
  /** Shown first with an empty value. */
  blank?: string;
};

export function SelectField({ name, label, choices, hint, optional, blank }: SelectFieldProps) {
  const [field] = useField<string>(name);
  // A key after a spread makes React take the options for a list without keys.
  const { key: _, ...props } = getSelectProps(field, {
    ariaDescribedBy: hint ? field.descriptionId : undefined,
  });
  return (
    <FieldFrame id={field.id} label={label} hint={hint} errors={field.errors} optional={optional}>
      <select key={field.key} {...props} className={CONTROL}>
        {blank !== undefined && <option value="">{blank}</option>}
        {choices.map((choice) => (
          <option key={choice.value} value={choice.value} disabled={choice.disabled}>
            {choice.label}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
}
