'use client';

import { getCollectionProps, useField } from '@conform-to/react';
import { HarpChip } from '@/components/harp/harp-chip';
import { parseHarpId } from '@/lib/domain/harp/harp-id';
import { harpLabel } from '@/lib/domain/harp/harp-label';

type HarpChoicesProps = {
  /** Harp ids in pitch order, low first. */
  common: readonly string[];
  /** Others that this person has named. */
  others: readonly string[];
};

/** Ticks for the twelve ordinary keys as a keyboard of chips, and for whatever else was added. */
export function HarpChoices({ common, others }: HarpChoicesProps) {
  const [field] = useField<string[]>('harpIds');
  const inputs = getCollectionProps(field, { type: 'checkbox', options: [...common, ...others] });
  const groups = [
    { legend: 'Ordinary ten-hole harps', ids: common },
    { legend: 'Your other harps', ids: others },
  ];
  return groups.map(({ legend, ids }) =>
    ids.length === 0 ? null : (
      <fieldset key={legend} id={ids === common ? field.id : undefined} tabIndex={-1}>
        <legend className="font-semibold">{legend}</legend>
        {ids === common && (
          <p className="text-small text-soft">
            Richter tuning, standard pitch, low to high. Tick nothing if you have none yet.
          </p>
        )}
        {ids === common && field.errors && (
          <p className="font-semibold text-reed">{field.errors.join(' ')}</p>
        )}
        <div
          className={`mt-2 grid gap-2 ${ids === common ? 'grid-cols-2 sm:grid-cols-3' : 'sm:grid-cols-2'}`}
        >
          {inputs
            .filter((input) => ids.includes(input.value))
            .map(({ key, ...input }) => {
              const harp = parseHarpId(input.value);
              if (!harp) return null;
              return (
                <label
                  key={key}
                  className="flex min-h-target items-center gap-3 rounded border-2 border-line px-3 py-1 has-checked:border-pine"
                >
                  <input
                    {...input}
                    aria-label={`${harpLabel(harp)} harp`}
                    className="size-5 shrink-0 accent-pine"
                  />
                  <HarpChip harp={harp} />
                </label>
              );
            })}
        </div>
      </fieldset>
    ),
  );
}
