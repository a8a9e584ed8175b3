/** Passwords: hashed with bcrypt, which reads 72 bytes and no more, so that a longer one is never accepted by its beginning. */
import bcrypt from 'bcryptjs';

export const PASSWORD_LEAST = 12;
export const PASSWORD_MOST_BYTES = 72;
const COST = 12;

/** Words that a guess tries first; a password is not made of one of them and filler. */
const COMMON = [
  'password',
  'passwort',
  'qwerty',
  'qwertz',
  'letmein',
  'leafwright',
  'welcome',
  'administrator',
  '123456',
];

/** Null, or what is wrong with a new password. */
export function passwordFault(password: string): string | null {
  if ([...password].length < PASSWORD_LEAST) return `Use ${PASSWORD_LEAST} characters or more.`;
  if (Buffer.byteLength(password) > PASSWORD_MOST_BYTES) return `Use ${PASSWORD_MOST_BYTES} bytes at most.`;
  if (password.includes('\0')) return 'Use characters that can be typed.';
  if (new Set(password).size < 5) return 'Use more than a few different characters.';
  const folded = password.toLowerCase();
  const common = COMMON.find((word) => folded.includes(word) && folded.replaceAll(word, '').length < 8);
  return common === undefined ? null : `“${common}” is guessed first. Choose something else.`;
}

export const hashPassword = (password: string, cost = COST): Promise<string> => bcrypt.hash(password, cost);

/** Compared with when there is no such account, so that the time taken does not tell. Of random bytes that nobody kept. */
const NOBODY = '$2b$12$p6HwbQibXu4TjDdFUuiM7O1TnQt.5foHzVPaNc.1d2kw7KxZX/rve';

export async function passwordMatches(password: string, hash: string | null): Promise<boolean> {
  const readable = Buffer.byteLength(password) <= PASSWORD_MOST_BYTES;
  const matches = await bcrypt.compare(readable ? password : '', hash ?? NOBODY);
  return matches && readable && hash !== null;
}
