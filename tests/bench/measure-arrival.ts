import { randomUUID } from 'node:crypto';
import { count, eq } from 'drizzle-orm';
import { openDatabase } from '@/db/client';
import { scan } from '@/db/schema/door';
import { interleave, ROUNDS } from './interleave';
import { pressPost } from './press';
import type { Row } from './report';
import { LARGE_CAMP, type Stage } from './stage';

const EACH = 400;

/**
 * An arrival as the door posts it (origin, budget, session, role, signature, one durable transaction with its record)
 * against a handler of a bare Next that parses the same JSON and answers. Each arrival is another person's first.
 */
export async function measureArrival({ app, bare, file, cookie, codes }: Stage): Promise<Row[]> {
  let next = 0;
  const body = (code: string | undefined) => ({
    kind: 'ticket',
    id: randomUUID(),
    deviceAt: Date.now(),
    code,
  });
  const headers = { cookie, origin: app };
  const speed = await interleave({
    arrival: () =>
      pressPost(`${app}/api/door/${LARGE_CAMP}/scans`, EACH, headers, () =>
        body(codes[next++ % codes.length]),
      ),
    bare: () => pressPost(`${bare}/echo`, EACH, headers, () => body(codes[0])),
  });
  const db = openDatabase(file);
  const arrived = db.select({ n: count() }).from(scan).where(eq(scan.verdict, 'arrived')).get()?.n ?? 0;
  db.$client.close();
  // A refusal is quicker than an arrival: then the figure would be of something else.
  if (arrived < EACH * (ROUNDS + 1)) throw new Error(`Only ${arrived} arrivals were written`);
  return [
    {
      what: 'arrival POST ÷ bare POST handler',
      value: speed.ratio('arrival', 'bare'),
      unit: 'ratio',
      better: 'up',
      floor: 0.3,
      reach: 0.5,
      figures: `${Math.round(speed.arrival)}/s ÷ ${Math.round(speed.bare)}/s; ${arrived} people arrived, each on disk before its answer`,
    },
  ];
}
