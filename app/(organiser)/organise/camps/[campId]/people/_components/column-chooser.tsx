type ColumnChooserProps = {
  columns: readonly { id: string; word: string; shown: boolean; toggle: () => void }[];
};

/** Which columns a wide screen shows. On a phone the few that fit are fixed, so it is not there. */
export function ColumnChooser({ columns }: ColumnChooserProps) {
  return (
    <details className="no-print mb-2 hidden md:block">
      <summary className="inline-flex min-h-target items-center font-semibold text-lake underline underline-offset-4">
        Columns
      </summary>
      <fieldset className="flex flex-wrap gap-x-6 pb-2">
        <legend className="sr-only">Columns shown</legend>
        {columns.map(({ id, word, shown, toggle }) => (
          <label key={id} className="inline-flex min-h-target items-center gap-2">
            <input type="checkbox" checked={shown} onChange={toggle} className="size-5 accent-pine" />
            {word}
          </label>
        ))}
      </fieldset>
    </details>
  );
}
