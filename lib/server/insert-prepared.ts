import 'server-only';
import { getTableName, sql } from 'drizzle-orm';
import type { SQLiteTable } from 'drizzle-orm/sqlite-core';
import { type Db, preparedOnce, type Tx } from './db';

type Insert = { run: (values: Record<string, unknown>) => unknown };

const queries = preparedOnce(() => ({ by: new Map<string, Insert>() }));

/**
 * Inserts one row by a statement that is built and prepared once for its table and set of columns. Within a
 * transaction like any other insert: this process has the one connection.
 */
export function insertPrepared<Table extends SQLiteTable>(
  db: Db | Tx,
  table: Table,
  row: Table['$inferInsert'],
): void {
  const columns = Object.keys(row).filter((name) => row[name as keyof typeof row] !== undefined);
  const key = `${getTableName(table)} ${columns.join(' ')}`;
  const { by } = queries();
  let insert = by.get(key);
  if (!insert) {
    const values = Object.fromEntries(columns.map((name) => [name, sql.placeholder(name)]));
    insert = db
      .insert(table)
      .values(values as Table['$inferInsert'])
      .prepare();
    by.set(key, insert);
  }
  insert.run(row as Record<string, unknown>);
}
