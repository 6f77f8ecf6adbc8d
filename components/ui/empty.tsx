import type { ReactNode } from 'react';

/** A place with nothing in it yet, and the next thing to do. */
export function Empty({ title, children }: { title: string; children?: ReactNode }) {
  return (
    <div className="border-2 border-dashed border-line px-6 py-10">
      <p className="font-head text-h3 font-bold">{title}</p>
      {children && <div className="mt-2 max-w-prose text-soft">{children}</div>}
    </div>
  );
}
