import 'server-only';

/** A row without what its kind needs is broken; the message names the key, never a value. */
export function requirePayload(payload: Record<string, string>, key: string): string {
  const value = payload[key];
  if (!value) throw new Error(`The payload has no ${key}`);
  return value;
}
