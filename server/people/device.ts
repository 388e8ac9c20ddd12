export { describeDevice }

// Order matters: each browser's text also holds the names of those it wants to be taken for.
const browsers: [RegExp, string][] = [
  [/\bEdgA?\//, 'Edge'],
  [/\bOPR\//, 'Opera'],
  [/\bFirefox\/|\bFxiOS\//, 'Firefox'],
  [/\bChrome\/|\bCriOS\/|\bChromium\//, 'Chrome'],
  [/\bSafari\//, 'Safari'],
]
const systems: [RegExp, string][] = [
  [/\bAndroid\b/, 'Android'],
  [/\biPhone\b|\biPad\b/, 'iOS'],
  [/\bWindows\b/, 'Windows'],
  [/\bMac OS X\b/, 'macOS'],
  [/\bLinux\b|\bCrOS\b/, 'Linux'],
]

/** Browser and system as far as a User-Agent tells, for people to recognise their own devices by. */
function describeDevice(userAgent: string | undefined): string {
  if (userAgent === undefined || userAgent === '') return 'Unknown device'
  const named = (list: [RegExp, string][]) => list.find(([pattern]) => pattern.test(userAgent))?.[1]
  const browser = named(browsers) ?? 'Another program'
  const system = named(systems)
  return system === undefined ? browser : `${browser} on ${system}`
}
