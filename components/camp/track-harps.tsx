import type { PackingLine, PackingList } from '@/lib/domain/packing/packing-list';
import { HarpName } from '../harp/harp-name';
import { HarpRow } from '../harp/harp-row';

/** The harps of a track in pitch order, and for each of them where it is played and why it is that one. */
export function TrackHarps({ track, list }: { track: { name: string }; list: PackingList }) {
  const required = list.lines.filter(({ level }) => level === 'required');
  const helpful = list.lines.filter(({ level }) => level === 'helpful');
  if (list.lines.length === 0)
    return <p className="mt-4 text-soft">No harp in particular: bring what you have.</p>;
  return (
    <div className="mt-4 space-y-3">
      {required.length > 0 && <Row title="Bring" of={track.name} lines={required} />}
      {helpful.length > 0 && <Row title="Helpful, not required" of={track.name} lines={helpful} />}
      <details className="print:hidden">
        <summary className="inline-flex min-h-target items-center text-lake underline underline-offset-4">
          Why these harps
        </summary>
        <dl className="mt-1 max-w-prose space-y-3 border-l-2 border-line pl-4">
          {list.lines.map((line) => (
            <div key={line.id}>
              <dt className="font-semibold">
                <HarpName>{line.label}</HarpName>
              </dt>
              {uses(line).map((use) => (
                <dd key={use}>
                  <HarpName>{use}</HarpName>
                </dd>
              ))}
              {line.why && (
                <dd className="text-soft">
                  <HarpName>{line.why}</HarpName>
                </dd>
              )}
            </div>
          ))}
        </dl>
      </details>
    </div>
  );
}

function Row({ title, of, lines }: { title: string; of: string; lines: readonly PackingLine[] }) {
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1.5">
      <p className="text-small text-soft">{title}</p>
      <HarpRow harps={lines.map(({ harp }) => harp)} label={`${title}, ${of}`} />
    </div>
  );
}

/** Each workshop once, however often it meets. */
const uses = (line: PackingLine): string[] => [
  ...new Set(
    line.uses.map(({ workshop, sentence, others }) => `${workshop}: ${sentence}${orOthers(others)}`),
  ),
];

const orOthers = (others: readonly string[]): string =>
  others.length > 0 ? ` (${others.join(' or ')} will do too)` : '';
