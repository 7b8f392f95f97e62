import { describe, expect, it } from 'vitest';
import { blankDraft, isDraft, type PlanDraft } from '../../../src/stores/planning/draft';
import { readDraft } from '../../../src/stores/planning/read-draft';
import { aCatalogue, aDraft } from '../../support/a-catalogue';

const day = '2026-09-14';
const read = (own: Partial<PlanDraft> = {}) => readDraft(aDraft(own), aCatalogue(), day);
const said = (own: Partial<PlanDraft>) => read(own).faults.map(({ kind, text }) => `${kind} ${text.key}`);

describe('a plan’s form', () => {
  it('asks for the job as it is filled in, and nothing stands in its way', () => {
    const { planning, faults } = read();
    expect(faults).toEqual([]);
    expect(planning).toMatchObject({
      well: 'Tallgrass 14-2H',
      casing: { odIn: '9.625', weightLbFt: '40', grade: 'J55' },
      terms: { targetHeightIn: '6', test: { pressurePsi: 1500, holdMin: 15, allowedDropPsi: 75 }, ownSettings: {} },
      proposedDirection: null,
    });
  });

  it('says of an untouched form what is missing, and lets no rule speak about what is not there', () => {
    const { planning, faults } = readDraft(blankDraft('imperial'), aCatalogue(), day);
    expect(planning).toBeNull();
    expect(new Set(faults.map(({ kind }) => kind))).toEqual(new Set(['missing']));
    expect(faults.map(({ field }) => field)).toContain('casing');
  });

  it('reads the height as the tape says it, in feet and inches or in millimetres', () => {
    expect(read({ targetHeight: `1' 2 3/8"` }).planning?.terms.targetHeightIn).toBe('14.375');
    expect(read({ targetHeight: '-25.4 mm' }).planning?.terms.targetHeightIn).toBe('-1');
    expect(
      read({ units: 'metric', targetHeight: '508', standOff: '0', pressure: '10342', allowedDrop: '517' }).planning
        ?.terms,
    ).toMatchObject({
      targetHeightIn: '20',
      test: { pressurePsi: 1500, allowedDropPsi: 75 },
    });
  });

  it('keeps what it cannot read as typed and says so at its field', () => {
    const { planning, faults } = read({ targetHeight: '143/8' });
    expect(planning).toBeNull();
    expect(faults).toMatchObject([
      { field: 'targetHeightIn', kind: 'unread', text: { key: 'entry.quantity-fraction-not-proper' } },
    ]);
  });

  it('works out takeoff, cut and safe test pressure, and what governs it', () => {
    const { heights, pressure } = read({ standOff: '1/4' });
    expect(heights).toEqual({ takeoffIn: '14', cutElevationIn: '-8.25', baseElevationIn: '-18' });
    expect(pressure?.safe).toMatchObject({ limitPsi: 2056, governedBy: 'collapse' });
    expect(read({ datum: 'base' }).heights?.takeoffIn).toBe('-10');
    expect(read({ headId: '' }).heights).toBeNull();
  });

  it('warns of a test pressure over the share of collapse and stops one over collapse itself', () => {
    expect(said({ pressure: '2200' })).toEqual(['hold planFaults.pressure-over-collapse-share']);
    expect(said({ pressure: '2600' })).toContain('stop planFaults.pressure-over-collapse');
    expect(said({ pressure: '2600', casing: '' })).toEqual(['missing plan.need.casing']);
  });

  it('stops a head for another casing, but only once both are chosen', () => {
    expect(said({ headId: 'head-13' })).toContain('stop planFaults.head-for-other-casing');
    expect(said({ headId: 'head-13', casing: '' })).toEqual(['missing plan.need.casing']);
  });

  it('warns of an instrument past its date and stops a crew without a tool pusher', () => {
    expect(said({ instrumentIds: ['meter-1', 'gauge-old'] })).toEqual(['hold planFaults.instrument-out-of-date']);
    expect(said({ people: aDraft().people.filter(({ role }) => role !== 'tool_pusher') })).toEqual([
      'stop planFaults.nobody-is-tool-pusher',
    ]);
  });

  it('takes the programme’s own limits and stops one out of its range', () => {
    expect(read({ ownSettings: { cutHighIn: '3/32', touchF: '' } }).planning?.terms.ownSettings).toEqual({
      cutHighIn: '0.09375',
    });
    expect(read({ ownSettings: { lelMaxPct: '10' } }).faults).toMatchObject([
      { field: 'settings.lelMaxPct', kind: 'stop' },
    ]);
  });
});

describe('a casing that is typed by hand', () => {
  const own = {
    odIn: '9 5/8',
    weightLbFt: '40',
    wallIn: '0.395',
    grade: 'j-55',
    collapsePsi: '',
    internalYieldPsi: '',
    source: '',
  };
  const read = (change: Partial<typeof own> = {}) =>
    readDraft(aDraft({ casing: 'own', ownCasing: { ...own, ...change } }), aCatalogue(), day);

  it('has its ratings worked out where the grade is known, and names the formulas', () => {
    expect(read().planning?.casing).toMatchObject({ grade: 'J55', collapsePsi: 2570, internalYieldPsi: 3950 });
    expect(read().planning?.casing).toHaveProperty('source', expect.stringContaining('5C3'));
  });

  it('lets typed ratings go first, with a source of their own', () => {
    const fields = (change: Partial<typeof own>) => read(change).faults.map(({ field }) => field);
    expect(fields({ collapsePsi: '2400' })).toEqual(['ownCasing.source']);
    expect(read({ collapsePsi: '2400', source: 'Mill certificate 88-1' }).planning?.casing).toMatchObject({
      collapsePsi: 2400,
      internalYieldPsi: 3950,
      source: 'Mill certificate 88-1',
    });
    expect(fields({ grade: 'XY70' })).toEqual([
      'ownCasing.collapsePsi',
      'ownCasing.internalYieldPsi',
      'ownCasing.source',
    ]);
  });

  it('is not taken with a wall that leaves no bore', () => {
    const fields = read({ wallIn: '5', collapsePsi: '2000', internalYieldPsi: '2000', source: 'Data sheet' }).faults;
    expect(fields).toMatchObject([{ field: 'ownCasing.wallIn', kind: 'stop' }]);
  });
});

describe('a kept draft', () => {
  it('is taken up again, and one of another form is not guessed at', () => {
    expect(isDraft(JSON.parse(JSON.stringify(aDraft())))).toBe(true);
    for (const other of [null, 'draft', {}, { ...aDraft(), people: null }, { ...aDraft(), well: 3 }])
      expect(isDraft(other)).toBe(false);
  });
});
