'use client';

import { getInputProps, useField } from '@conform-to/react';
import { type ReactNode, useState } from 'react';
import { CONTROL, FieldFrame } from './field-frame';

type FileFieldProps = {
  name: string;
  label: string;
  hint?: ReactNode;
  accept: string;
  /** Bytes; a larger file is told of before it is sent. The server asks again. */
  limit: number;
};

export function FileField({ name, label, hint, accept, limit }: FileFieldProps) {
  const [field] = useField<File>(name);
  const [large, setLarge] = useState<string | null>(null);
  const errors = large ? [large] : field.errors;
  return (
    <FieldFrame id={field.id} label={label} hint={hint} errors={errors}>
      <input
        {...getInputProps(field, { type: 'file', ariaDescribedBy: hint ? field.descriptionId : undefined })}
        key={field.key}
        accept={accept}
        onChange={(event) => {
          const file = event.currentTarget.files?.[0];
          const over = file !== undefined && file.size > limit;
          setLarge(
            over
              ? `“${file.name}” has ${(file.size / 1024 / 1024).toFixed(1)} MB; the limit is ${limit / 1024 / 1024} MB. Choose a smaller one.`
              : null,
          );
          // Too large is never sent: the way there and back would only end in this sentence.
          if (over) event.currentTarget.value = '';
        }}
        className={`${CONTROL} file:mr-4 file:min-h-8 file:rounded file:border-0 file:bg-pine file:px-3 file:font-semibold file:text-on-pine`}
      />
    </FieldFrame>
  );
}
