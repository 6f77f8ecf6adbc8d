type Part = { id: string; title: string };

/** The parts of a long page by name, so that nobody scrolls five screens for the refund terms. */
export function PageParts({ parts }: { parts: readonly (Part | false)[] }) {
  return (
    <nav aria-label="On this page" className="no-print mt-8 flex flex-wrap gap-x-6 border-y border-edge py-1">
      {parts.map(
        (part) =>
          part && (
            <a key={part.id} href={`#${part.id}`} className="inline-flex min-h-target items-center">
              {part.title}
            </a>
          ),
      )}
    </nav>
  );
}
