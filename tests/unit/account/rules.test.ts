import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { commonPasswords } from '../../../shared/account/common-passwords';
import { refusePassword } from '../../../shared/account/password-rules';
import { refusePin } from '../../../shared/account/pin-rules';
import { demoPeople } from '../../../server/demo/people';

const about = { email: 'calder@headfast.example', name: 'W. Calder' };

describe('a password', () => {
  it('needs fifteen characters as a person counts them', () => {
    expect(refusePassword('plug in the box', about)).toBeNull();
    expect(refusePassword('plug in the bo', about)).toBe('too-short');
    expect(refusePassword('🔥🔩🔧🧲🪛🧤🥽🪜🧰⛓🔗🪝⚙📐', about)).toBe('too-short');
  });

  it('follows no rule of composition', () => {
    expect(refusePassword('only small letters here', about)).toBeNull();
  });

  it('is refused when it is built from nothing but a common word', () => {
    for (const word of commonPasswords) {
      const repeated = word.repeat(Math.ceil(15 / word.length));
      expect(refusePassword(repeated, about), repeated).not.toBeNull();
      expect(refusePassword(`${repeated}!99`, about), repeated).not.toBeNull();
    }
  });

  it('is refused when it holds a part of the name or address', () => {
    expect(refusePassword('my name is CALDER ok', about)).toBe('contains-you');
  });
});

describe('a PIN', () => {
  it('is taken when it is neither run nor repetition', () => {
    for (const pin of ['402917', '83910274', '100372']) expect(refusePin(pin), pin).toBeNull();
  });

  it('is refused as a run from any digit, up or down, by any step', () => {
    fc.assert(
      fc.property(fc.nat(9), fc.integer({ min: 1, max: 9 }), fc.integer({ min: 6, max: 12 }), (first, step, length) => {
        const pin = Array.from({ length }, (_, at) => (first + at * step) % 10).join('');
        expect(refusePin(pin)).not.toBeNull();
      }),
    );
  });

  it('is refused when one group fills it', () => {
    for (const pin of ['111111', '121212', '123123', '47114711', '9090909'])
      expect(refusePin(pin), pin).toBe('repeats');
  });
});

describe('the demo accounts', () => {
  it.each(demoPeople.map((person) => [person.name, person] as const))('keep the rules: %s', (_name, person) => {
    expect(refusePassword(person.password, person)).toBeNull();
    expect(refusePin(person.pin)).toBeNull();
  });

  it('never mix a role of the firm with one of a guest', () => {
    for (const { roles } of demoPeople) {
      const firm = roles.some((role) => role === 'welder' || role === 'coordinator');
      const guest = roles.some((role) => role !== 'welder' && role !== 'coordinator');
      expect(firm && guest).toBe(false);
    }
  });
});
