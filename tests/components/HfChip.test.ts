import { describe, expect, it } from 'vitest';
import HfChip from '../../src/components/app/HfChip.vue';
import { chips, type ChipKind } from '../../src/components/app/chips';
import { mountWithWords } from './mount-with-words';

describe('a chip', () => {
  it('carries a word and an icon for every state and verdict', () => {
    for (const kind of Object.keys(chips) as ChipKind[]) {
      const chip = mountWithWords(HfChip, { kind });
      expect(chip.text(), kind).toMatch(/^[A-Z][a-z ]+$/);
      expect(chip.find('svg').attributes('aria-hidden')).toBe('true');
    }
  });

  it('says by how much when it is told', () => {
    expect(mountWithWords(HfChip, { kind: 'outside', label: 'Outside by 1/16 in' }).text()).toBe('Outside by 1/16 in');
  });

  it('takes straw, purple and blue as a point goes from open to presented to released', () => {
    const tone = (kind: ChipKind) => mountWithWords(HfChip, { kind }).attributes('data-tone');
    expect((['open', 'presented', 'released'] as const).map(tone)).toEqual(['open', 'presented', 'released']);
    expect(tone('sent-back')).toBe('outside');
  });
});
