/** A measurement with what it is held to. `better` says which way is good: a ratio of speeds up, of times or sizes down. */
export type Row = {
  what: string;
  value: number;
  unit: 'ratio' | 'ms' | 'count';
  better: 'up' | 'down';
  /** Null: told for reading, held to nothing. */
  floor: number | null;
  reach: number | null;
  figures: string;
};

export type Verdict = 'reached' | 'above the floor' | 'below the floor' | 'told only';

export function verdictOf({ value, better, floor, reach }: Row): Verdict {
  if (floor === null || reach === null) return 'told only';
  const meets = (mark: number) => (better === 'up' ? value >= mark : value <= mark);
  if (meets(reach)) return 'reached';
  return meets(floor) ? 'above the floor' : 'below the floor';
}

const say = (value: number | null, unit: Row['unit']): string => {
  if (value === null) return '';
  if (unit === 'count') return String(value);
  return unit === 'ms' ? `${value.toFixed(1)} ms` : value.toFixed(2);
};

/** A table for people, then a JSON line a row for machines. */
export function printReport(rows: readonly Row[]): void {
  const head = ['what', 'value', 'floor', 'reach', 'verdict', 'figures'];
  const cells = rows.map((row) => [
    row.what,
    say(row.value, row.unit),
    say(row.floor, row.unit),
    say(row.reach, row.unit),
    verdictOf(row),
    row.figures,
  ]);
  const widths = head.map((name, at) => Math.max(name.length, ...cells.map((line) => line[at]?.length ?? 0)));
  const line = (words: readonly string[]) =>
    words
      .map((word, at) => (at === words.length - 1 ? word : word.padEnd(widths[at] ?? 0)))
      .join('  ')
      .trimEnd();
  console.log(`\n${line(head)}\n${line(widths.map((width) => '-'.repeat(Math.min(width, 60))))}`);
  for (const words of cells) console.log(line(words));
  console.log('');
  for (const row of rows) console.log(JSON.stringify({ ...row, verdict: verdictOf(row) }));
}
