import { Temporal } from 'temporal-polyfill';
import { migrateDatabase } from '@/db/migrate';
import { getDb } from '@/lib/server/db';
import { seedDemo } from './seed-demo';

// Fills an empty database with the demo. Dates count from today, the day the demo is first started.
const db = getDb();
migrateDatabase(db);
const now = Temporal.Now.instant().epochMilliseconds;
await seedDemo(db, now);
db.$client.close();
