import { describe, expect, it } from 'vitest';
import { gasLimits, type Gas } from '../../shared/calculations';
import { answer, reason } from './answer';

const judge = (gas: Gas, reading: number, siteHigh: number | null = null, siteLow: number | null = null) =>
  gasLimits({ gas, reading, siteHigh, siteLow });

describe('gas limits for hot work', () => {
  it.each<[Gas, number, string]>([
    ['oxygen', 19.4, 'stop'],
    ['oxygen', 19.5, 'pass'],
    ['oxygen', 20.9, 'pass'],
    ['oxygen', 23.5, 'pass'],
    ['oxygen', 23.6, 'stop'],
    ['flammable', 0, 'pass'],
    ['flammable', 1, 'stop'],
    ['hydrogen-sulphide', 9.9, 'pass'],
    ['hydrogen-sulphide', 10, 'stop'],
    ['carbon-monoxide', 34.9, 'pass'],
    ['carbon-monoxide', 35, 'stop'],
  ])('%s at %d: %s (29 CFR 1910.146(b), NIOSH; flammable 0 common practice)', (gas, reading, verdict) =>
    expect(answer(judge(gas, reading)).verdict).toBe(verdict),
  );

  it('lets a site set flammable to below 10 % and be stricter elsewhere', () => {
    expect(answer(judge('flammable', 5, 5)).verdict).toBe('pass');
    expect(answer(judge('hydrogen-sulphide', 6, 5))).toMatchObject({ verdict: 'stop', source: 'job' });
    expect(answer(judge('oxygen', 19.8, null, 20)).verdict).toBe('stop');
  });

  it('never lets a site be looser', () => {
    expect(reason(judge('flammable', 0, 10))).toBe('site-limit-looser');
    expect(reason(judge('hydrogen-sulphide', 0, 11))).toBe('site-limit-looser');
    expect(reason(judge('carbon-monoxide', 0, 50))).toBe('site-limit-looser');
    expect(reason(judge('oxygen', 20.9, null, 19))).toBe('site-limit-looser');
    expect(reason(judge('oxygen', 20.9, 24))).toBe('site-limit-looser');
  });

  it('sends a meter that reads below zero back', () => expect(reason(judge('flammable', -1))).toBe('below-range'));
});
