import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** Which process may do the work in the background; a holder past its time is taken for dead. */
export const lease = sqliteTable('lease', {
  name: text('name').primaryKey(),
  /** A random id of the process. */
  holder: text('holder').notNull(),
  until: integer('until').notNull(),
});
