import type { Unit } from '../units/units';
import type { Decimal, Settings, SettingName, Terms } from './plan';
import { settingNames } from './plan';

interface SettingDefinition {
  unit: Unit;
  value: Decimal;
  min: Decimal;
  max: Decimal;
}

/**
 * The defaults of common practice (no source) and how far a programme may move each.
 * A site may set gas limits stricter, never looser than the standard; 10 % LEL itself is never allowed.
 */
export const settingDefinitions: Record<SettingName, SettingDefinition> = {
  gasFreshMin: { unit: 'min', value: '60', min: '5', max: '240' },
  lelMaxPct: { unit: 'pct', value: '0', min: '0', max: '9.9' },
  tapesAgreeIn: { unit: 'in', value: '0.0625', min: '0.015625', max: '0.5' },
  markAgreesIn: { unit: 'in', value: '0.0625', min: '0.015625', max: '0.5' },
  stubAboveMarkIn: { unit: 'in', value: '3', min: '0.5', max: '24' },
  takeoffAgreesIn: { unit: 'in', value: '0.125', min: '0.015625', max: '1' },
  cutHighIn: { unit: 'in', value: '0.125', min: '0.015625', max: '1' },
  cutLowIn: { unit: 'in', value: '0.0625', min: '0', max: '1' },
  cutSpreadIn: { unit: 'in', value: '0.0625', min: '0.015625', max: '1' },
  greaseClearIn: { unit: 'in', value: '1', min: '0.25', max: '12' },
  rotationDeg: { unit: 'deg', value: '0.5', min: '0.05', max: '5' },
  tiltDeg: { unit: 'deg', value: '0.25', min: '0.05', max: '2' },
  datumWithinIn: { unit: 'in', value: '0.25', min: '0.03125', max: '6' },
  passTemperatureMin: { unit: 'min', value: '5', min: '1', max: '30' },
  touchF: { unit: 'degF', value: '120', min: '60', max: '150' },
  collapseSharePct: { unit: 'pct', value: '80', min: '10', max: '100' },
  gaugeLowPct: { unit: 'pct', value: '25', min: '0', max: '50' },
  gaugeHighPct: { unit: 'pct', value: '75', min: '50', max: '100' },
};

/** The settings of a job whose operator's programme says nothing. */
export const defaultSettings = (): Settings =>
  Object.fromEntries(
    settingNames.map((name) => [name, { value: settingDefinitions[name].value, source: 'common-practice' as const }]),
  ) as Settings;

/** The settings with the programme's own values put in; a value equal to the default is still the programme's. */
export const settingsWith = (own: Partial<Record<SettingName, Decimal>>): Settings => {
  const settings = defaultSettings();
  for (const name of settingNames) {
    const value = own[name];
    if (value !== undefined) settings[name] = { value, source: 'job' };
  }
  return settings;
};

/** No value but the default may go by the name of common practice: another one is the programme's, whoever typed it. */
export const withTrueSources = (terms: Terms): Terms => {
  const settings = { ...terms.settings };
  for (const name of settingNames) {
    const { value } = settings[name];
    if (Number(value) !== Number(settingDefinitions[name].value)) settings[name] = { value, source: 'job' };
  }
  return { ...terms, settings };
};
