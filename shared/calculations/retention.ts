import { addMonths, readDate, writeDate } from './calendar-date';
import { refuse, type Outcome } from './outcome';

export const retentionInfo = {
  id: 'retention',
  version: 1,
  formula: 'keep through the sealing day plus the years of the longest rule that applies',
  source: 'Texas CPRC 16.009; API Q1, by edition',
  range: 'dates written YYYY-MM-DD',
} as const;

export interface RetentionRule {
  readonly id: string;
  readonly source: string;
  readonly edition: string | null;
  readonly years: number;
}

/** How long a packet is kept, by rule and edition; an installation names those that apply to it. */
export const RETENTION_RULES: readonly RetentionRule[] = [
  { id: 'texas-cprc-16.009', source: 'Texas CPRC 16.009', edition: null, years: 10 },
  { id: 'api-q1-9', source: 'API Q1', edition: '9th edition', years: 5 },
  { id: 'api-q1-10', source: 'API Q1', edition: '10th edition', years: 10 },
];

/** The last day a packet sealed on a day must be kept, by the longest of the rules named. Dates YYYY-MM-DD. */
export const retention = (packet: {
  sealedOn: string;
  ruleIds: readonly string[];
}): Outcome<{ keepThrough: string; governedBy: RetentionRule }> => {
  const sealedOn = readDate(packet.sealedOn);
  if (sealedOn === null) return refuse('date-not-understood', 'sealedOn');
  const rules = packet.ruleIds.map((id) => RETENTION_RULES.find((rule) => rule.id === id));
  let longest: RetentionRule | undefined;
  for (const rule of rules) {
    if (rule === undefined) return refuse('edition-unknown', 'ruleIds');
    if (longest === undefined || rule.years > longest.years) longest = rule;
  }
  if (longest === undefined) return refuse('edition-unknown', 'ruleIds');
  return { ok: true, keepThrough: writeDate(addMonths(sealedOn, longest.years * 12)), governedBy: longest };
};
