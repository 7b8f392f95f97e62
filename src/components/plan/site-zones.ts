/** The zones that this device's clock knows, the rigs' own first. Searched by city: `Chicago`. */
export function siteZones(first: readonly string[]): { value: string; label: string; words: string }[] {
  const all = [...new Set([...first, ...Intl.supportedValuesOf('timeZone'), 'UTC'])];
  return all.map((zone) => {
    const label = zone.replaceAll('_', ' ');
    return { value: zone, label, words: label.replaceAll('/', ' ') };
  });
}
