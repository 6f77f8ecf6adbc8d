import 'server-only';
import { verify } from '@node-rs/argon2';

/** Of a password nobody has; its cost is the real one's, so an unknown address takes as long as a known one (ASVS 6.3.8). */
const NOBODY =
  '$argon2id$v=19$m=19456,t=2,p=1$2MYS0+dGdrbLPukPbZihHg$RpY/GVr14apF3eXLt2KnT/Xz1VUbuEE+JA1IrI7d+Ho';

/** `stored` is null for an unknown account: the same work is done and the answer is no. */
export async function verifyPassword(stored: string | null, password: string): Promise<boolean> {
  const usable = stored?.startsWith('$argon2id$') ? stored : null;
  const right = await verify(usable ?? NOBODY, password.normalize('NFC'));
  return usable !== null && right;
}
