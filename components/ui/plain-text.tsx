/** Text that somebody typed: blank lines part paragraphs, single line breaks stay. Never read as markup. */
export function PlainText({ text, className = '' }: { text: string; className?: string }) {
  const paragraphs = text
    .split(/\r?\n\s*\r?\n/)
    .map((part) => part.trim())
    .filter(Boolean)
    .map((words, at) => ({ words, at }));
  return (
    <div className={`max-w-prose space-y-3 whitespace-pre-line break-words ${className}`}>
      {paragraphs.map(({ words, at }) => (
        <p key={at}>{words}</p>
      ))}
    </div>
  );
}
