import path from 'node:path';
import { z } from 'zod';

const loopback = new Set(['127.0.0.1', '::1', 'localhost']);

const flag = z.enum(['0', '1', 'false', 'true']).transform((word) => word === '1' || word === 'true');
const port = z.coerce.number().int().min(0).max(65535);

const schema = z.object({
  HEADFAST_HOME: z.string().min(1).optional(),
  HOST: z.string().min(1).default('127.0.0.1'),
  PORT: port.default(4180),
  /** the address that people open, when it is another than host and port: behind a proxy, or on a phone */
  PUBLIC_ORIGIN: z.url({ protocol: /^https?$/ }).optional(),
  /** how many proxies stand in front, or their addresses; false when none */
  TRUST_PROXY: z.string().default('false'),
  TLS_CERT: z.string().min(1).optional(),
  TLS_KEY: z.string().min(1).optional(),
  DATABASE_HOST: z.string().default('127.0.0.1'),
  DATABASE_PORT: port,
  DATABASE_NAME: z.string().min(1),
  DATABASE_USER: z.string().min(1),
  DATABASE_PASSWORD: z.string().min(1),
  DATABASE_OWNER_USER: z.string().min(1).optional(),
  DATABASE_OWNER_PASSWORD: z.string().min(1).optional(),
  DATABASE_POOL: z.coerce.number().int().min(1).max(200).default(20),
  KEYS_DIR: z.string().min(1).optional(),
  UPLOADS_DIR: z.string().min(1).optional(),
  CLIENT_DIR: z.string().min(1).optional(),
  DEMO: flag.default(false),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']).default('info'),
  SESSION_IDLE_HOURS: z.coerce.number().positive().max(72).default(12),
  SESSION_LONGEST_HOURS: z.coerce.number().positive().max(720).default(168),
});

/** Everything that may differ between two installations, read once. */
export type Config = ReturnType<typeof readConfig>;

/** The environment does not make sense; the message says which name and why, and never a value. */
export class ConfigError extends Error {}

/** Reads the settings from an environment, all problems at once. */
export function readConfig(environment: Readonly<Record<string, string | undefined>>) {
  const given = Object.fromEntries(Object.entries(environment).filter(([, value]) => value !== ''));
  const parsed = schema.safeParse(given);
  if (!parsed.success) {
    const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
    throw new ConfigError(`The configuration is not complete:\n${lines.join('\n')}`);
  }
  const env = parsed.data;
  const home = path.resolve(env.HEADFAST_HOME ?? process.cwd());
  const tls = tlsFiles(env.TLS_CERT, env.TLS_KEY);
  const onLoopback = loopback.has(env.HOST);
  const origin = env.PUBLIC_ORIGIN && new URL(env.PUBLIC_ORIGIN).origin;
  const secure = origin ? origin.startsWith('https:') : tls !== null;
  refuseUnsafe({ onLoopback, secure, demo: env.DEMO, origin });
  if (secure && !tls && env.TRUST_PROXY === 'false') {
    throw new ConfigError(
      'PUBLIC_ORIGIN is https: set TRUST_PROXY to the number of proxies in front, or TLS_CERT and TLS_KEY.',
    );
  }
  return {
    home,
    host: env.HOST,
    port: env.PORT,
    tls,
    publicOrigin: origin ?? null,
    secure,
    trustProxy: proxies(env.TRUST_PROXY),
    database: {
      host: env.DATABASE_HOST,
      port: env.DATABASE_PORT,
      name: env.DATABASE_NAME,
      user: env.DATABASE_USER,
      password: env.DATABASE_PASSWORD,
      ownerUser: env.DATABASE_OWNER_USER ?? null,
      ownerPassword: env.DATABASE_OWNER_PASSWORD ?? null,
      pool: env.DATABASE_POOL,
    },
    keysDir: path.resolve(home, env.KEYS_DIR ?? '.data/keys'),
    uploadsDir: path.resolve(home, env.UPLOADS_DIR ?? 'uploads'),
    clientDir: path.resolve(home, env.CLIENT_DIR ?? 'dist/client'),
    demo: env.DEMO,
    logLevel: env.LOG_LEVEL,
    session: { idleMs: env.SESSION_IDLE_HOURS * 3_600_000, longestMs: env.SESSION_LONGEST_HOURS * 3_600_000 },
  };
}

function tlsFiles(cert: string | undefined, key: string | undefined) {
  if (!cert !== !key)
    throw new ConfigError('TLS_CERT and TLS_KEY go together: the certificate and its key as PEM files.');
  return cert && key ? { cert, key } : null;
}

function refuseUnsafe(now: { onLoopback: boolean; secure: boolean; demo: boolean; origin: string | undefined }) {
  const open = !now.onLoopback || (now.origin !== undefined && !loopback.has(new URL(now.origin).hostname));
  if (now.demo && open) throw new ConfigError('DEMO=1 works on loopback only: its passwords are known to everybody.');
  if (open && !now.secure) {
    throw new ConfigError(
      'Off loopback people need https: set TLS_CERT and TLS_KEY, or PUBLIC_ORIGIN=https://... behind a proxy.',
    );
  }
}

/** `false`, a number of hops, or a list of addresses: the three forms that Express knows. */
function proxies(word: string): boolean | number | string {
  if (word === 'false') return false;
  if (word === 'true')
    throw new ConfigError('TRUST_PROXY needs a number of proxies or their addresses; true would trust everybody.');
  return /^\d+$/.test(word) ? Number(word) : word;
}
