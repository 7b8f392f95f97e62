import type { FieldDefinition } from '../../shared/hold-points/definition';
import type { Instrument } from '../../shared/job/plan';
import type { PrintedQuantity } from '../../shared/units/print-amount';
import type { PointWords } from './point-words';
import { useSay } from './say';

/** Prints a field's value the reader's way: number and unit apart, everything else in one piece. */
export function usePrintedReading(
  words: PointWords,
  instruments: () => readonly Instrument[],
): (field: Pick<FieldDefinition, 'key' | 'of'>, value: string) => PrintedQuantity {
  const { say, parts, instant } = useSay();

  return (field, value) => {
    const { of } = field;
    const plain = (text: string): PrintedQuantity => ({ value: text, unit: '' });
    switch (of.type) {
      case 'quantity':
        return parts(value, of.unit, of.difference);
      case 'check':
        return plain(say(value === 'yes' ? 'job.point.entry.yes' : 'job.point.entry.no'));
      case 'choice':
        return plain(words.choice(field.key, value));
      case 'time':
        return plain(instant(value));
      case 'instrument': {
        const found = instruments().find((one) => one.id === value);
        return plain(found === undefined ? value : `${found.name} ${found.serial}`);
      }
      case 'count':
      case 'text':
      case 'names':
      case 'welders':
        return plain(value);
    }
  };
}
