/**
 * Slows down whoever tries passwords. Failures are counted by account and address together, so that nobody can lock out the
 * person whose account it is; more loosely by account, against a guess from many addresses; and by address, against one guess
 * at many accounts. Only what has failed counts, and each attempt is judged when its turn comes: one password is compared at a
 * time, so that guesses sent all at once do not slip past the count, nor take the whole server.
 */
import { createHash } from 'node:crypto';
import { ipKeyGenerator, MemoryStore, type Options } from 'express-rate-limit';
import { OneAtATime } from '../models/one-at-a-time';
import { ProblemError } from './problem';

export interface SignInLimits {
  readonly windowMs: number;
  readonly perAddress: number;
  readonly perAccountAndAddress: number;
  readonly perAccount: number;
}

export const SIGN_IN_LIMITS: SignInLimits = {
  windowMs: 15 * 60 * 1000,
  perAddress: 60,
  perAccountAndAddress: 10,
  perAccount: 100,
};

/** A comparison takes a third of a second: who would wait longer than this is asked to come again. */
const QUEUE = { patience: 30_000, most: 90 };

interface Count {
  readonly key: string;
  readonly limit: number;
}

const digest = (text: string): string => createHash('sha256').update(text).digest('base64url');

export interface SignInGuard {
  /** Runs the check unless too many have failed; null from it counts as a failure. */
  attempt<T>(who: { email: string; address: string }, check: () => Promise<T | null>): Promise<T | null>;
  /** Ends the clock by which old failures are forgotten. */
  stop(): void;
}

export function signInGuard(limits: SignInLimits): SignInGuard {
  const failures = new MemoryStore();
  // The store reads nothing else of what the library's own middleware would give it.
  failures.init({ windowMs: limits.windowMs } as Options);
  const queue = new OneAtATime(QUEUE);

  const countsOf = ({ email, address }: { email: string; address: string }): Count[] => {
    const from = ipKeyGenerator(address);
    const account = digest(email.toLowerCase());
    return [
      { key: `address ${from}`, limit: limits.perAddress },
      { key: `both ${account} ${from}`, limit: limits.perAccountAndAddress },
      { key: `account ${account}`, limit: limits.perAccount },
    ];
  };

  async function refuse(counts: readonly Count[]): Promise<void> {
    for (const { key, limit } of counts) {
      const known = await failures.get(key);
      // The store forgets in sweeps: what it still knows may be over.
      const left = (known?.resetTime?.getTime() ?? 0) - Date.now();
      if (known === undefined || known.totalHits < limit || left <= 0) continue;
      const seconds = Math.ceil(left / 1000);
      const minutes = Math.ceil(seconds / 60);
      const detail = `Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`} and try again.`;
      throw new ProblemError('tooManyAttempts', { detail }, seconds);
    }
  }

  return {
    async attempt(who, check) {
      const counts = countsOf(who);
      // Before the queue too: who is refused already does not wait, and keeps nobody waiting.
      await refuse(counts);
      return queue.run(async () => {
        await refuse(counts);
        const found = await check();
        if (found === null) for (const { key } of counts) await failures.increment(key);
        return found;
      });
    },
    stop: () => failures.shutdown(),
  };
}
