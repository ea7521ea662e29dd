/** The first that a user agent names is meant: later names are there for old sites' sake. */
const BROWSERS = [
  [/Edg(e|A|iOS)?\//, 'Edge'],
  [/OPR\/|Opera/, 'Opera'],
  [/SamsungBrowser\//, 'Samsung Internet'],
  [/Firefox\/|FxiOS\//, 'Firefox'],
  [/Chrom(e|ium)\/|CriOS\//, 'Chrome'],
  [/Version\/.*Safari\//, 'Safari'],
] as const

const SYSTEMS = [
  [/iPhone/, 'an iPhone'],
  [/iPad/, 'an iPad'],
  [/Android/, 'Android'],
  [/Windows/, 'Windows'],
  [/Macintosh|Mac OS X/, 'a Mac'],
  [/CrOS/, 'ChromeOS'],
  [/Linux|X11/, 'Linux'],
] as const

/**
 * A browser in plain words: "Firefox on Linux". It is what the browser says of itself, which
 * anybody can make up. @source RFC 9110 § 10.1.5, User-Agent
 */
export function browserInWords(userAgent: string): string {
  const named = (list: readonly (readonly [RegExp, string])[]) =>
    list.find(([pattern]) => pattern.test(userAgent))?.[1]
  const system = named(SYSTEMS)
  return `${named(BROWSERS) ?? 'A browser'}${system ? ` on ${system}` : ''}`
}
