// In this order: most browsers also name those they descend from.
const BROWSERS: [sign: RegExp, name: string][] = [
  [/\bEdg(e|A|iOS)?\//, 'Edge'],
  [/\bOPR\/|\bOpera\b/, 'Opera'],
  [/\bSamsungBrowser\//, 'Samsung Internet'],
  [/\b(Firefox|FxiOS)\//, 'Firefox'],
  [/\b(Chrome|CriOS|Chromium)\//, 'Chrome'],
  [/\bSafari\//, 'Safari'],
]
const SYSTEMS: [sign: RegExp, name: string][] = [
  [/\biPhone\b/, 'iPhone'],
  [/\biPad\b/, 'iPad'],
  [/\bAndroid\b/, 'Android'],
  [/\bWindows\b/, 'Windows'],
  [/\bCrOS\b/, 'ChromeOS'],
  [/\bMacintosh\b|\bMac OS X\b/, 'Mac'],
  [/\bLinux\b/, 'Linux'],
]

const nameIn = (signs: [RegExp, string][], agent: string) => signs.find(([sign]) => sign.test(agent))?.[1]

/** "Firefox on Windows" from a browser's account of itself, which may be false: a hint, never a proof. */
export function deviceWords(userAgent: string | null): string {
  const agent = userAgent ?? ''
  const browser = nameIn(BROWSERS, agent)
  const system = nameIn(SYSTEMS, agent)
  if (browser && system) return `${browser} on ${system}`
  if (browser) return browser
  return system ? `An app on ${system}` : 'An unknown device'
}
