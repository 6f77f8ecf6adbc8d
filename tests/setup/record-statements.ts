import type Database from 'better-sqlite3';
import type { Db } from '@/db/client';

export type Recorded = { sql: string; how: 'run' | 'get' | 'all'; raw: boolean; params: unknown[] };

// Where each watched connection notes what it executes; null between recordings. By connection rather than by
// recording, because the product prepares some statements once and executes them ever after.
const sinks = new WeakMap<Database.Database, { executed: Recorded[] | null }>();

/** Notes every statement that a connection executes, until `stop`. Begin and commit are not among them. */
export function recordStatements(db: Db): { executed: Recorded[]; stop: () => void } {
  const sink = sinks.get(db.$client) ?? watch(db.$client);
  const executed: Recorded[] = [];
  sink.executed = executed;
  return {
    executed,
    stop: () => {
      sink.executed = null;
    },
  };
}

function watch(client: Database.Database): { executed: Recorded[] | null } {
  const sink: { executed: Recorded[] | null } = { executed: null };
  sinks.set(client, sink);
  const prepare = client.prepare;
  const watched = (sql: string): Database.Statement => {
    const statement = prepare.call(client, sql) as Database.Statement;
    let raw = false;
    const toggle = statement.raw;
    statement.raw = ((on?: boolean) => {
      raw = on ?? true;
      return toggle.call(statement, on ?? true);
    }) as typeof statement.raw;
    for (const how of ['run', 'get', 'all'] as const) {
      const own = statement[how] as (...params: unknown[]) => unknown;
      Object.assign(statement, {
        [how]: (...params: unknown[]) => {
          sink.executed?.push({ sql, how, raw, params });
          return own.apply(statement, params);
        },
      });
    }
    return statement;
  };
  client.prepare = watched as typeof client.prepare;
  return sink;
}
