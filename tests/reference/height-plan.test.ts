import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  cutMark,
  datumLanding,
  leftToCut,
  lowestRoughCut,
  stringHeight,
  takeoff,
  weldRoom,
  type Datum,
} from '../../shared/calculations';
import { answer, reason } from './answer';

/** An invented head: 24 in from face to shoulder, outlet centre 9-1/4 in below the face, socket 5 in deep. */
const head = { faceToShoulderIn: 24, faceToOutletIn: 9.25, socketDepthIn: 5 };

describe('takeoff, common practice, worked by hand', () => {
  it.each<[Datum, number]>([
    ['face', 24],
    ['outlet', 14.75],
    ['base', -5],
  ])('from the %s', (datum, inches) => expect(answer(takeoff({ datum, ...head })).takeoffIn).toBe(inches));

  it('needs only the dimensions of its own datum', () => {
    expect(takeoff({ datum: 'base', faceToShoulderIn: NaN, faceToOutletIn: NaN, socketDepthIn: 5 }).ok).toBe(true);
    expect(reason(takeoff({ datum: 'outlet', ...head, faceToOutletIn: NaN }))).toBe('not-a-number');
  });
});

describe('the cut mark, common practice, worked by hand', () => {
  it('for a face 18 in above ground: 18 − 24 − 1/4 = −6-1/4; string at 12: mark 18-1/4 below it', () => {
    const mark = answer(cutMark({ targetHeightIn: 18, takeoffIn: 24, standOffIn: 0.25, stringHeightIn: 12 }));
    expect(mark).toMatchObject({ cutElevationIn: -6.25, markFromStringIn: -18.25, side: 'below' });
  });

  it('for an outlet centre 10 in above ground: 10 − 14-3/4 − 1/4 = −5', () => {
    expect(
      answer(cutMark({ targetHeightIn: 10, takeoffIn: 14.75, standOffIn: 0.25, stringHeightIn: -5 })),
    ).toMatchObject({ cutElevationIn: -5, markFromStringIn: 0, side: 'on' });
  });

  it('for a base 12 in below ground: −12 + 5 − 1/4 = −7-1/4', () => {
    expect(
      answer(cutMark({ targetHeightIn: -12, takeoffIn: -5, standOffIn: 0.25, stringHeightIn: -10 })),
    ).toMatchObject({ cutElevationIn: -7.25, markFromStringIn: 2.75, side: 'above' });
  });

  it('interpolates the string between the stakes: 12 and 12-1/2, a third of the way: 12-1/6', () => {
    const string = { heightAtStakeAIn: 12, heightAtStakeBIn: 12.5, stakeAToStakeBIn: 144, stakeAToCasingIn: 48 };
    expect(answer(stringHeight(string)).stringHeightIn).toBeCloseTo(12 + 1 / 6, 12);
    expect(answer(stringHeight({ ...string, stakeAToCasingIn: 0 })).stringHeightIn).toBe(12);
    expect(answer(stringHeight({ ...string, stakeAToCasingIn: 144 })).stringHeightIn).toBe(12.5);
    expect(reason(stringHeight({ ...string, stakeAToCasingIn: 145 }))).toBe('casing-outside-stakes');
    expect(reason(stringHeight({ ...string, stakeAToStakeBIn: 0 }))).toBe('below-range');
  });

  it('tells what is left to cut, the room to weld and the lowest rough cut', () => {
    expect(answer(leftToCut({ stubTopFromStringIn: -10, markFromStringIn: -18.25 })).leftIn).toBe(8.25);
    expect(answer(leftToCut({ stubTopFromStringIn: -19, markFromStringIn: -18.25 })).belowMark).toBe(true);
    const room = { cutElevationIn: -6.25, standOffIn: 0.25, socketDepthIn: 5, obstructionElevationIn: -26 };
    expect(answer(weldRoom(room))).toMatchObject({ baseElevationIn: -11, roomIn: 15 });
    const rough = answer(lowestRoughCut({ cutElevationIn: -6.25, allowanceIn: 3, stringHeightIn: 12 }));
    expect(rough).toMatchObject({ elevationIn: -3.25, fromStringIn: -15.25 });
  });

  it('cutting on the mark lands the datum on target for every datum and head', () => {
    const length = fc.integer({ min: 0, max: 64 * 60 }).map((marks) => marks / 64);
    const height = fc.integer({ min: -64 * 100, max: 64 * 100 }).map((marks) => marks / 64);
    fc.assert(
      fc.property(
        fc.constantFrom<Datum>('face', 'outlet', 'base'),
        fc.record({ faceToShoulderIn: length, faceToOutletIn: length, socketDepthIn: length }),
        fc.record({ targetHeightIn: height, stringHeightIn: height, standOffIn: length }),
        (datum, dimensions, plan) => {
          const { takeoffIn } = answer(takeoff({ datum, ...dimensions }));
          const { markFromStringIn } = answer(cutMark({ takeoffIn, ...plan }));
          const cutElevationIn = plan.stringHeightIn + markFromStringIn;
          // Built up from the casing end: the shoulder stands above it, the datum above or below the shoulder.
          const shoulder = cutElevationIn + plan.standOffIn;
          const above = {
            face: dimensions.faceToShoulderIn,
            outlet: dimensions.faceToShoulderIn - dimensions.faceToOutletIn,
            base: -dimensions.socketDepthIn,
          };
          expect(shoulder + above[datum]).toBe(plan.targetHeightIn);
          expect(answer(datumLanding({ ...plan, cutElevationIn, takeoffIn })).missIn).toBe(0);
        },
      ),
    );
  });
});
