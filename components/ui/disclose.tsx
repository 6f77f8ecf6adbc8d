import type { ReactNode } from 'react';

/** Something that is seldom wanted, or should be thought about first, behind its own words; needs no script. */
export function Disclose({
  summary,
  children,
  danger = false,
}: {
  summary: string;
  children: ReactNode;
  danger?: boolean;
}) {
  return (
    <details className="mt-10 max-w-prose border-t border-line pt-2">
      <summary
        className={`inline-flex min-h-target items-center font-semibold ${danger ? 'text-reed' : 'text-lake'}`}
      >
        <span className="underline underline-offset-4">{summary}</span>
      </summary>
      <div className="grid gap-4 py-3">{children}</div>
    </details>
  );
}
