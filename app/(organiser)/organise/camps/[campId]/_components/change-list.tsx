import { sayInstant } from '@/lib/domain/shared/say-date';
import type { Change } from '@/lib/server/audit/list-changes';

export function ChangeList({ changes, timeZone }: { changes: readonly Change[]; timeZone: string }) {
  if (changes.length === 0) return <p className="text-soft">Nothing was changed yet.</p>;
  return (
    <ol className="border-t border-line">
      {changes.map(({ id, at, sentence, by }) => (
        <li key={id} className="border-b border-line py-2.5">
          <p className="break-words">{sentence}</p>
          <p className="text-small text-soft">
            {by ?? 'Combwood itself'} ·{' '}
            <time dateTime={new Date(at).toISOString()}>{sayInstant(at, timeZone)}</time>
          </p>
        </li>
      ))}
    </ol>
  );
}
