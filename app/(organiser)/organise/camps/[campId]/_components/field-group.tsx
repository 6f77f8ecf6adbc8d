import type { ReactNode } from 'react';

/** Fields that belong together, under a heading of their own. */
export function FieldGroup({ title, children }: { title: string; children: ReactNode }) {
  return (
    <fieldset className="grid gap-6 border-t-2 border-ink pt-4 first-of-type:border-t-0 first-of-type:pt-0">
      <legend className="float-left mb-2 w-full font-head text-h3 font-bold">{title}</legend>
      <div className="clear-both grid gap-6">{children}</div>
    </fieldset>
  );
}
