import 'server-only';
import { existsSync } from 'node:fs';
import { openDatabase } from '@/db/client';
import { BOOK_RULES, checkBooks } from './check-books';
import { listSetAside } from './list-set-aside';

// Needs only the file, so that it runs beside a server, on a backup, or where nothing else is set up.
const file = process.env.COMBWOOD_DB ?? 'data/combwood.db';
if (!existsSync(file)) {
  console.error(`There is no database at ${file}. Set COMBWOOD_DB to its path.`);
  process.exit(2);
}
const db = openDatabase(file);
for (const { id, type, reason } of listSetAside(db))
  console.log(`Set aside, for a person: ${id} (${type}) ${reason}`);
const violations = checkBooks(db);
const [first] = violations;
if (first) {
  console.error(`The books do not hold: ${first.rule}: ${first.ids} (${first.detail})`);
  if (violations.length > 1) console.error(`${violations.length} violations in all.`);
  process.exit(1);
}
console.log(`The books hold: ${BOOK_RULES.length} rules.`);
