import { describe, expect, it } from 'vitest';
import { hasWords } from '../../../shared/locales/say';
import en from '../../../shared/locales/en';
import { allKeys, paramsOf } from '../../support/words/all-keys';
import { anyPoints } from '../../support/words/any-point';
import { families } from '../../support/words/families';
import { keysWithParams, literalKeys, templateKeys } from '../../support/words/keys-in-source';
import { pointKeys, siteKeys } from '../../support/words/point-keys';

const has = (key: string): boolean => hasWords(en, key);
/** A weld is looked over hot and cold in the same words, and a crack in a cold one is never repaired on the spot. */
const shared = [
  'points.cooled-to-touch.fields.look.crack.how',
  'points.cooled-to-touch.choices.look.crack.state.repaired',
];

const literals = literalKeys();
const byFamily = families();
const enumerated = Object.values(byFamily).flat();
const points = anyPoints(12);
const ofPoints = [...new Set(points.flatMap(pointKeys))];
const limits = [...new Set(points.flatMap(({ verdicts }) => verdicts.map(({ text }) => text.key)))].flatMap((key) =>
  ['within', 'outside'].map((outcome) => key.replace(/\.(within|outside)$/, `.${outcome}`)),
);
const actClock = ['limits.act-clock.within', 'limits.act-clock.outside'];

describe('every key has words', () => {
  it('where it is written out', () => {
    expect(literals.filter(({ key }) => !has(key)).map(({ key, file }) => `${key} in ${file}`)).toEqual([]);
  });

  it('where it is put together', () => {
    expect([...new Set(templateKeys().map(({ key }) => key))].sort()).toEqual(Object.keys(byFamily).sort());
    expect(enumerated.filter((key) => !has(key))).toEqual([]);
  });

  it('where a definition of a hold point makes it', () => {
    expect(ofPoints.filter((key) => !has(key))).toEqual([]);
    expect(siteKeys().filter((key) => !has(key))).toEqual([]);
  });

  it('where a limit is kept and where it is not', () => {
    expect([...limits, ...actClock].filter((key) => !has(key))).toEqual([]);
  });

  it('and is given whatever its sentence names', () => {
    const wanting = keysWithParams().flatMap(({ key, file, params }) =>
      params === null
        ? []
        : paramsOf(key)
            .filter((name) => !params.includes(name))
            .map((name) => `${name} of ${key} in ${file}`),
    );
    expect(wanting).toEqual([]);
  });
});

describe('no words', () => {
  it('stand there that nothing says', () => {
    const said = new Set([
      ...literals.map(({ key }) => key),
      ...enumerated,
      ...ofPoints,
      ...siteKeys(),
      ...limits,
      ...actClock,
      ...shared,
    ]);
    expect(allKeys().filter((key) => !said.has(key))).toEqual([]);
  });
});
