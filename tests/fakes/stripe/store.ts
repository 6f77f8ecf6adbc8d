import { appendFileSync, existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import type { Tables } from './records';

type TableName = keyof Tables;
type Change = [TableName, string, unknown];

const names: TableName[] = [
  'session',
  'intent',
  'charge',
  'refund',
  'balance',
  'event',
  'delivery',
  'answer',
];
const REWRITE_BYTES = 32_000_000;

/**
 * Everything the stand-in knows. Values are never changed in place: put a new one.
 * With a file, each commit appends one line, so a call's changes are kept all or not at all; the file is rewritten
 * whole, by rename, at the start and when it has grown.
 */
export class Store {
  private tables = this.empty();
  private pending: Change[] = [];
  private undo: Change[] = [];
  private bytes = 0;

  constructor(private readonly file?: string) {
    if (!file) return;
    mkdirSync(dirname(file), { recursive: true });
    if (existsSync(file)) this.load(readFileSync(file, 'utf8'));
    this.rewrite();
  }

  get<T extends TableName>(table: T, id: string): Tables[T] | undefined {
    return this.tables[table].get(id);
  }

  /** Oldest first. */
  all<T extends TableName>(table: T): Tables[T][] {
    return [...this.tables[table].values()];
  }

  put<T extends TableName>(table: T, id: string, value: Tables[T]): void {
    this.undo.push([table, id, this.tables[table].get(id)]);
    this.tables[table].set(id, value);
    this.pending.push([table, id, value]);
  }

  commit(): void {
    if (this.pending.length === 0) return;
    const line = `${JSON.stringify(this.pending)}\n`;
    this.pending = [];
    this.undo = [];
    if (!this.file) return;
    appendFileSync(this.file, line);
    this.bytes += line.length;
    if (this.bytes > REWRITE_BYTES) this.rewrite();
  }

  /** Forgets what was put since the last commit: a call that failed leaves nothing behind. */
  rollback(): void {
    for (const [table, id, value] of this.undo.reverse()) {
      if (value === undefined) this.tables[table].delete(id);
      else this.tables[table].set(id, value as never);
    }
    this.pending = [];
    this.undo = [];
  }

  clear(): void {
    this.tables = this.empty();
    this.pending = [];
    this.undo = [];
    this.rewrite();
  }

  private empty(): { [K in TableName]: Map<string, Tables[K]> } {
    return Object.fromEntries(names.map((name) => [name, new Map()])) as never;
  }

  private load(text: string): void {
    for (const line of text.split('\n')) {
      if (line === '') continue;
      let changes: Change[];
      try {
        changes = JSON.parse(line);
      } catch {
        // The process was killed while it wrote its last line: that call was never answered.
        return;
      }
      for (const [table, id, value] of changes) this.tables[table]?.set(id, value as never);
    }
  }

  private rewrite(): void {
    if (!this.file) return;
    const lines = names.flatMap((name) =>
      [...this.tables[name]].map(([id, value]) => `${JSON.stringify([[name, id, value]])}\n`),
    );
    writeFileSync(`${this.file}.new`, lines.join(''));
    renameSync(`${this.file}.new`, this.file);
    this.bytes = 0;
  }
}
