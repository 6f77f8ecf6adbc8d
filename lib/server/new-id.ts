import 'server-only';
import { randomBytes } from 'node:crypto';
import type { Id, IdPrefix } from '@/lib/domain/shared/ids';

const ALPHABET = '0123456789abcdefghjkmnpqrstvwxyz';
const ENCODED_TIME = 9;

/** Unguessable and roughly in order of making (9 characters of time, 16 random = 80 bits), so that indexes stay compact. */
export function newId<P extends IdPrefix>(prefix: P, now: number = Date.now()): Id<P> {
  let time = '';
  for (let rest = now; time.length < ENCODED_TIME; rest = Math.floor(rest / 32))
    time = ALPHABET[rest % 32] + time;
  let random = '';
  for (const byte of randomBytes(16)) random += ALPHABET[byte % 32];
  return `${prefix}_${time}${random}`;
}
