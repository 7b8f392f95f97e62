import { describe, expect, it } from 'vitest';
import HfQuantityInput from '../../src/components/app/HfQuantityInput.vue';
import { mountWithWords } from './mount-with-words';

const typed = (modelValue: string, more: Record<string, unknown> = {}) =>
  mountWithWords(HfQuantityInput, { modelValue, unit: 'in', label: 'Height at 12', ...more });

describe('a quantity input', () => {
  it('echoes what it has read, with the unit', () => {
    expect(typed('14.375').text()).toContain('Read as 14 3/8\u00a0in');
    expect(typed("1' 2 3/8").text()).toContain('Read as 14 3/8\u00a0in');
    expect(typed('365 mm').text()).toContain('Read as 365\u00a0mm');
  });

  it('hands on what was typed, untouched', async () => {
    const input = typed('');
    await input.find('input').setValue('14-3/8');
    expect(input.emitted('update:modelValue')).toEqual([['14-3/8']]);
  });

  it('says what to type instead when it cannot read it', () => {
    const input = typed('143/8');
    expect(input.text()).toContain('14 3/8');
    expect(input.text()).not.toContain('Read as');
    expect(input.find('input').attributes('aria-invalid')).toBe('true');
  });

  it('stays quiet while it is empty', () => {
    const input = typed('');
    expect(input.text()).toBe('Height at 12in');
    expect(input.find('input').attributes('aria-invalid')).toBeUndefined();
  });

  it('has a name, a number pad, and its unit and error as description', () => {
    const input = typed('8 1/8', { error: 'Low by 1/8 in.' });
    const field = input.find('input');
    expect(input.find('label').attributes('for')).toBe(field.attributes('id'));
    expect(field.attributes('inputmode')).toBe('decimal');
    expect(field.attributes('type')).toBe('text');
    const described = field
      .attributes('aria-describedby')
      ?.split(' ')
      .map((id) => document.getElementById(id)?.textContent);
    expect(described).toEqual(['in', 'Read as 8 1/8\u00a0in', 'Low by 1/8 in.']);
  });
});
