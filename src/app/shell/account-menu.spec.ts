import { initialsOf } from './account-menu';

describe('initialsOf', () => {
  it('takes the first and the last name', () => {
    expect(initialsOf('Wren Adler')).toBe('WA');
    expect(initialsOf('Ada van der Berg')).toBe('AB');
  });

  it('copes with one name, no name and letters beyond the plain ones', () => {
    expect(initialsOf('wren')).toBe('W');
    expect(initialsOf('  ')).toBe('?');
    expect(initialsOf('öykü Łuk')).toBe('ÖŁ');
  });
});
