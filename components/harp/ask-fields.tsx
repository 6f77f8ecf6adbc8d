'use client';

import { type FieldName, useField } from '@conform-to/react';
import { askSentence } from '@/lib/domain/harp/ask-sentence';
import { PITCH_CLASSES } from '@/lib/domain/harp/pitch-class';
import { POSITIONS, positionName } from '@/lib/domain/harp/position';
import { REGISTERS } from '@/lib/domain/harp/register';
import { songKeyName } from '@/lib/domain/harp/song-key';
import { TUNING_FACTS, TUNINGS } from '@/lib/domain/harp/tuning';
import { SelectField } from '../forms/select-field';
import { HarpName } from './harp-name';
import { readTypedAsk, type TypedAsk } from './typed-ask';

const KEYS = PITCH_CLASSES.map((key) => ({ value: key, label: key }));
const SONG_KEYS = [false, true].flatMap((minor) =>
  PITCH_CLASSES.map((tonic) => {
    const name = songKeyName({ tonic, minor });
    return { value: name, label: minor ? `${name.slice(0, -1)} minor` : `${name} major` };
  }),
);
const PLACES = POSITIONS.map((position) => ({
  value: String(position),
  label: `${positionName(position)} position`,
}));
const TUNING_CHOICES = TUNINGS.map((tuning) => ({ value: tuning, label: TUNING_FACTS[tuning].name }));
const REGISTER_WORDS = { low: 'Low', standard: 'Usual', high: 'High' } as const;
const REGISTER_CHOICES = REGISTERS.map((register) => ({ value: register, label: REGISTER_WORDS[register] }));

/**
 * One harp, named by the key on its cover or by a song and a position. Which fields show follows the choice by CSS
 * alone, so that it works without a script; those that do not show are sent and ignored.
 */
export function AskFields({ name, legend }: { name: string; legend: string }) {
  const [field] = useField<TypedAsk>(name as FieldName<TypedAsk>);
  const ask = readTypedAsk(field.value as TypedAsk | undefined);
  const at = (part: keyof TypedAsk) => `${name}.${part}`;
  return (
    <fieldset className="group/ask grid gap-3">
      <legend className="sr-only">{legend}</legend>
      <ByChoice name={at('by')} />
      <div className="grid gap-3 sm:grid-cols-2 xl:grid-cols-4">
        <div className="group-has-[input[value=song]:checked]/ask:hidden">
          <SelectField name={at('labelKey')} label="Key on the cover" blank="Choose" choices={KEYS} />
        </div>
        <div className="group-has-[input[value=harp]:checked]/ask:hidden">
          <SelectField name={at('songKey')} label="Song in" blank="Choose" choices={SONG_KEYS} />
        </div>
        <div className="group-has-[input[value=harp]:checked]/ask:hidden">
          <SelectField name={at('position')} label="Played in" blank="Choose" choices={PLACES} />
        </div>
        <SelectField name={at('tuning')} label="Tuning" choices={TUNING_CHOICES} />
        <SelectField name={at('register')} label="Register" choices={REGISTER_CHOICES} />
      </div>
      <output className="block min-h-6 font-semibold text-pine">
        {ask && <HarpName>{askSentence(ask)}</HarpName>}
      </output>
    </fieldset>
  );
}

function ByChoice({ name }: { name: string }) {
  const [field] = useField<string>(name as FieldName<string>);
  const radio = (value: 'harp' | 'song', words: string) => (
    <label className="flex min-h-target items-center gap-2">
      <input
        type="radio"
        name={field.name}
        value={value}
        defaultChecked={(field.initialValue ?? 'harp') === value}
        form={field.formId}
        className="size-5 accent-pine"
      />
      {words}
    </label>
  );
  return (
    <div key={field.key} className="flex flex-wrap gap-x-6">
      {radio('harp', 'By its own key')}
      {radio('song', 'By a song and a position')}
      {field.errors && <p className="w-full font-semibold text-reed">{field.errors.join(' ')}</p>}
    </div>
  );
}
