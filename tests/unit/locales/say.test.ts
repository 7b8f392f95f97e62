import { describe, expect, it } from 'vitest';
import { printDay, printInstant } from '../../../shared/locales/print-instant';
import { say, type Formatters } from '../../../shared/locales/say';
import { printQuantity } from '../../../shared/units/format';

const messages = {
  cut: { low: 'Low by {by}. Limit {limit}, {source}.' },
  source: { job: "this job's setting" },
  unsent: { one: '1 waits', other: '{count} wait' },
  at: 'Presented {at}',
};
const formatters: Formatters = {
  quantity: (value, unit, difference) => printQuantity(value, unit, 'imperial', difference),
  instant: (iso) => printInstant(iso, 'America/Chicago', 'en'),
  day: (date) => printDay(date, 'en'),
  number: String,
};
const said = (key: string, params = {}) => say(messages, { key, params }, formatters);

describe('saying a text', () => {
  it('puts quantities, texts and moments in', () => {
    const params = {
      by: { quantity: '0.109375', unit: 'in' },
      limit: { quantity: '0.0625', unit: 'in' },
      source: { key: 'source.job' },
    };
    expect(said('cut.low', params)).toBe("Low by 7⁄64\u00a0in. Limit 1⁄16\u00a0in, this job's setting.");
    expect(said('at', { at: { instant: '2026-03-02T09:10:00Z' } })).toBe('Presented 02 Mar 2026 03:10');
    // a day has no zone: west of Greenwich it is still the same day
    expect(said('at', { at: { day: '2026-03-02' } })).toBe('Presented 02 Mar 2026');
  });

  it('chooses one or many by the count', () => {
    expect(said('unsent', { count: 1 })).toBe('1 waits');
    expect(said('unsent', { count: 3 })).toBe('3 wait');
  });

  it('leaves what is missing in sight instead of throwing', () => {
    expect(said('cut.high')).toBe('cut.high');
    expect(said('cut')).toBe('cut');
    expect(said('toString')).toBe('toString');
    expect(said('at')).toBe('Presented {at}');
  });

  it('does not read what a person typed as a message', () => {
    expect(said('at', { at: '{at} $& source.job' })).toBe('Presented {at} $& source.job');
  });
});
