import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { Account } from '../../server/entities/account';
import { verifySigning } from '../../server/services/verify-signing';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';
import { hours } from '../support/test-clock';

describe('the secrets of a signature', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());
  beforeEach(() => test.database.app.query('DELETE FROM attempt_throttles'));

  const sign = (secrets: { pin?: string; password?: string }, openedHoursAgo = 1) =>
    verifySigning(test.deps, test.person('companyRep').id, secrets, {
      passwordAt: new Date(test.clock().getTime() - hours(openedHoursAgo)).toISOString(),
    });

  it('are the PIN alone within twelve hours of the password', async () => {
    const { pin } = test.person('companyRep');
    expect(await sign({ pin }, 11.99)).toEqual({ ok: true, components: 'pin' });
    expect(await sign({ pin }, 12)).toEqual({ ok: false, code: 'signing.password-needed' });
  });

  it('are password and PIN later', async () => {
    const { pin, password } = test.person('companyRep');
    expect(await sign({ pin, password }, 30)).toEqual({ ok: true, components: 'password-and-pin' });
    expect(await sign({ pin, password: 'not the password at all' }, 30)).toMatchObject({ code: 'signing.pin-wrong' });
    expect(await sign({ pin: '000001', password }, 30)).toMatchObject({ code: 'signing.pin-wrong' });
  });

  it('are password and PIN in a session that never had the password', async () => {
    const { pin } = test.person('companyRep');
    const answer = await verifySigning(test.deps, test.person('companyRep').id, { pin }, { passwordAt: null });
    expect(answer).toEqual({ ok: false, code: 'signing.password-needed' });
  });

  it("are not another person's", async () => {
    expect(await sign({ pin: test.person('welder').pin })).toMatchObject({ ok: false, code: 'signing.pin-wrong' });
    expect(await sign({})).toMatchObject({ ok: false, code: 'signing.pin-wrong' });
  });

  it('lock signing after six failures in a row, for the right PIN too, and open again', async () => {
    const { pin } = test.person('companyRep');
    for (let time = 0; time < 7; time += 1) expect(await sign({ pin: '482913' })).toMatchObject({ ok: false });
    expect(await sign({ pin })).toEqual({ ok: false, code: 'signing.locked', retryAfter: 60 });
    test.clock.advance(61_000);
    expect(await sign({ pin })).toMatchObject({ ok: true });
    expect(await sign({ pin: '482913' })).toMatchObject({ code: 'signing.pin-wrong' });
  });

  it('let nobody sign without a PIN', async () => {
    const { id } = test.person('secondCompanyRep');
    await test.database.app.getRepository(Account).update({ id }, { pinHash: null });
    const now = { passwordAt: test.clock().toISOString() };
    expect(await verifySigning(test.deps, id, { pin: '918472' }, now)).toMatchObject({ code: 'signing.no-pin' });
  });

  it('cannot be tried against the database alone: the same PIN has another hash under another key', async () => {
    const { pin } = test.person('welder');
    const other = { ...test.deps, keys: { ...test.deps.keys, pin: Buffer.alloc(32, 7) } };
    const now = { passwordAt: test.clock().toISOString() };
    expect(await verifySigning(other, test.person('welder').id, { pin }, now)).toMatchObject({ ok: false });
  });
});
