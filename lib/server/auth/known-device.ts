import 'server-only';
import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto';
import { cookies } from 'next/headers';
import { env } from '../env';
import { cookieFlags, cookieName } from './session-cookie';

/**
 * A browser that once signed in to an account keeps a budget of tries of its own, so that somebody who guesses at that
 * account from elsewhere cannot lock its owner out (ASVS 6.3.1; OWASP, "Slow down online guessing attacks with device
 * cookies"). The cookie is `nonce.proof.proof…`, one proof an address; it signs nobody in.
 */
const MOST = 4;
const YEAR_SECONDS = 365 * 24 * 60 * 60;

export const deviceCookieName = (): string => cookieName('combwood_device');

const proofOf = (nonce: string, email: string): Buffer =>
  createHmac('sha256', env().AUTH_SECRET).update(`device:${nonce}:${email}`).digest().subarray(0, 16);

function isProof(nonce: string, email: string, given: string): boolean {
  const right = proofOf(nonce, email);
  const held = Buffer.from(given, 'base64url');
  return held.length === right.length && timingSafeEqual(held, right);
}

/** The nonce of a browser that signed in to this address before, else null. */
export function knownDevice(cookie: string | undefined, email: string): string | null {
  const [nonce, ...proofs] = (cookie ?? '').split('.').slice(0, MOST + 1);
  return nonce && proofs.some((proof) => isProof(nonce, email, proof)) ? nonce : null;
}

/** The cookie's text with this address among the browser's own, newest first. */
export function withKnownDevice(cookie: string | undefined, email: string): string {
  const [held, ...proofs] = (cookie ?? '')
    .split('.')
    .filter(Boolean)
    .slice(0, MOST + 1);
  const nonce = held ?? randomBytes(16).toString('base64url');
  const proof = proofOf(nonce, email).toString('base64url');
  return [nonce, proof, ...proofs.filter((other) => other !== proof)].slice(0, MOST + 1).join('.');
}

export async function rememberDevice(email: string): Promise<void> {
  const jar = await cookies();
  const name = deviceCookieName();
  const text = withKnownDevice(jar.get(name)?.value, email);
  jar.set(name, text, { ...cookieFlags(), maxAge: YEAR_SECONDS });
}
