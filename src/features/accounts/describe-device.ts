/** Enough of a user agent to recognise one's own device; the order matters, as most claim to be others too. */
const BROWSERS: [RegExp, string][] = [
  [/Firefox\//, 'Firefox'],
  [/Edg\//, 'Edge'],
  [/Chrom(e|ium)\//, 'Chromium browser'],
  [/Safari\//, 'Safari'],
]
const SYSTEMS: [RegExp, string][] = [
  [/iPhone|iPad/, 'iOS'],
  [/Android/, 'Android'],
  [/Windows/, 'Windows'],
  [/Mac OS X/, 'macOS'],
  [/Linux/, 'Linux'],
]

const firstMatch = (table: [RegExp, string][], text: string) =>
  table.find(([pattern]) => pattern.test(text))?.[1]

export function describeDevice(userAgent: string): string {
  const browser = firstMatch(BROWSERS, userAgent)
  const system = firstMatch(SYSTEMS, userAgent)
  if (browser && system) return `${browser} on ${system}`
  return browser ?? system ?? (userAgent.slice(0, 40) || 'Unknown device')
}
