import 'server-only';
import { drainOutbox } from '../mail/drain-outbox';
import { sweepPictures } from '../pictures/sweep-pictures';
import { purgeDrafts } from '../registration/purge-drafts';
import { purgeNeeds } from '../registration/purge-needs';
import { reconcilePayments } from '../registration/reconcile-payments';
import { sendRefunds } from '../registration/send-refunds';
import { sweepHolds } from '../registration/sweep-holds';
import type { Job } from './job';

/** Everything that the server does by itself. Add a line here; the loop does the rest. */
export const listJobs = (): Job[] => [
  { name: 'sweep-holds', everyMs: 2_000, run: sweepHolds },
  { name: 'send-refunds', everyMs: 5_000, run: sendRefunds },
  { name: 'drain-outbox', everyMs: 1_000, run: (now) => drainOutbox(now) },
  { name: 'reconcile-payments', everyMs: 30_000, run: reconcilePayments },
  { name: 'purge-drafts', everyMs: 60 * 60_000, run: purgeDrafts },
  { name: 'purge-needs', everyMs: 60 * 60_000, run: purgeNeeds },
  { name: 'sweep-pictures', everyMs: 60 * 60_000, run: sweepPictures },
];
