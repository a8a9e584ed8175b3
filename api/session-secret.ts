/** The key that signs session cookies and request tokens: given, or made once and kept beside the database. */
import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { type Config, StartRefused } from './config';
import { startRefusal } from './start-refusal';

export function sessionSecret(config: Pick<Config, 'sessionSecret' | 'dataDir'>): string {
  if (config.sessionSecret) return config.sessionSecret;
  try {
    return keptSecret(join(config.dataDir, 'session-secret'));
  } catch (error) {
    throw startRefusal(error, config.dataDir);
  }
}

function keptSecret(file: string): string {
  if (!existsSync(file)) {
    // 'wx': of two processes that start together one makes the key, the other reads it below.
    try {
      writeFileSync(file, randomBytes(48).toString('base64url') + '\n', { mode: 0o600, flag: 'wx' });
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
    }
  }
  const secret = readFileSync(file, 'utf8').trim();
  if (secret.length < 32)
    throw new StartRefused(`${file} is too short for a secret. Remove it to have a new one made.`);
  return secret;
}
