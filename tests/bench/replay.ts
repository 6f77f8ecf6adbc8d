import type Database from 'better-sqlite3';
import type { Db } from '@/db/client';
import type { Recorded } from '../setup/record-statements';

/** Executes recorded statements by the driver alone: each text prepared once, each list in an immediate transaction. */
export function replay(db: Db, lists: readonly (readonly Recorded[])[]): unknown[] {
  const prepared = new Map<string, Database.Statement>();
  const statementOf = ({ sql, how, raw }: Recorded): Database.Statement => {
    const key = `${how} ${raw} ${sql}`;
    const known = prepared.get(key);
    if (known) return known;
    const made = db.$client.prepare(sql);
    if (raw && how !== 'run') made.raw();
    prepared.set(key, made);
    return made;
  };
  const once = db.$client.transaction((list: readonly Recorded[]) =>
    list.map((each) => statementOf(each)[each.how](...each.params)),
  );
  return lists.map((list) => once.immediate(list));
}
