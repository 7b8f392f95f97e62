import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { twoHoleRotation } from '../../../shared/calculations';
import { planView, type PlanViewInput } from '../../../shared/drawing/plan-view';
import type { Drawing, Primitive } from '../../../shared/drawing/primitives';
import { quadrantClock } from '../../../shared/drawing/quadrant-clock';

const labels = (drawing: Drawing) =>
  drawing.primitives.filter((one): one is Extract<Primitive, { kind: 'label' }> => one.kind === 'label');
const arrows = (drawing: Drawing) =>
  drawing.primitives.filter((one): one is Extract<Primitive, { kind: 'arrow' }> => one.kind === 'arrow');

describe('the quadrant clock', () => {
  const values = { '12': 8.0625, '3': 8.125, '6': 8.1875, '9': 8.0625 };

  it('writes every reading at its hour and says the same numbers in words', () => {
    const drawing = quadrantClock({ values, unit: 'in', lowSideDegrees: null });
    for (const [hour, value] of Object.entries(values)) {
      expect(labels(drawing).find((one) => one.name === hour)?.text).toMatchObject({
        amount: String(value),
        unit: 'in',
      });
      expect(drawing.alternative).toContainEqual({
        key: 'drawing.clock.reads',
        params: { quarter: hour, value: { quantity: String(value), unit: 'in' } },
      });
    }
    expect(arrows(drawing)).toHaveLength(0);
  });

  it('points the arrow to the low side, clockwise from 12', () => {
    const [arrow] = arrows(quadrantClock({ values, unit: 'in', lowSideDegrees: 90 }));
    expect(arrow!.to.x).toBeGreaterThan(arrow!.from.x);
    expect(arrow!.to.y).toBeCloseTo(arrow!.from.y, 6);
  });

  it('keeps the words of the low side clear of every number, whatever the direction', () => {
    fc.assert(
      fc.property(fc.double({ min: -720, max: 720, noNaN: true }), (degrees) => {
        const drawing = quadrantClock({ values, unit: 'in', lowSideDegrees: degrees });
        const words = labels(drawing).find((one) => one.tone === 'oxide')!;
        for (const number of labels(drawing).filter((one) => one.name))
          expect(Math.abs(number.at.y - words.at.y)).toBeGreaterThan(15);
        expect(words.at.x).toBeGreaterThan(60);
        expect(words.at.x).toBeLessThan(drawing.width - 60);
      }),
    );
  });
});

describe('the plan view', () => {
  const input: PlanViewInput = {
    boltHoles: 16,
    offsetAIn: 31.375,
    offsetBIn: 31.5,
    lengthIn: 48,
    rotationDeg: -0.149,
    direction: { key: 'points.valve-orientation.choices.direction.mud-tanks' },
    bearingDeg: null,
    outside: false,
  };

  it('draws as many holes as the flange has and no hole on the centre line', () => {
    fc.assert(
      fc.property(fc.constantFrom(12, 16, 20, 24), (boltHoles) => {
        const drawing = planView({ ...input, boltHoles, rotationDeg: 0 });
        const holes = drawing.primitives.filter((one) => one.kind === 'circle' && one.radius === 6);
        expect(holes).toHaveLength(boltHoles);
        const centre = drawing.primitives.find((one) => one.kind === 'circle' && one.fill === 'metal');
        for (const hole of holes)
          if (hole.kind === 'circle' && centre?.kind === 'circle')
            expect(Math.abs(hole.at.x - centre.at.x)).toBeGreaterThan(3);
      }),
    );
  });

  it('leans the way that the offsets say, and never so far that it misleads', () => {
    const edge = (rotationDeg: number) =>
      planView({ ...input, rotationDeg }).primitives.find((one) => one.kind === 'line' && one.tone === 'straw');
    const drop = (rotationDeg: number) => {
      const line = edge(rotationDeg);
      return line?.kind === 'line' ? line.to.y - line.from.y : Number.NaN;
    };
    expect(drop(0)).toBe(0);
    expect(drop(0.3)).toBeLessThan(0);
    expect(drop(-0.3)).toBeGreaterThan(0);
    expect(drop(90)).toBe(drop(2));
  });

  it('draws the end that is farther out farther out, as the two holes were reckoned', () => {
    const offset = fc.double({ min: 20, max: 60, noNaN: true });
    fc.assert(
      fc.property(offset, offset, (offsetAIn, offsetBIn) => {
        fc.pre(Math.abs(offsetAIn - offsetBIn) > 0.01);
        const offsets = { firstOffsetIn: offsetAIn, secondOffsetIn: offsetBIn, betweenIn: 48, outletReachIn: 21 };
        const turned = twoHoleRotation(offsets);
        const { primitives } = planView({
          ...input,
          offsetAIn,
          offsetBIn,
          rotationDeg: turned.ok ? turned.rotationDeg : 0,
        });
        const edge = primitives.find((one) => one.kind === 'line' && one.tone === 'straw');
        if (edge?.kind !== 'line') expect.fail('no straightedge');
        // the substructure lies at the top of the sheet, end A at the left
        expect(Math.sign(edge.from.y - edge.to.y)).toBe(Math.sign(offsetAIn - offsetBIn));
      }),
    );
  });

  it('says in words which way the valve faces and what was measured', () => {
    expect(planView(input).alternative.map((one) => one.key)).toEqual([
      'drawing.plan.faces',
      'drawing.plan.offsets',
      'drawing.plan.rotation',
    ]);
    expect(planView({ ...input, direction: null, rotationDeg: null }).alternative[0]).toEqual({
      key: 'drawing.plan.no-direction',
    });
  });
});
