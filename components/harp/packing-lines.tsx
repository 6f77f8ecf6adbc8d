import { Fragment } from 'react';
import { coverHint } from '@/lib/domain/harp/cover-hint';
import type { NeedLevel } from '@/lib/domain/harp/harp-ask';
import type { PackingLine, PackingUse } from '@/lib/domain/packing/packing-list';
import { sayShortDay } from '@/lib/domain/shared/say-date';
import { HarpChip } from './harp-chip';
import { HarpName } from './harp-name';

type PackingLinesProps = { title: string; note?: string; lines: readonly PackingLine[] };

/** One part of the list: a box to tick on paper, the harp, what it is for. Nothing when there is none. */
export function PackingLines({ title, note, lines }: PackingLinesProps) {
  if (lines.length === 0) return null;
  return (
    <section className="mb-8 print:mb-3">
      <h2 className="flex flex-wrap items-baseline gap-x-3 border-b-2 border-ink pb-1 print:text-[14px]">
        {title}
        <span className="font-body text-base font-normal text-soft">
          {lines.length === 1 ? '1 harp' : `${lines.length} harps`}
        </span>
      </h2>
      {note && <p className="mt-2 text-soft print:mt-0.5">{note}</p>}
      <ul className="print:columns-2 print:gap-6">
        {lines.map((line) => (
          <Line key={line.id} line={line} />
        ))}
      </ul>
    </section>
  );
}

function Line({ line }: { line: PackingLine }) {
  const hint = coverHint(line.harp);
  const first = line.uses[0];
  return (
    <li className="gap-x-6 border-b border-line py-3 last:border-b-0 sm:grid sm:grid-cols-[13rem_1fr] print:block print:break-inside-avoid print:py-1">
      <div className="print:flex print:items-center print:gap-2">
        <span className="hidden size-3.5 border-2 border-ink print:block" aria-hidden="true" />
        <HarpChip harp={line.harp} />
        {first && line.uses.length > 1 && (
          <p className="mt-1 text-small text-soft print:mt-0 print:text-[10px]">
            first on {sayShortDay(first.day)}, {first.starts}
          </p>
        )}
      </div>
      <div className="min-w-0 max-sm:mt-1 print:pl-5">
        <ul>
          {byReason(line.uses).map((uses) => (
            <li key={`${uses[0]?.meetingId} ${uses[0]?.sentence} ${uses[0]?.note}`} className="max-w-prose">
              <Reason uses={uses} lineLevel={line.level} />
            </li>
          ))}
        </ul>
        {line.why && (
          <p className="mt-1 max-w-prose text-small print:mt-0 print:text-[10px]">
            <HarpName>{line.why}</HarpName>
          </p>
        )}
        {hint && (
          <p className="mt-1 max-w-prose text-small text-soft print:mt-0 print:text-[10px]">
            <HarpName>{hint}</HarpName>
          </p>
        )}
      </div>
    </li>
  );
}

/** A workshop that meets more than once for the same reason is told once, with its times. */
function byReason(uses: readonly PackingUse[]): PackingUse[][] {
  const found = new Map<string, PackingUse[]>();
  for (const use of uses) {
    const key = JSON.stringify([use.workshop, use.sentence, use.note, use.level]);
    found.set(key, [...(found.get(key) ?? []), use]);
  }
  return [...found.values()];
}

function Reason({ uses, lineLevel }: { uses: readonly PackingUse[]; lineLevel: NeedLevel }) {
  const [use] = uses;
  if (!use) return null;
  return (
    <>
      {use.workshop}
      {use.sentence.includes('→') && (
        <>
          {': '}
          <HarpName>{use.sentence}</HarpName>
        </>
      )}
      {use.level !== lineLevel && <span className="text-soft"> ({use.level})</span>}
      {use.note && <span className="text-soft"> · {use.note}</span>}
      <span className="block text-small text-soft print:inline print:text-[10px] print:before:content-['_·_']">
        {uses.map(({ meetingId, day, starts }, index) => (
          <Fragment key={meetingId}>
            {index > 0 && ', '}
            <time dateTime={`${day}T${starts}`} className="whitespace-nowrap font-body tracking-normal">
              {sayShortDay(day)} {starts}
            </time>
          </Fragment>
        ))}
      </span>
    </>
  );
}
