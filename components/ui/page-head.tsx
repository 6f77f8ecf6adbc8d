import type { ReactNode } from 'react';

type PageHeadProps = {
  title: ReactNode;
  /** Where this page belongs, above the title: a camp's name. */
  over?: ReactNode;
  lead?: ReactNode;
  /** The screen's actions; at most one of them primary. */
  actions?: ReactNode;
};

export function PageHead({ title, over, lead, actions }: PageHeadProps) {
  return (
    <header className="mb-8 flex flex-wrap items-end justify-between gap-x-8 gap-y-4 border-b-2 border-ink pb-4">
      <div className="min-w-0 max-w-prose">
        {over && <p className="mb-1 text-small text-soft">{over}</p>}
        <h1 className="break-words">{title}</h1>
        {lead && <p className="mt-3 text-lead text-soft">{lead}</p>}
      </div>
      {actions && <div className="no-print flex flex-wrap gap-3">{actions}</div>}
    </header>
  );
}
