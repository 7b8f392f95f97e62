import { describe, expect, it } from 'vitest';
import HfPinPad from '../../src/components/app/HfPinPad.vue';
import { mountWithWords } from './mount-with-words';

const pad = (props: Record<string, unknown> = {}) => mountWithWords(HfPinPad, { confirmLabel: 'Release', ...props });
type Pad = ReturnType<typeof pad>;

async function press(on: Pad, digits: string): Promise<void> {
  for (const digit of digits)
    await on
      .findAll('.keys button')
      .find((key) => key.text() === digit)
      ?.trigger('click');
}

describe('the pad for signing', () => {
  it('takes the PIN from its keys, the same digit twice in a row included', async () => {
    const signing = pad();
    await press(signing, '480913');
    await press(signing, '11');
    await signing.find('form').trigger('submit');
    expect(signing.emitted('submit')).toEqual([[{ pin: '48091311' }]]);
  });

  it('takes the PIN from a keyboard, digits only', async () => {
    const signing = pad();
    await signing.find('input').setValue('48 09-13x');
    await signing.find('form').trigger('submit');
    expect(signing.emitted('submit')).toEqual([[{ pin: '480913' }]]);
  });

  it('rubs out the last digit', async () => {
    const signing = pad();
    await press(signing, '4809135');
    await signing.find('[aria-label="Rub out the last digit"]').trigger('click');
    await signing.find('form').trigger('submit');
    expect(signing.emitted('submit')).toEqual([[{ pin: '480913' }]]);
  });

  it('asks for six digits before anything is sent', async () => {
    const signing = pad();
    await press(signing, '48091');
    await signing.find('form').trigger('submit');
    expect(signing.emitted('submit')).toBeUndefined();
    expect(signing.text()).toContain('six digits');
  });

  it('asks for the password as well when the session is not fresh', async () => {
    const signing = pad({ needsPassword: true });
    await press(signing, '480913');
    await signing.find('form').trigger('submit');
    expect(signing.emitted('submit')).toBeUndefined();
    await signing.find('input[autocomplete="current-password"]').setValue('lanterns over quiet water');
    await signing.find('form').trigger('submit');
    expect(signing.emitted('submit')).toEqual([[{ pin: '480913', password: 'lanterns over quiet water' }]]);
  });

  it('forgets the PIN once it is handed on, and sends nothing while busy', async () => {
    const signing = pad();
    await press(signing, '480913');
    await signing.find('form').trigger('submit');
    expect(signing.find('input').element.value).toBe('');
    await signing.setProps({ busy: true });
    await press(signing, '480913');
    await signing.find('form').trigger('submit');
    expect(signing.emitted('submit')).toHaveLength(1);
  });

  it('says what was wrong with the last try', () => {
    expect(pad({ error: 'That is not your signing PIN.' }).text()).toContain('That is not your signing PIN.');
  });
});
