import { type CountryCode, getCountries, parsePhoneNumberFromString } from 'libphonenumber-js';

/**
 * A phone number as a person types it, in E.164; null where it cannot be one. A number without a country code is
 * read as one of `country`. Only the length is judged: new ranges come faster than any table of them.
 */
export function toE164(text: string, country: CountryCode | undefined): string | null {
  const phone = parsePhoneNumberFromString(text.trim().replace(/^00/, '+'), {
    extract: false,
    ...(country && { defaultCountry: country }),
  });
  return phone?.isPossible() ? phone.number : null;
}

/** "+442071838750" → "+44 20 7183 8750"; what cannot be read stays as it is. */
export const sayPhone = (e164: string): string =>
  parsePhoneNumberFromString(e164)?.formatInternational() ?? e164;

let countries: Map<string, CountryCode> | undefined;

/** Zone to country, read once from what the runtime knows: half a second over all countries is too long for each form. */
function countriesByZone(): Map<string, CountryCode> {
  const found = new Map<string, CountryCode>();
  for (const code of getCountries()) {
    const locale = new Intl.Locale(`und-${code}`) as Intl.Locale & {
      getTimeZones?: () => string[] | undefined;
      timeZones?: string[];
    };
    for (const zone of locale.getTimeZones?.() ?? locale.timeZones ?? [])
      if (!found.has(zone)) found.set(zone, code);
  }
  return found;
}

/** The country whose zones include this one, where numbers without a country code are most likely from. */
export function countryOfZone(timeZone: string): CountryCode | undefined {
  countries ??= countriesByZone();
  return countries.get(timeZone);
}
