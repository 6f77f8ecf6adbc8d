import 'server-only';
import { cookies } from 'next/headers';
import { type Budget, giveBack, spend } from '../rate-limit';
import { deviceCookieName, knownDevice } from './known-device';

type Spent = { ok: boolean; giveBack: () => Promise<void> };

/**
 * Spends the budgets of one try at a password, before the expensive hash. By address always; by account with the
 * device where the browser is known, else with the address, and with all unknown browsers together.
 */
export async function spendSignIn(email: string, address: string): Promise<Spent> {
  const device = knownDevice((await cookies()).get(deviceCookieName())?.value, email);
  const keys: [Budget, string][] = device
    ? [['sign-in-account', `${email} ${device}`]]
    : [
        ['sign-in-address', address],
        ['sign-in-account', `${email} ${address}`],
        ['sign-in-strangers', email],
      ];
  let ok = true;
  const spent: [Budget, string][] = [];
  for (const [budget, key] of keys) {
    ok = await spend(budget, key);
    // A try that one budget refuses takes nothing of the next: the refused cannot use up the account's.
    if (!ok) break;
    spent.push([budget, key]);
  }
  return {
    ok,
    giveBack: async () => {
      for (const [budget, key] of spent) await giveBack(budget, key);
    },
  };
}
