/** Browsers and systems as people know them, the most particular first: each also names the ones it descends from. */
const browsers = [
  ['Edg', 'Edge'],
  ['OPR', 'Opera'],
  ['SamsungBrowser', 'Samsung Internet'],
  ['Firefox', 'Firefox'],
  ['Chrome', 'Chrome'],
  ['Safari', 'Safari'],
] as const;
const systems = [
  ['iPhone', 'iPhone'],
  ['iPad', 'iPad'],
  ['Android', 'Android'],
  ['Windows', 'Windows'],
  ['Mac OS', 'macOS'],
  ['Linux', 'Linux'],
] as const;

/** Names a device by what its browser says of itself; undefined when that says nothing. */
export function deviceName(userAgent: string): { browser: string; system: string } | undefined {
  const browser = browsers.find(([sign]) => userAgent.includes(sign))?.[1];
  const system = systems.find(([sign]) => userAgent.includes(sign))?.[1];
  return browser === undefined || system === undefined ? undefined : { browser, system };
}
