import 'server-only';
import type { Actor } from '@/lib/domain/access/actor';
import type { Permission } from '@/lib/domain/access/permissions';
import { refusalFor } from './access/authorise';
import type { TargetKind } from './access/find-target';
import { getActor } from './auth/get-actor';
import { ERRORS, type Refusal } from './errors';
import { log } from './log';
import { fromOwnOrigin } from './origin';
import { clientAddress, requestId } from './peer-address';
import { type Budget, spend } from './rate-limit';

/** What a use-case knows of the request. */
export type Context = { actor: Actor; now: number; requestId: string; address: string };

type Rungs = {
  permission: Permission;
  on?: { kind: TargetKind; id: string };
  rate: Budget;
  /** False for GET, and for the provider's webhook, whose signature is its proof. */
  sameOrigin: boolean;
};

/**
 * The rungs that actions and routes climb before anything is parsed: origin → rate limit → sign-in and permission.
 * The rate is spent by account where there is one, by address otherwise.
 */
export async function climb(headers: Headers, rungs: Rungs): Promise<Context | Refusal> {
  const id = requestId(headers);
  if (rungs.sameOrigin && !fromOwnOrigin(headers)) {
    log.warn({ requestId: id, permission: rungs.permission }, 'refused: wrong origin');
    return { code: 'wrong_origin' };
  }
  const actor = await getActor();
  const address = clientAddress(headers);
  if (!(await spend(rungs.rate, actor.user?.id ?? address))) return { code: 'too_many' };
  if (rungs.permission !== 'payment.notify') {
    const refusal = refusalFor(actor, rungs.permission, rungs.on);
    if (refusal) {
      log.info({ requestId: id, permission: rungs.permission, code: refusal.code }, 'refused');
      return refusal;
    }
  }
  return { actor, now: Date.now(), requestId: id, address };
}

export const isRefusal = (value: Context | Refusal): value is Refusal => 'code' in value;

/** What a person reads; a bug's own message stays in the log, found again by the reference. */
export const sentenceOf = (refusal: Refusal): string => refusal.sentence ?? ERRORS[refusal.code].sentence;

/** Logs a bug under the request's id and turns it into a refusal that names the reference. */
export function brokenBy(error: unknown, id: string): Refusal {
  log.error(
    {
      requestId: id,
      err:
        error instanceof Error
          ? { name: error.name, message: error.message, stack: error.stack }
          : String(error),
    },
    'broken',
  );
  return { code: 'broken', sentence: `${ERRORS.broken.sentence.replace(/\.$/, '')} ${id.slice(0, 8)}.` };
}
