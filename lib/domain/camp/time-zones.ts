import { isTimeZone } from '../shared/local-time';

/** IANA names to choose from, by name. */
export const listTimeZones = (): string[] => [...Intl.supportedValuesOf('timeZone'), 'UTC'].sort();

/** The IANA name as the list spells it, or an older name that still works (Asia/Kolkata); null for anything else. */
export function readTimeZone(text: string): string | null {
  const plain = text.trim();
  const listed = listTimeZones().find((zone) => zone.toLowerCase() === plain.toLowerCase());
  if (listed) return listed;
  // An offset such as +01:00 is no zone: it knows no clock changes.
  return /^[A-Za-z]+(\/[A-Za-z0-9_+-]+)+$/.test(plain) && isTimeZone(plain) ? plain : null;
}
