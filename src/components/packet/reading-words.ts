import type { FieldDefinition } from '../../../shared/hold-points/definition';
import type { JobState } from '../../../shared/job/state';
import type { PrintedQuantity } from '../../../shared/units/print-amount';
import type { PointWords } from '../../composables/point-words';
import { usePrintedReading } from '../../composables/printed-reading';

export type PrintReading = (field: Pick<FieldDefinition, 'key' | 'of'>, value: string) => PrintedQuantity;

/** Prints readings of a packet: as on the hold point's page, with welders by their names. */
export function useReadingWords(words: PointWords, state: () => JobState): PrintReading {
  const print = usePrintedReading(words, () => state().plan.instruments);
  return (field, value) => {
    if (field.of.type !== 'welders') return print(field, value);
    const names = value.split(',').map((said) => {
      const found = [...state().people, ...state().plan.people].find((one) => one.accountId === said.trim());
      return found?.name ?? said.trim();
    });
    return { value: names.join(', '), unit: '' };
  };
}

/** Figures are set large, words are not. */
export const isFigure = ({ of }: Pick<FieldDefinition, 'of'>): boolean => of.type === 'quantity' || of.type === 'count';
