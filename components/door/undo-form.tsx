'use client';

import { useState } from 'react';
import { CONTROL } from '../forms/field-frame';
import { Button } from '../ui/button';

type UndoFormProps = { onUndo: (reason: string) => Promise<string | null>; onCancel: () => void };

/** Asks why an arrival is taken back; the reason stays on record beside who and when. */
export function UndoForm({ onUndo, onCancel }: UndoFormProps) {
  const [error, setError] = useState<string | null>(null);
  const [pending, setPending] = useState(false);

  const send = async (form: FormData): Promise<void> => {
    const reason = String(form.get('reason') ?? '').trim();
    if (reason.length < 3) return setError('Say in a word or two why it is taken back.');
    setPending(true);
    setError(await onUndo(reason));
    setPending(false);
  };

  return (
    <form
      className="grid gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        void send(new FormData(event.currentTarget));
      }}
    >
      <label htmlFor="undo-reason" className="font-semibold">
        Why is it taken back?
      </label>
      {error && (
        <p id="undo-error" role="alert" className="font-semibold text-reed">
          {error}
        </p>
      )}
      <input
        id="undo-reason"
        name="reason"
        maxLength={200}
        autoComplete="off"
        aria-describedby={error ? 'undo-error' : undefined}
        aria-invalid={error ? true : undefined}
        className={CONTROL}
        placeholder="Wrong person"
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="danger" aria-disabled={pending}>
          Take the arrival back
        </Button>
        <Button onClick={onCancel}>Keep it</Button>
      </div>
    </form>
  );
}
