/** A moment with or without its temperature, in seconds and °F. */
interface Moment {
  readonly timeS: number;
  readonly temperatureF?: number;
}

/**
 * Temperatures of moments in the order of time, °F: as read, or on the straight line between the readings before and
 * after. Undefined before the first reading and after the last. Common practice.
 */
export const temperaturesBetween = (moments: readonly Moment[]): (number | undefined)[] => {
  const found = moments.map(({ temperatureF }) => temperatureF);
  let before: number | undefined;
  for (const [index, { timeS, temperatureF }] of moments.entries()) {
    if (temperatureF === undefined) continue;
    const start = before === undefined ? undefined : moments[before];
    if (start?.temperatureF !== undefined && before !== undefined) {
      const slope = timeS > start.timeS ? (temperatureF - start.temperatureF) / (timeS - start.timeS) : 0;
      for (let between = before + 1; between < index; between += 1) {
        found[between] = start.temperatureF + slope * ((moments[between]?.timeS ?? start.timeS) - start.timeS);
      }
    }
    before = index;
  }
  return found;
};
