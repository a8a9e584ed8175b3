import { ServerProblem } from '../server/server-problem';

/** What to tell somebody whose sign-in did not work; nothing they typed is lost. */
export function signInWords(error: unknown): string {
  if (!(error instanceof ServerProblem)) return 'Something went wrong here in the app. Reload the page and try again.';
  if (error.kind === 'unreachable')
    return "The server can't be reached. What you typed is still here: try again in a moment.";
  if (error.is('tooManyAttempts')) return `Too many attempts. ${waitWords(error.retryAfter)}`;
  if (error.is('wrongCredentials'))
    return 'E-mail address or password is wrong. Capital and small letters count in the password.';
  return error.message;
}

function waitWords(seconds: number | null): string {
  if (seconds === null || seconds <= 0) return 'Wait a while and try again.';
  if (seconds <= 90) return `Wait ${Math.ceil(seconds)} seconds and try again.`;
  return `Wait ${Math.ceil(seconds / 60)} minutes and try again.`;
}
