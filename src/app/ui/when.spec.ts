import { momentWords, sinceWords } from './when';

describe('when', () => {
  const now = Date.parse('2026-05-20T12:00:00Z');
  const ago = (seconds: number): string => sinceWords(new Date(now - seconds * 1000).toISOString(), now);

  it('says how long ago something was, on both sides of every step', () => {
    expect(ago(0)).toBe('just now');
    expect(ago(59)).toBe('just now');
    expect(ago(60)).toBe('1 minute ago');
    expect(ago(3_599)).toBe('59 minutes ago');
    expect(ago(3_600)).toBe('1 hour ago');
    expect(ago(86_399)).toBe('23 hours ago');
    expect(ago(86_400)).toBe('yesterday');
    expect(ago(7 * 86_400 - 1)).toBe('6 days ago');
    expect(ago(7 * 86_400)).toMatch(/^1[23] May 2026$/);
  });

  it('never looks into the future when the clocks differ', () => {
    expect(ago(-120)).toBe('just now');
  });

  it('stays quiet about a moment that is none', () => {
    expect(sinceWords('never', now)).toBe('—');
    expect(momentWords('never')).toBe('');
  });
});
