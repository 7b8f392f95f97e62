import { describe, expect, it } from 'vitest';
import { signedCommands } from '../../../shared/contracts/commands';
import { settingNames } from '../../../shared/job/plan';
import { refusalCodes } from '../../../shared/job/refusal';
import { understand } from '../../../shared/job/understand';
import { hasWords } from '../../../shared/locales/say';
import en from '../../../shared/locales/en';

const has = (key: string): boolean => hasWords(en, key);

describe('the working pages', () => {
  it.each([...Object.keys(refusalCodes), 'head-never-set', 'device-full'])('say why %s is refused', (code) => {
    expect(has(`refusals.${code}`)).toBe(true);
  });

  it.each(signedCommands)('say what a signature under %s means', (command) => {
    expect(has(`signature.${command}`)).toBe(true);
  });

  it.each(settingNames)('name the setting %s', (name) => {
    expect(has(`settings.${name}`)).toBe(true);
  });

  it.each([
    [{ type: 'count' }, '1.5'],
    [{ type: 'check' }, 'maybe'],
    [{ type: 'choice', choices: ['none'] }, 'some'],
    [{ type: 'time' }, 'noon'],
    [{ type: 'text' }, ' '],
    [{ type: 'quantity', unit: 'in' }, '3/0'],
    [{ type: 'quantity', unit: 'in' }, '20 psi'],
    [{ type: 'quantity', unit: 'in' }, 'twelve'],
  ] as const)('say why an answer to %o is not understood', (of, typed) => {
    const understood = understand({ key: 'any', of, required: true }, typed, null);
    expect(understood.ok).toBe(false);
    expect(understood.ok || has(`entry.${understood.reason}`)).toBe(true);
  });
});
