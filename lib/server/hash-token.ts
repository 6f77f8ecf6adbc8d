import 'server-only';
import { createHash, randomBytes } from 'node:crypto';

/** 160 random bits for a link or a cookie. */
export const newToken = (): string => randomBytes(20).toString('base64url');

/** What the database keeps of a token: a copy of the database opens no link. Fast hash, as the input is random. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('base64url');
