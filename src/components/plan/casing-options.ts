import { CASING_TABLE, type CasingRow } from '../../../shared/calculations/casing-table';
import { printInches } from '../../../shared/units/print-inches';
import type { Sayer } from '../../composables/say';
import { keyOfRow } from '../../stores/planning/casing-choice';

/** A diameter as it may be typed into the search: `9 5/8`, `9-5/8`, `9.625`. */
const spellings = (odIn: number): string[] => {
  const fraction = printInches(odIn, 64);
  return [...new Set([fraction, fraction.replace(' ', '-'), String(odIn)])];
};

const wordsOf = ({ odIn, weightLbFt, grade }: CasingRow): string =>
  spellings(odIn)
    .flatMap((od) => [`${od} ${weightLbFt} ${grade}`, `${od} ${grade} ${weightLbFt}`])
    .join('; ');

/** The rows of the casing table as a list to search in, and the way to a row of one's own. */
export function casingOptions({ say, quantity }: Sayer): { value: string; label: string; words: string }[] {
  const rows = CASING_TABLE.map((row) => ({
    value: keyOfRow(row),
    label: say('plan.casing.option', {
      od: quantity(String(row.odIn), 'in'),
      weight: row.weightLbFt,
      grade: row.grade,
    }),
    words: wordsOf(row),
  }));
  const own = say('plan.casing.own');
  return [...rows, { value: 'own', label: own, words: own }];
}
