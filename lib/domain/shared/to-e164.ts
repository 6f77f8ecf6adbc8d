import {
  type CountryCode,
  getCountries,
  isSupportedCountry,
  parsePhoneNumberFromString,
} from 'libphonenumber-js';

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

/** The country whose zones include this one, where numbers without a country code are most likely from. */
export function countryOfZone(timeZone: string): CountryCode | undefined {
  return getCountries().find((code) => {
    if (!isSupportedCountry(code)) return false;
    const locale = new Intl.Locale(`und-${code}`) as Intl.Locale & {
      getTimeZones?: () => string[] | undefined;
      timeZones?: string[];
    };
    return (locale.getTimeZones?.() ?? locale.timeZones ?? []).includes(timeZone);
  });
}
