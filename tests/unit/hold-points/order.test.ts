import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import { pointKinds, type PointKind } from '../../../shared/hold-points/points';
import { dueAt } from '../../../shared/job/due';
import { reviewPoint } from '../../../shared/job/review';
import { aPointContext } from '../../support/a-point';

const repairKinds: readonly PointKind[] = ['preheat-reached'];
const contexts = (kind: PointKind) => [
  aPointContext({ kind }),
  ...(repairKinds.includes(kind) ? [aPointContext({ kind, round: 1 })] : []),
];
const dueOf = (kind: PointKind, round = 0) => {
  const { state, point } = aPointContext({ kind, round });
  return dueAt(reviewPoint(state, point), point).flatMap((due) => {
    if (due.due === 'fields') return due.fields.map((field) => field.key);
    return due.due === 'shot' ? `photo ${due.shot}` : `${due.due} ${due.act}`;
  });
};
const before = (kind: PointKind, last: string, round = 0) => {
  const due = dueOf(kind, round);
  expect(due).toContain(last);
  return due.slice(0, due.indexOf(last));
};

describe('the order of the work', () => {
  it.each([...pointKinds])('at %s names only what the point has', (kind) => {
    const reviews = contexts(kind).map(({ state, point }) => reviewPoint(state, point));
    for (const part of definitionOf(kind).order ?? []) {
      const found = reviews.some(({ fields, shots, acts }) => {
        if ('read' in part) return fields.some(({ key }) => part.read.test(key));
        return 'act' in part ? acts.some(({ key }) => key === part.act) : shots.some(({ key }) => key === part.shot);
      });
      expect(found, JSON.stringify('read' in part ? String(part.read) : part)).toBe(true);
    }
  });

  it.each([...pointKinds])('at %s leaves nothing out that is missing', (kind) => {
    const { state, point } = aPointContext({ kind });
    const missing = reviewPoint(state, point).missing.map((key) =>
      key
        .replace(/^field:/, '')
        .replace(/^shot:/, 'photo ')
        .replace(/^act:/, 'act '),
    );
    expect(
      dueOf(kind)
        .filter((due) => !due.startsWith('optional-act'))
        .sort(),
    ).toEqual(missing.sort());
  });

  it('looks at seal and grease before the head is set, and at the seal again after', () => {
    const first = before('seal-greased-and-checked', 'act set-head');
    expect(first).toEqual(
      expect.arrayContaining(['direction-marked', 'seal.sound', 'grease.clear', 'photo seal-before']),
    );
    expect(first).not.toContain('seal.sight');
  });

  it('knows the mark before the stub is shortened', () => {
    expect(before('height-takeoff', 'mark.first')).toEqual(
      expect.arrayContaining(['nameplate.serial', 'takeoff.second', 'string.a', 'optional-act conductor-cut']),
    );
    expect(before('height-takeoff', 'optional-act rough-cut')).toContain('mark.second');
    expect(before('height-takeoff', 'stub-top')).toContain('optional-act rough-cut');
  });

  it('tacks, levels, reads the temperatures and then strikes the arc', () => {
    const first = before('pass-inspected', 'act pass');
    expect(first[0]).toBe('act tacks');
    expect(first.slice(-1)).toEqual(['temps.casing']);
    expect(first.some((one) => one.startsWith('tacked.'))).toBe(true);
  });

  it('clears the port, sets the zone and knows gauge and volume before pressure goes up', () => {
    expect(before('pressure-test-held', 'act pressure-test')).toEqual(
      expect.arrayContaining(['port-probed', 'fitting-in', 'exclusion', 'gauge', 'volume']),
    );
  });

  it('digs out and looks before it heats for a repair', () => {
    expect(before('preheat-reached', 'act preheat', 1)).toEqual(['act excavation', 'excavated-cracks']);
  });
});
