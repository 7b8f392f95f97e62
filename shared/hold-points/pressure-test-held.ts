import { nitrogenStoredEnergy, nitrogenStoredEnergyInfo } from '../calculations/nitrogen-stored-energy';
import { oilCompression, oilCompressionInfo } from '../calculations/oil-compression';
import { pressureHoldInfo } from '../calculations/pressure-hold';
import { trappedLiquid, trappedLiquidInfo } from '../calculations/trapped-liquid';
import { voidPressureLimitInfo } from '../calculations/void-pressure-limit';
import { convert } from '../units/convert';
import { answer, computed } from './computing';
import type { PointContext } from './context';
import type { GroupDefinition, PointDefinition } from './definition';
import { check, choice, instrument, quantity, time, words } from './fields';
import { fewestHoldReadings, holdOf } from './hold-of-test';
import { pressureLimitsOf } from './pressure-limits';
import { portsOf } from './ports';
import { gaugeFullScalePsi, judgeBeforeTest, judgeTest, reachedCollapse } from './test-limits';
import type { Computed } from './verdict';
import { act, read } from './order';

/** A usual hydraulic oil: bulk modulus in psi, expansion per °F. Common practice; the oil's own sheet governs. */
const oil = { bulkModulusPsi: 300_000, expansionPerF: 0.00046 } as const;

const groups = (context: PointContext): GroupDefinition[] => {
  const { plan } = context.state;
  const target = plan.terms.test.pressurePsi;
  const pressure = { likely: { min: target * 0.8, max: target * 1.2 } };
  const known = context.instrument(context.value('gauge'))?.fullScalePsi ?? null;
  return [
    { key: 'rigging', fields: [check('port-probed'), check('fitting-in'), check('exclusion')] },
    {
      key: 'gauge',
      fields: [
        instrument('gauge', ['gauge', 'recorder']),
        quantity('full-scale', 'psi', { required: known === null, likely: { min: target, max: target * 5 } }),
        quantity('volume', 'in3', { likely: { min: 1, max: 5000 } }),
      ],
    },
    { key: 'hold', fields: [time('hold.start'), time('hold.end')] },
    {
      key: 'hold-readings',
      rows: { min: fewestHoldReadings, max: 500 },
      fields: [
        time('hold-readings.#.at'),
        quantity('hold-readings.#.pressure', 'psi', pressure),
        quantity('hold-readings.#.temperature', 'degF', { required: false, likely: { min: -40, max: 150 } }),
      ],
    },
    {
      key: 'outcome',
      fields: [
        quantity('highest', 'psi', pressure),
        check('bore-gauged', { required: reachedCollapse(context) }),
        choice('leak', ['none', 'weld', 'port', 'seal']),
        choice('run-by', ['welder', 'technician']),
        words('run-by-name'),
      ],
    },
    {
      key: 'put-back',
      fields: [
        check('bled-to-zero'),
        ...portsOf(plan).map((port) => choice(`plug.${port}.back`, ['same', 'replaced', 'not-back'])),
      ],
    },
  ];
};

const computeMedium = (context: PointContext): Computed[] => {
  const { medium, pressurePsi } = context.state.plan.terms.test;
  const volumeIn3 = context.number('volume');
  const volumeL = volumeIn3 === undefined ? undefined : convert(volumeIn3, 'in3', 'L');
  if (medium === 'nitrogen') {
    if (volumeL === undefined) return [];
    const stored = answer(nitrogenStoredEnergy({ volumeL, pressurePsig: pressurePsi }));
    return [
      ...computed('stored-energy', stored && stored.energyJ / 1000, 'kJ', nitrogenStoredEnergyInfo),
      ...computed('stand-off', stored?.standOffFt, 'ft', nitrogenStoredEnergyInfo),
    ];
  }
  const pump =
    volumeL === undefined
      ? undefined
      : answer(oilCompression({ volumeL, pressurePsi, bulkModulusPsi: oil.bulkModulusPsi }));
  const perDegree = answer(trappedLiquid({ ...oil, differenceF: 1 }));
  return [
    ...computed('oil-volume', pump?.pumpIn3, 'in3', oilCompressionInfo),
    ...computed('oil-per-degree', perDegree?.risePsiPerF, 'psi', trappedLiquidInfo),
  ];
};

const compute = (context: PointContext): Computed[] => {
  const hold = holdOf(context);
  const { safe } = pressureLimitsOf(context.state.plan);
  return [
    ...(safe ? computed(`safe-limit-${safe.governedBy}`, safe.limitPsi, 'psi', voidPressureLimitInfo) : []),
    ...computed('lowest', hold?.lowestPsig, 'psi', pressureHoldInfo),
    ...computed('drop', hold?.dropPsi, 'psi', pressureHoldInfo),
    ...computed('rate', hold?.ratePsiPerMin, 'psi', pressureHoldInfo),
    ...computed('corrected-drop', hold?.correctedDropPsi ?? undefined, 'psi', pressureHoldInfo),
    ...computeMedium(context),
  ];
};

/** Point 11: the void behind the seal holds its pressure, is bled to zero, and every plug is back. */
export const pressureTestHeld: PointDefinition = {
  kind: 'pressure-test-held',
  version: 1,
  order: [read(/^(port-probed|fitting-in|exclusion|gauge|full-scale|volume)$/), act('pressure-test')],
  groups,
  shots: () => ['gauge-start', 'gauge-end'].map((key) => ({ key, required: true })),
  acts: () => [{ key: 'pressure-test', flame: false, required: true }],
  statements: [],
  cautions: (context) => [
    ...(context.state.plan.terms.test.medium === 'nitrogen' ? ['nitrogen-distance', 'nitrogen-oxygen'] : ['oil-jet']),
    'never-tighten',
    'test-procedure',
  ],
  compute,
  judge: (context) => judgeTest(context, gaugeFullScalePsi(context)),
  beforeAct: (context, act) => (act === 'pressure-test' ? judgeBeforeTest(context) : []),
};
