import type { Ref } from 'react';

type ErrorSummaryProps = {
  ref?: Ref<HTMLDivElement>;
  /** By field name; the empty name is the form itself. */
  errors: Record<string, unknown>;
  formId: string;
  /** Words for a field; `needs[]` speaks for all of a list: "Harp 2". */
  labels?: Record<string, string>;
};

function labelOf(name: string, labels: Record<string, string> = {}): string {
  const [, list, index] = /^(\w+)\[(\d+)\]/.exec(name) ?? [];
  const words = list && labels[`${list}[]`];
  if (words) return `${words} ${Number(index) + 1}: `;
  return labels[name] ? `${labels[name]}: ` : '';
}

/** Everything that stands in the way, each a link to its field. */
export function ErrorSummary({ ref, errors, formId, labels }: ErrorSummaryProps) {
  const entries = Object.entries(errors).filter(([, said]) => Array.isArray(said) && said.length > 0);
  return (
    <div ref={ref} tabIndex={-1} role="alert" className="empty:hidden">
      {entries.length > 0 && (
        <div className="border-l-8 border-reed bg-panel px-5 py-4">
          <p className="font-bold text-reed">This did not go through</p>
          <ul className="mt-1 grid gap-1">
            {entries.map(([name, said]) => (
              <li key={name}>
                {name === '' ? (
                  (said as string[]).join(' ')
                ) : (
                  <a href={`#${formId}-${name}`}>
                    {labelOf(name, labels)}
                    {(said as string[]).join(' ')}
                  </a>
                )}
              </li>
            ))}
          </ul>
        </div>
      )}
    </div>
  );
}
