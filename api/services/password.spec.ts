import bcrypt from 'bcryptjs';
import { hashPassword, passwordFault, passwordMatches } from './password';

describe('a new password', () => {
  for (const good of ['bend-allowance', 'x7%kQ-pW3!ab', 'ä'.repeat(8) + 'bcde', 'abcdefgh'.repeat(9)]) {
    it(`may be ${good.slice(0, 20)}`, () => {
      expect(passwordFault(good)).toBeNull();
    });
  }

  for (const [bad, words] of [
    ['elevenchars', 'Use 12 characters or more.'],
    ['abcdefgh'.repeat(9) + 'x', 'Use 72 bytes at most.'],
    ['ä'.repeat(32) + 'bcdefghij', 'Use 72 bytes at most.'],
    ['aaaabbbbccccdddd', 'Use more than a few different characters.'],
    ['Password12345', '“password” is guessed first. Choose something else.'],
    ['qwertyqwerty1', '“qwerty” is guessed first. Choose something else.'],
    ['with\0a nought', 'Use characters that can be typed.'],
  ] as const) {
    it(`may not be ${JSON.stringify(bad).slice(0, 20)}`, () => {
      expect(passwordFault(bad)).toBe(words);
    });
  }
});

describe('a password', () => {
  it('matches its own hash only', async () => {
    const hash = await hashPassword('bend-allowance', 4);
    expect(await passwordMatches('bend-allowance', hash)).toBeTrue();
    expect(await passwordMatches('bend-allowancE', hash)).toBeFalse();
    expect(await passwordMatches('', hash)).toBeFalse();
    expect(await passwordMatches('bend-allowance', null)).toBeFalse();
  });

  it('of nobody is compared too, with a hash of the same cost, so that the time taken does not tell', async () => {
    const compare = spyOn<{ compare(password: string, hash: string): Promise<boolean> }>(
      bcrypt,
      'compare',
    ).and.resolveTo(false);
    expect(await passwordMatches('bend-allowance', null)).toBeFalse();
    const hash = compare.calls.mostRecent().args[1];
    expect(hash).toMatch(/^\$2b\$\d\d\$[./A-Za-z0-9]{53}$/);
    expect(bcrypt.getRounds(hash)).toBe(bcrypt.getRounds(await hashPassword('bend-allowance')));
  });

  it('is not taken by its first 72 bytes', async () => {
    const longest = 'x'.repeat(72);
    const hash = await hashPassword(longest, 4);
    expect(await passwordMatches(longest, hash)).toBeTrue();
    expect(await passwordMatches(`${longest}y`, hash)).toBeFalse();
  });
});
