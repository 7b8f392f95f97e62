import { cutMarkInfo } from '../calculations/cut-mark';
import { datumLandingInfo } from '../calculations/datum-landing';
import { leftToCutInfo } from '../calculations/left-to-cut';
import { lowestRoughCutInfo } from '../calculations/lowest-rough-cut';
import { takeoffInfo } from '../calculations/takeoff';
import { weldRoomInfo } from '../calculations/weld-room';
import { toDecimal } from '../units/decimal';
import { computed } from './computing';
import type { PointContext } from './context';
import type { GroupDefinition, PointDefinition } from './definition';
import { quantity } from './fields';
import { namedInstrument } from './instruments';
import { bySetting, commonPractice, judgeFact, judgeRange } from './judging';
import { judgeNameplate, nameplateGroup } from './nameplate';
import { restingOn } from './resting-on';
import { judgeStringHeight, stringGroup } from './string-line';
import { leftToCutIn, roomBelowBaseIn } from './stub';
import { landsAt, measuredOnHead, takeoffOf } from './takeoff-of';
import { agreedOrFarthest, judgeAgreement, twoPersonFields, twoPersons } from './two-persons';
import { judgeUsable } from './unusable';
import type { Verdict } from './verdict';
import { act, read } from './order';

/** Room that a welder needs under the head's base for rod, arm and eyes. Common practice. */
export const weldRoomNeededIn = 12;

const around = (value: number | undefined, by: number) =>
  value === undefined ? undefined : { min: value - by, max: value + by };

const groups = (context: PointContext): GroupDefinition[] => {
  const { base, drawingIn } = measuredOnHead(context.state.plan);
  const found = takeoffOf(context);
  const above = found?.stringHeightIn === undefined ? undefined : found.lowestCutFromStringIn;
  const tapes = ['first', 'second'].flatMap((hand) => namedInstrument(context, `tape.${hand}`, 'tape'));
  return [
    nameplateGroup(context),
    ...(tapes.length > 0 ? [{ key: 'tapes', fields: tapes }] : []),
    { key: base, fields: twoPersonFields(base, 'in', around(drawingIn, 1)) },
    stringGroup(context),
    { key: 'mark', fields: twoPersonFields('mark', 'in', around(found?.markIn, 1)) },
    {
      key: 'stub',
      fields: [
        quantity('stub-top', 'in', { likely: above === undefined ? undefined : { min: above, max: above + 120 } }),
        quantity('conductor-top', 'in', { likely: { min: -240, max: 60 } }),
        quantity('collar', 'in', { likely: { min: Number(context.state.plan.head.socketDepthIn), max: 600 } }),
        quantity('plumb.x', 'deg', { likely: { min: -2, max: 2 } }),
        quantity('plumb.y', 'deg', { likely: { min: -2, max: 2 } }),
      ],
    },
  ];
};

/** The head's own length against its drawing: another length is another takeoff. */
const judgeHead = (context: PointContext): Verdict[] => {
  const { base, drawingIn } = measuredOnHead(context.state.plan);
  const measured = twoPersons(context, base);
  const allowed = context.setting('takeoffAgreesIn');
  return [
    ...judgeAgreement(context, base),
    ...judgeRange(context, {
      limit: `${base}.drawing`,
      kind: 'hold',
      about: measured.counted.length > 0 ? measured.counted : measured.fields,
      measured: agreedOrFarthest(measured, drawingIn),
      min: drawingIn - allowed,
      max: drawingIn + allowed,
      unit: 'in',
      source: bySetting(context, 'takeoffAgreesIn'),
      params: { drawing: { quantity: toDecimal(drawingIn), unit: 'in' } },
    }),
  ];
};

/** What the computed mark is worked out from, beside the plan. */
const markRestsOn = ['string.a', 'string.b', 'string.apart', 'string.from-a', 'takeoff', 'socket'].flatMap((field) =>
  field.startsWith('string') ? [field] : ['first', 'second', 'third'].map((hand) => `${field}.${hand}`),
);

const judgeMark = (context: PointContext): Verdict[] => {
  const mark = takeoffOf(context)?.markIn;
  const measured = twoPersons(context, 'mark');
  const allowed = context.setting('markAgreesIn');
  return [
    ...judgeAgreement(context, 'mark'),
    ...(mark === undefined
      ? []
      : judgeRange(context, {
          limit: 'mark.computed',
          kind: 'hold',
          about: measured.counted.length > 0 ? measured.counted : measured.fields,
          measured: agreedOrFarthest(measured, mark),
          min: mark - allowed,
          max: mark + allowed,
          unit: 'in',
          source: bySetting(context, 'markAgreesIn'),
          params: { mark: { quantity: toDecimal(mark), unit: 'in' } },
        })),
  ];
};

