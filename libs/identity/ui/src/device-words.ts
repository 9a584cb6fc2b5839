const BROWSERS: readonly (readonly [RegExp, string])[] = [
  [/Edg\//, 'Edge'],
  [/OPR\//, 'Opera'],
  [/Firefox\//, 'Firefox'],
  [/Chrom(e|ium)\//, 'Chrome'],
  [/Safari\//, 'Safari'],
];
const SYSTEMS: readonly (readonly [RegExp, string])[] = [
  [/iPhone|iPad/, 'iOS'],
  [/Android/, 'Android'],
  [/Windows/, 'Windows'],
  [/Mac OS X/, 'macOS'],
  [/Linux/, 'Linux'],
];

const firstOf = (words: readonly (readonly [RegExp, string])[], text: string) =>
  words.find(([pattern]) => pattern.test(text))?.[1];

/** A browser's long words for itself, as a person would say them: "Firefox on Windows". */
export function describeDevice(userAgent: string): string {
  const browser = firstOf(BROWSERS, userAgent);
  const system = firstOf(SYSTEMS, userAgent);
  if (browser && system) return $localize`${browser}:browser: on ${system}:system:`;
  return browser ?? system ?? $localize`Another browser`;
}
