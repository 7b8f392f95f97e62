import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson } from '../../shared/ledger/canonical-json';

describe('canonical JSON', () => {
  // RFC 8785, section 3.2.2 and 3.2.3: the worked example with numbers, escapes and key order
  it('prints the worked example of RFC 8785 3.2.2', () => {
    const input = {
      numbers: [Number('333333333.33333329'), 1e30, 4.5, 2e-3, 0.000000000000000000000000001],
      string: '\u20ac$\u000F\u000aA\'\u0042\u0022\u005c\\"/',
      literals: [null, true, false],
    };
    expect(canonicalJson(input)).toBe(
      '{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"}',
    );
  });

  // RFC 8785, section 3.2.3: keys are sorted by UTF-16 code units, so an emoji sorts before U+FB33
  it('sorts keys as the example of RFC 8785 3.2.3', () => {
    const input = {
      '\u20ac': 'Euro Sign',
      '\r': 'Carriage Return',
      '\ufb33': 'Hebrew Letter Dalet With Dagesh',
      '1': 'One',
      '\ud83d\ude00': 'Emoji: Grinning Face',
      '\u0080': 'Control',
      '\u00f6': 'Latin Small Letter O With Diaeresis',
    };
    expect(Object.values(JSON.parse(canonicalJson(input)) as object)).toHaveLength(7);
    const order = [...canonicalJson(input).matchAll(/:"([^"]+)"/g)].map((match) => match[1]);
    expect(order).toEqual([
      'Carriage Return',
      'One',
      'Control',
      'Latin Small Letter O With Diaeresis',
      'Euro Sign',
      'Emoji: Grinning Face',
      'Hebrew Letter Dalet With Dagesh',
    ]);
  });

  // RFC 8785, appendix B: number samples
  it.each([
    [0, '0'],
    [-0, '0'],
    [5e-324, '5e-324'],
    [1.7976931348623157e308, '1.7976931348623157e+308'],
    [9007199254740992, '9007199254740992'],
    [295147905179352830000, '295147905179352830000'],
    [1e21, '1e+21'],
    [9.999999999999997e22, '9.999999999999997e+22'],
    [1e-7, '1e-7'],
  ])('prints %d as RFC 8785 appendix B does', (value, printed) => {
    expect(canonicalJson(value)).toBe(printed);
  });

  it('refuses what JSON cannot hold', () => {
    expect(() => canonicalJson(Number.NaN)).toThrow(TypeError);
    expect(() => canonicalJson({ a: Number.POSITIVE_INFINITY })).toThrow(TypeError);
    expect(() => canonicalJson('\ud800')).toThrow(TypeError);
    expect(() => canonicalJson(() => 1)).toThrow(TypeError);
  });

  it('is read back as the same value and printed the same whatever the order of keys', () => {
    fc.assert(
      fc.property(fc.jsonValue(), (value) => {
        const printed = canonicalJson(value);
        expect(canonicalJson(JSON.parse(printed))).toBe(printed);
      }),
    );
  });
});