const judgeBelowMark = (context: PointContext): Verdict[] =>
  judgeRange(context, {
    limit: 'stub-below-mark',
    kind: 'stop',
    about: ['stub-top'],
    measured: leftToCutIn(context),
    min: 0,
    unit: 'in',
    source: commonPractice,
  });

const judgeStub = (context: PointContext): Verdict[] => {
  const { head, terms } = context.state.plan;
  const socketBelowCut = Number(head.socketDepthIn) - Number(terms.standOffIn);
  return [
    ...judgeBelowMark(context),
    ...judgeRange(context, {
      limit: 'stub-above-mark',
      kind: 'hold',
      about: ['stub-top'],
      measured: leftToCutIn(context),
      min: context.setting('stubAboveMarkIn'),
      unit: 'in',
      source: bySetting(context, 'stubAboveMarkIn'),
    }),
    ...judgeUsable(context, 'stub-usable', ['stub-top', 'string.a', 'string.b'], leftToCutIn(context) !== undefined),
    ...judgeRange(context, {
      limit: 'collar',
      kind: 'stop',
      about: ['collar'],
      measured: context.number('collar'),
      min: socketBelowCut + weldRoomNeededIn,
      unit: 'in',
      source: commonPractice,
    }),
    ...judgeRange(context, {
      limit: 'room-below-base',
      kind: 'advice',
      about: ['conductor-top'],
      measured: roomBelowBaseIn(context),
      min: weldRoomNeededIn,
      unit: 'in',
      source: commonPractice,
    }),
  ];
};

/** Said before fire is put to conductor or stub, when nothing may have been measured yet. */
const sayLowestCut = (context: PointContext): Verdict[] => {
  const found = takeoffOf(context);
  if (!found) return [];
  const lowest = { quantity: toDecimal(found.lowestCutIn), unit: 'in' };
  const fromString = found.lowestCutFromStringIn;
  return judgeFact(context, {
    limit: 'lowest-cut',
    kind: 'advice',
    about: [],
    source: bySetting(context, 'stubAboveMarkIn'),
    says: fromString === undefined ? 'lowest-cut' : 'lowest-cut-from-string',
    params:
      fromString === undefined ? { lowest } : { lowest, fromString: { quantity: toDecimal(fromString), unit: 'in' } },
    holds: true,
  });
};

/** The mark as two people found it on the casing, above ground; the computed one until they agree. */
const markedElevation = (context: PointContext): number | undefined => {
  const found = takeoffOf(context);
  if (!found || found.stringHeightIn === undefined) return undefined;
  const marked = twoPersons(context, 'mark').agreedIn ?? found.markIn;
  return marked === undefined ? undefined : found.stringHeightIn - marked;
};

/** Point 2: where the casing has to be cut so that the head's datum lands at the height asked for. */
export const heightTakeoff: PointDefinition = {
  kind: 'height-takeoff',
  version: 1,
  // the conductor hides the casing; where the mark falls is known before the stub is shortened
  order: [
    read(/^(nameplate|tape|takeoff|socket)\b/),
    read(/^string\b/),
    act('conductor-cut'),
    read(/^mark\b/),
    act('rough-cut'),
  ],
  groups,
  shots: () => ['nameplate', 'tape-on-head', 'tape-at-string'].map((key) => ({ key, required: true })),
  // Conductor and stub may stand rough cut already when the welder arrives; what stands is measured either way.
  acts: () => ['conductor-cut', 'rough-cut'].map((key) => ({ key, flame: true, required: false })),
  statements: [],
  cautions: () => ['rough-cut', 'string'],
  compute: (context) => {
    const found = takeoffOf(context);
    return [
      ...computed(found?.by === 'tape' ? 'takeoff-by-tape' : 'takeoff-by-drawing', found?.takeoffIn, 'in', takeoffInfo),
      ...computed('lowest-cut', found?.lowestCutIn, 'in', lowestRoughCutInfo),
      ...computed('lowest-cut-from-string', found?.lowestCutFromStringIn, 'in', lowestRoughCutInfo),
      ...computed('cut-elevation', found?.cutElevationIn, 'in', cutMarkInfo),
      ...computed('mark', found?.markIn, 'in', cutMarkInfo),
      ...computed('left-to-cut', leftToCutIn(context), 'in', leftToCutInfo),
      ...computed('lands-at', landsAt(context, markedElevation(context)), 'in', datumLandingInfo),
      ...computed('room-below-base', roomBelowBaseIn(context), 'in', weldRoomInfo),
    ];
  },
  judge: (context) => [
    ...judgeNameplate(context),
    ...judgeHead(context),
    ...judgeStringHeight(context),
    ...restingOn(context, markRestsOn, [...judgeMark(context), ...judgeStub(context)]),
  ],
  beforeAct: (context, act) => [
    ...sayLowestCut(context),
    ...(act === 'rough-cut' ? judgeBelowMark(context).filter((verdict) => verdict.outcome === 'outside') : []),
  ],
};
