import type { ReactNode } from 'react';

type SectionProps = {
  id: string;
  title: string;
  /** A line under the title. */
  note?: ReactNode;
  /** Content under the title instead of beside it, for what needs the whole width. */
  wide?: boolean;
  children: ReactNode;
};

/** A part of a printed programme: a rule, its title hung in the margin, its content beside it. */
export function Section({ id, title, note, wide = false, children }: SectionProps) {
  return (
    <section
      id={id}
      aria-labelledby={`${id}-title`}
      className={`mt-14 border-t-2 border-ink pt-4 ${wide ? '' : 'md:grid md:grid-cols-[13rem_minmax(0,1fr)] md:gap-x-10'}`}
    >
      <div className={wide ? 'mb-5 flex flex-wrap items-baseline gap-x-8' : 'mb-4'}>
        <h2 id={`${id}-title`}>{title}</h2>
        {note && <p className={`text-small text-soft ${wide ? '' : 'mt-2'}`}>{note}</p>}
      </div>
      <div className="min-w-0">{children}</div>
    </section>
  );
}
