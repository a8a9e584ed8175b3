/** The environment, typed. A wrong value stops the start with a sentence that names it. */
import { resolve } from 'node:path';
import { z } from 'zod';
import { PLAIN_LINE } from '../shared/part/schema';
import { PACKAGE_ROOT } from './package-root';

export const LOG_LEVELS = ['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent'] as const;
export type ShopKind = 'demo' | 'own';

export interface Config {
  readonly port: number;
  readonly host: string;
  readonly dataDir: string;
  readonly shop: ShopKind;
  /** Renames an own shop; null keeps the name that the data directory holds. */
  readonly shopName: string | null;
  /** Null: made once and kept in the data directory. */
  readonly sessionSecret: string | null;
  readonly logLevel: (typeof LOG_LEVELS)[number];
  /** How many proxies in front of this process are to be believed about the caller's address. */
  readonly trustedProxies: number;
}

/** Something the person who starts the server can put right; shown as a sentence, without a stack. */
export class StartRefused extends Error {}

const wholeNumber = (name: string, least: number, most: number, initial: number) =>
  z
    .string()
    .regex(/^\d{1,6}$/)
    .transform(Number)
    .pipe(z.number().min(least).max(most))
    .default(initial)
    .catch(() => {
      throw new StartRefused(`${name} must be a whole number from ${least} to ${most}.`);
    });

const oneOf = <const T extends readonly string[]>(name: string, words: T, initial: T[number]) =>
  z
    .enum(words)
    .default(initial as never)
    .catch(() => {
      throw new StartRefused(`${name} must be one of: ${words.join(', ')}.`);
    });

const environment = (shop: ShopKind) =>
  z.object({
    // 0 lets the system choose a free port; the start message says which.
    PORT: wholeNumber('PORT', 0, 65535, 4300),
    // Nothing listens beyond this machine until somebody says so.
    HOST: z.string().default('127.0.0.1'),
    DATA_DIR: z.string().default('data'),
    SHOP: oneOf('SHOP', ['demo', 'own'], shop),
    SHOP_NAME: z
      .string()
      .trim()
      .max(80, 'SHOP_NAME has 80 characters at most.')
      .regex(PLAIN_LINE, 'SHOP_NAME is one line of plain text.')
      .optional()
      .catch(({ error }) => {
        throw new StartRefused(error.issues[0]?.message);
      }),
    SESSION_SECRET: z
      .string()
      .min(32)
      .optional()
      .catch(() => {
        throw new StartRefused('SESSION_SECRET needs 32 characters or more; leave it out to have one made.');
      }),
    LOG_LEVEL: oneOf('LOG_LEVEL', LOG_LEVELS, 'warn'),
    TRUST_PROXY: wholeNumber('TRUST_PROXY', 0, 10, 0),
  });

/** @param shop the kind of shop where the environment names none */
export function readConfig(env: Record<string, string | undefined>, shop: ShopKind = 'demo'): Config {
  // An empty variable is how shells and unit files say "not set".
  const given = Object.fromEntries(Object.entries(env).filter(([, value]) => value !== undefined && value !== ''));
  const values = environment(shop).parse(given);
  return {
    port: values.PORT,
    host: values.HOST,
    dataDir: resolve(PACKAGE_ROOT, values.DATA_DIR),
    shop: values.SHOP,
    shopName: values.SHOP_NAME || null,
    sessionSecret: values.SESSION_SECRET ?? null,
    logLevel: values.LOG_LEVEL,
    trustedProxies: values.TRUST_PROXY,
  };
}
