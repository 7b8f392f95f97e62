/** What somebody is on an installation and on a job (codes of the product's role table). */
export const roles = ['welder', 'company_rep', 'tool_pusher', 'auditor', 'coordinator'] as const;
export type Role = (typeof roles)[number];

/** The contractor's own; everybody else is a guest of the installation. */
const ofTheFirm: readonly Role[] = ['welder', 'coordinator'];

/** Whether these roles of one account are on both sides: who does the work is never the one who accepts it. */
export const onBothSides = (held: readonly Role[]): boolean =>
  held.some((role) => ofTheFirm.includes(role)) && held.some((role) => !ofTheFirm.includes(role));
