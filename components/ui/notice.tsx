import type { ReactNode } from 'react';

type NoticeProps = {
  tone?: 'note' | 'done' | 'stop';
  title?: string;
  children?: ReactNode;
  /** Announced when it appears: `alert` for errors, `status` for the rest. */
  live?: boolean;
};

const EDGES = { note: 'border-lake', done: 'border-moss', stop: 'border-reed' };
const WORDS = { note: 'text-lake', done: 'text-moss', stop: 'text-reed' };

/** A message with a thick left edge: something to know, something done, something in the way. */
export function Notice({ tone = 'note', title, children, live = false }: NoticeProps) {
  return (
    <div
      role={live ? (tone === 'stop' ? 'alert' : 'status') : undefined}
      className={`mb-6 border-l-8 ${EDGES[tone]} bg-panel px-5 py-4`}
    >
      {title && <p className={`font-bold ${WORDS[tone]}`}>{title}</p>}
      {children && <div className="max-w-prose">{children}</div>}
    </div>
  );
}
