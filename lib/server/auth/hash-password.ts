import 'server-only';
import { hash } from '@node-rs/argon2';

/** OWASP's floor for Argon2id (19 MiB, two passes, one lane); Argon2id is the library's default algorithm. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** Argon2id in its encoded form. NFC first, so that é typed on two keyboards is one password. */
export const hashPassword = (password: string): Promise<string> => hash(password.normalize('NFC'), COST);
