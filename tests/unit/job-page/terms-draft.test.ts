import { describe, expect, it } from 'vitest';
import { readTerms, termNumbers, type TermsDraft } from '../../../src/components/job/terms-draft';
import { releasedBy } from '../../../shared/job/terms-in-use';
import { aJob } from '../../support/a-job';
import { aPlan } from '../../support/a-plan';
import { walkTo } from '../../support/drive';

const { terms } = aPlan();
const draft = (typed: Record<string, string>, own: Partial<TermsDraft> = {}): TermsDraft => ({
  datum: terms.datum,
  medium: terms.test.medium,
  typed,
  ...own,
});
const read = (one: TermsDraft, used = false, system: 'imperial' | 'metric' = 'imperial') =>
  readTerms(terms, one, system, () => used);

describe('a draft of terms', () => {
  it('left open is the terms as they are', () => {
    expect(read(draft({})).terms).toEqual(terms);
  });

  it('changes datum, height and the whole test', () => {
    const typed = { targetHeightIn: '1\' 2 3/8"', pressurePsi: '1200', holdMin: '30', allowedDropPsi: '0' };
    expect(read(draft(typed, { datum: 'outlet', medium: 'nitrogen' })).terms).toEqual({
      ...terms,
      datum: 'outlet',
      targetHeightIn: '14.375',
      test: { medium: 'nitrogen', pressurePsi: 1200, holdMin: 30, allowedDropPsi: 0 },
    });
  });

  it('is read in the reader’s units and kept in whole psi', () => {
    expect(read(draft({ pressurePsi: '100 bar' })).terms?.test.pressurePsi).toBe(1450);
    expect(read(draft({ targetHeightIn: '254' }), false, 'metric').terms?.targetHeightIn).toBe('10');
  });

  it.each([
    ['pressurePsi', '0'],
    ['pressurePsi', '20001'],
    ['holdMin', '1441'],
    ['tiltDeg', '9'],
    ['targetHeightIn', 'about six'],
  ])('is no terms while %s says %s, and says so there', (key, typed) => {
    const { terms: found, wrong } = read(draft({ [key]: typed }));
    expect(found).toBeNull();
    expect([...wrong.keys()]).toEqual([key]);
  });

  it('makes a limit of the air only stricter once a point was released by it', () => {
    expect(read(draft({ gasFreshMin: '90' })).terms?.settings.gasFreshMin.value).toBe('90');
    expect(read(draft({ gasFreshMin: '90' }), true).wrong.get('gasFreshMin')?.key).toBe('job.terms.onlyStricter');
    expect(read(draft({ gasFreshMin: '30' }), true).terms?.settings.gasFreshMin).toEqual({
      value: '30',
      source: 'job',
    });
  });
});

describe('what a released point was judged by', () => {
  it('is named by that point, and is what the rules refuse to change', () => {
    const job = aJob();
    walkTo(job, 'final-cut');
    const users = (term: Parameters<typeof releasedBy>[1]) => releasedBy(job.job, term).map((one) => one.place.id);
    expect(users('datum')).toEqual(['height-takeoff']);
    expect(users('stubAboveMarkIn')).toEqual(['height-takeoff']);
    expect(users('test')).toEqual([]);
    const typed = { targetHeightIn: '9' };
    const changed = readTerms(job.job.plan.terms, draft(typed), 'imperial', () => false).terms;
    if (!changed) throw new Error('these are terms');
    const body = { terms: changed, reason: 'Operator’s letter.', ...job.signingJob() };
    expect(job.refused('change-terms', body, job.person('company_rep'))).toBe('terms-in-use');
  });

  it('leaves every number of the terms with words and a value', () => {
    expect(termNumbers(terms).every(({ label, now }) => label !== '' && now !== '')).toBe(true);
    expect(new Set(termNumbers(terms).map((one) => one.key)).size).toBe(23);
  });
});
