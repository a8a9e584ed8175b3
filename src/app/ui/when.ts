const STEPS: readonly (readonly [Intl.RelativeTimeFormatUnit, number])[] = [
  ['day', 86_400],
  ['hour', 3_600],
  ['minute', 60],
];
const RELATIVE = new Intl.RelativeTimeFormat('en', { numeric: 'auto' });
// Day, month by name, year: nobody can read it the wrong way round.
const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
const MOMENT = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeStyle: 'medium' });
const A_WEEK = 7 * 86_400;

/** "just now", "3 hours ago", "yesterday"; from a week on the day itself. */
export function sinceWords(iso: string, now: number = Date.now()): string {
  const then = Date.parse(iso);
  if (Number.isNaN(then)) return '—';
  // A clock that runs a little ahead of the server's must not say "in 2 minutes".
  const seconds = Math.max(0, Math.floor((now - then) / 1000));
  if (seconds >= A_WEEK) return DAY.format(then);
  for (const [unit, length] of STEPS) {
    if (seconds >= length) return RELATIVE.format(-Math.floor(seconds / length), unit);
  }
  return 'just now';
}

/** The exact moment, on this computer's clock. */
export function momentWords(iso: string): string {
  const then = Date.parse(iso);
  return Number.isNaN(then) ? '' : MOMENT.format(then);
}
