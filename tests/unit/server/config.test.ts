import { describe, expect, it } from 'vitest';
import { ConfigError, readConfig } from '../../../server/config';

const least = {
  DATABASE_PORT: '3307',
  DATABASE_NAME: 'headfast',
  DATABASE_USER: 'headfast_app',
  DATABASE_PASSWORD: 'a word that nobody prints',
};
const refusal = (environment: Record<string, string>): string => {
  try {
    readConfig(environment);
    return '';
  } catch (error) {
    return error instanceof ConfigError ? error.message : String(error);
  }
};

describe('the configuration', () => {
  it('needs the database alone and fills the rest', () => {
    expect(readConfig(least)).toMatchObject({
      host: '127.0.0.1',
      port: 4180,
      secure: false,
      demo: false,
      trustProxy: false,
      session: { idleMs: 12 * 3_600_000, longestMs: 168 * 3_600_000 },
    });
  });

  it('names everything that is wrong at once, and no value', () => {
    const message = refusal({ PORT: 'eighty', LOG_LEVEL: 'loud', DATABASE_PASSWORD: 'a word that nobody prints' });
    for (const name of ['PORT', 'LOG_LEVEL', 'DATABASE_NAME', 'DATABASE_USER']) expect(message).toContain(name);
    expect(message).not.toMatch(/eighty|nobody prints/);
  });

  it('allows the demo on loopback only', () => {
    expect(readConfig({ ...least, DEMO: '1' }).demo).toBe(true);
    const https = { PUBLIC_ORIGIN: 'https://headfast.example', TRUST_PROXY: '1' };
    expect(refusal({ ...least, ...https, DEMO: '1' })).toMatch(/loopback only/);
    expect(refusal({ ...least, ...https, HOST: '0.0.0.0', DEMO: '1' })).toMatch(/loopback only/);
  });

  it('asks for https off loopback', () => {
    expect(refusal({ ...least, HOST: '0.0.0.0' })).toMatch(/https/);
    expect(refusal({ ...least, PUBLIC_ORIGIN: 'http://headfast.example' })).toMatch(/https/);
    expect(readConfig({ ...least, HOST: '0.0.0.0', TLS_CERT: 'a.pem', TLS_KEY: 'b.pem' }).secure).toBe(true);
  });

  it('asks which proxy to trust when https ends in front of it', () => {
    expect(refusal({ ...least, PUBLIC_ORIGIN: 'https://headfast.example' })).toMatch(/TRUST_PROXY/);
    expect(refusal({ ...least, TRUST_PROXY: 'true' })).toMatch(/everybody/);
    const config = readConfig({ ...least, PUBLIC_ORIGIN: 'https://headfast.example/', TRUST_PROXY: '1' });
    expect(config).toMatchObject({ publicOrigin: 'https://headfast.example', secure: true, trustProxy: 1 });
  });

  it('wants certificate and key together', () => {
    expect(refusal({ ...least, TLS_CERT: 'a.pem' })).toMatch(/together/);
  });
});
