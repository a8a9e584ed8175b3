import { lengthIn } from './change-unit';

describe('lengthIn', () => {
  const start = { in: '0.040', mm: '1' };

  it('takes the other start value where nothing was typed', () => {
    expect(lengthIn('0.040', start, 'in', 'mm')).toBe('1');
    expect(lengthIn('1', start, 'mm', 'in')).toBe('0.040');
  });

  it('keeps a typed length the same length, exactly', () => {
    expect(lengthIn('1/64', start, 'in', 'mm')).toBe('0.396875');
    expect(lengthIn('1 1/8', start, 'in', 'mm')).toBe('28.575');
    expect(lengthIn('25.4', start, 'mm', 'in')).toBe('1');
  });

  it('leaves alone what it can not read', () => {
    expect(lengthIn('thick', start, 'in', 'mm')).toBe('thick');
    expect(lengthIn('', { in: '', mm: '' }, 'in', 'mm')).toBe('');
  });
});
