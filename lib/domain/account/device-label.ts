const BROWSERS: readonly [RegExp, string][] = [
  [/Edg(?:e|A|iOS)?\//, 'Edge'],
  [/OPR\/|Opera/, 'Opera'],
  [/SamsungBrowser\//, 'Samsung Internet'],
  [/Firefox\/|FxiOS\//, 'Firefox'],
  [/Chrome\/|CriOS\/|Chromium\//, 'Chrome'],
  [/Safari\//, 'Safari'],
];
const SYSTEMS: readonly [RegExp, string][] = [
  [/iPhone/, 'iPhone'],
  [/iPad/, 'iPad'],
  [/Android/, 'Android'],
  [/Windows/, 'Windows'],
  [/Mac OS X|Macintosh/, 'Mac'],
  [/CrOS/, 'ChromeOS'],
  [/Linux|X11/, 'Linux'],
];

/** "Firefox on Android": enough to know one's own sign-in by, too little to follow anyone with. */
export function deviceLabel(userAgent: string | null): string {
  const named = (table: typeof BROWSERS) => table.find(([pattern]) => pattern.test(userAgent ?? ''))?.[1];
  const browser = named(BROWSERS) ?? 'A browser';
  const system = named(SYSTEMS);
  return system ? `${browser} on ${system}` : browser;
}
