import type { IconName } from './icons';

export type PointStatus = 'shut' | 'open' | 'presented' | 'released' | 'sent-back';
export type VerdictWord = 'within' | 'outside' | 'needs-another' | 'missing';
export type JobStatus = 'planned' | 'running' | 'sealed' | 'called-off';
export type ChipKind = PointStatus | VerdictWord | JobStatus;
export type Tone = 'shut' | 'open' | 'presented' | 'released' | 'outside' | 'within';

export interface ChipLook {
  readonly icon: IconName;
  readonly tone: Tone;
  readonly word: string;
}

/** Steel takes the temper colours straw, purple and blue as it takes heat: open, presented, released. */
export const chips: Readonly<Record<ChipKind, ChipLook>> = {
  shut: { icon: 'shut', tone: 'shut', word: 'app.state.shut' },
  open: { icon: 'open', tone: 'open', word: 'app.state.open' },
  presented: { icon: 'presented', tone: 'presented', word: 'app.state.presented' },
  released: { icon: 'released', tone: 'released', word: 'app.state.released' },
  'sent-back': { icon: 'sent-back', tone: 'outside', word: 'app.state.sent-back' },
  within: { icon: 'within', tone: 'within', word: 'app.verdict.within' },
  outside: { icon: 'outside', tone: 'outside', word: 'app.verdict.outside' },
  'needs-another': { icon: 'needs-another', tone: 'open', word: 'app.verdict.needs-another' },
  missing: { icon: 'missing', tone: 'shut', word: 'app.verdict.missing' },
  planned: { icon: 'clock', tone: 'shut', word: 'app.job.planned' },
  running: { icon: 'flame', tone: 'open', word: 'app.job.running' },
  sealed: { icon: 'released', tone: 'released', word: 'app.job.sealed' },
  'called-off': { icon: 'stop', tone: 'shut', word: 'app.job.called-off' },
};
