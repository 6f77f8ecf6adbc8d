import type { Action, FormState } from '@/lib/server/action';

export type Outcome = {
  state: FormState;
  to: string | null;
  sentence: string;
  fields: Record<string, string[]>;
};

const REDIRECT = /^NEXT_REDIRECT;[^;]*;([^;]*);/;

/** Sends a form to an action as a browser would, and says what came of it: where it led, or what it said. */
export async function runAction(action: Action, fields: Record<string, string>): Promise<Outcome> {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.set(name, value);
  try {
    const state = await action(null, form);
    const error = (state?.error ?? {}) as Record<string, string[] | null>;
    const named = Object.entries(error).flatMap(([name, said]) => (said && name ? [[name, said]] : []));
    return { state, to: null, sentence: (error[''] ?? []).join(' '), fields: Object.fromEntries(named) };
  } catch (thrown) {
    const digest = String((thrown as { digest?: unknown }).digest);
    const to = REDIRECT.exec(digest)?.[1];
    if (!to) throw thrown;
    return { state: null, to, sentence: '', fields: {} };
  }
}
