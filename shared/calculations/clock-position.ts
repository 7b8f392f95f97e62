/** A direction on the head seen from above: 12 o'clock faces the V-door, degrees run clockwise from it. */
export interface Direction {
  readonly clockwiseDeg: number;
  /** Hours and half hours as they are called out: `3:00`, `7:30`. */
  readonly clock: string;
}

/** The direction of a vector given by its part towards 12 o'clock and its part towards 3 o'clock. */
export const directionTowards = (towardsTwelve: number, towardsThree: number): Direction => {
  const turned = (Math.atan2(towardsThree, towardsTwelve) * 180) / Math.PI;
  const clockwiseDeg = (turned + 360) % 360;
  const halfHours = Math.round(clockwiseDeg / 15) % 24;
  const hour = Math.floor(halfHours / 2) || 12;
  return { clockwiseDeg, clock: `${hour}:${halfHours % 2 === 0 ? '00' : '30'}` };
};
