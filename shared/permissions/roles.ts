/** What somebody is on an installation and on a job (codes of the product's role table). */
export const roles = ['welder', 'company_rep', 'tool_pusher', 'auditor', 'coordinator'] as const;
export type Role = (typeof roles)[number];
