'use client';

import { getInputProps, getTextareaProps, useField } from '@conform-to/react';
import type { InputHTMLAttributes, ReactNode } from 'react';
import { CONTROL, FieldFrame } from './field-frame';

type TextFieldProps = {
  name: string;
  label: string;
  hint?: ReactNode;
  optional?: boolean;
  type?: 'text' | 'email' | 'tel' | 'password' | 'date' | 'time' | 'number' | 'search' | 'url';
  /** More than one line. */
  rows?: number;
  className?: string;
} & Pick<
  InputHTMLAttributes<HTMLInputElement>,
  'autoComplete' | 'inputMode' | 'min' | 'max' | 'step' | 'list' | 'autoCapitalize' | 'spellCheck'
>;

export function TextField({
  name,
  label,
  hint,
  optional,
  type = 'text',
  rows,
  className,
  ...rest
}: TextFieldProps) {
  const [field] = useField<string>(name);
  const aria = { ariaDescribedBy: hint ? field.descriptionId : undefined };
  return (
    <FieldFrame id={field.id} label={label} hint={hint} errors={field.errors} optional={optional}>
      {rows ? (
        <textarea
          {...getTextareaProps(field, aria)}
          key={field.key}
          rows={rows}
          className={`${CONTROL} ${className ?? ''}`}
          {...(rest as object)}
        />
      ) : (
        <input
          {...getInputProps(field, { type, ...aria })}
          key={field.key}
          className={`${CONTROL} ${className ?? ''}`}
          {...rest}
        />
      )}
    </FieldFrame>
  );
}
