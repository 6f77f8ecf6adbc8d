'use client';

import { type FieldName, useField, useFormMetadata } from '@conform-to/react';
import type { NeedLevel } from '@/lib/domain/harp/harp-ask';
import { SelectField } from '../forms/select-field';
import { TextField } from '../forms/text-field';
import { buttonClass } from '../ui/button-class';
import { AskFields } from './ask-fields';
import { NEW_ASK, type TypedAsk } from './typed-ask';

export type TypedNeed = { level: NeedLevel; note?: string; anyOf: TypedAsk[] };

const LEVELS = [
  { value: 'required', label: 'Required' },
  { value: 'helpful', label: 'Helpful' },
];
const NEW_NEED: TypedNeed = { level: 'required', anyOf: [NEW_ASK] };

/** The harps a workshop asks for. Adding and taking away are buttons of the form itself and need no script. */
export function NeedsEditor({ name }: { name: string }) {
  const form = useFormMetadata();
  const [field] = useField<TypedNeed[]>(name as FieldName<TypedNeed[]>);
  const needs = field.getFieldList();
  return (
    <div id={field.id} tabIndex={-1} className="grid gap-6">
      {field.errors && <p className="font-semibold text-reed">{field.errors.join(' ')}</p>}
      {needs.length === 0 && <p className="text-soft">Nobody needs to bring a harp for this.</p>}
      {needs.map((need, at) => (
        <NeedCard
          key={need.key}
          name={need.name}
          number={at + 1}
          remove={form.remove.getButtonProps({ name: field.name, index: at })}
        />
      ))}
      <div>
        <button
          {...form.insert.getButtonProps({ name: field.name, defaultValue: NEW_NEED })}
          className={buttonClass('plain')}
        >
          {needs.length === 0 ? 'Add a harp to bring' : 'Add another harp'}
        </button>
      </div>
    </div>
  );
}

type ButtonProps = ReturnType<ReturnType<typeof useFormMetadata>['remove']['getButtonProps']>;

function NeedCard({ name, number, remove }: { name: string; number: number; remove: ButtonProps }) {
  const form = useFormMetadata();
  const [alternatives] = useField<TypedAsk[]>(`${name}.anyOf` as FieldName<TypedAsk[]>);
  const asks = alternatives.getFieldList();
  return (
    <fieldset className="grid gap-4 rounded border-2 border-line p-4">
      <legend className="px-2 font-head text-h3 font-bold">Harp {number}</legend>
      {asks.length === 0 && <p>Any key will do.</p>}
      {asks.map((ask, at) => (
        <div key={ask.key} className="grid gap-1">
          {at > 0 && <p className="font-head font-bold">or</p>}
          <AskFields name={ask.name} legend={`Harp ${number}, alternative ${at + 1}`} />
          {/* One alternative alone goes away with its harp. */}
          {asks.length > 1 && (
            <div>
              <button
                {...form.remove.getButtonProps({ name: alternatives.name, index: at })}
                className={buttonClass('quiet')}
              >
                Take out this alternative
                <span className="sr-only">
                  {' '}
                  {at + 1} of harp {number}
                </span>
              </button>
            </div>
          )}
        </div>
      ))}
      {alternatives.errors && <p className="font-semibold text-reed">{alternatives.errors.join(' ')}</p>}
      <div>
        <button
          {...form.insert.getButtonProps({ name: alternatives.name, defaultValue: NEW_ASK })}
          className={buttonClass('quiet')}
        >
          {asks.length === 0 ? 'Name a key' : 'Or another harp'}
          <span className="sr-only"> for harp {number}</span>
        </button>
      </div>
      <div className="grid gap-4 border-t border-line pt-4 sm:grid-cols-[10rem_1fr]">
        <SelectField name={`${name}.level`} label="How much" choices={LEVELS} />
        <TextField name={`${name}.note`} label="Note" optional hint="Like: for the slow blues." />
      </div>
      <div>
        <button {...remove} className={buttonClass('quiet')}>
          Take out harp {number}
        </button>
      </div>
    </fieldset>
  );
}
