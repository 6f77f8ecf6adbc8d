import { spokenName } from '@/lib/domain/harp/spoken-name';

/** A key or a label, or a sentence with keys in it: Bb to the eye, "B flat" to a screen reader. */
export function HarpName({ children }: { children: string }) {
  const spoken = spokenName(children);
  if (spoken === children) return children;
  return (
    <>
      <span aria-hidden="true">{children}</span>
      <span className="sr-only select-none">{spoken}</span>
    </>
  );
}
