import { folded, numberKey, partKeys, searchWords } from './register-keys';

describe('register keys', () => {
  it('sort runs of digits by what they count', () => {
    const numbers = ['HC-10', 'HC-9', 'hc-9-2', 'HC-9-10', 'HC-100', 'A1', 'HC', '9', '10'];
    const sorted = [...numbers].sort((a, b) => (numberKey(a) < numberKey(b) ? -1 : 1));
    expect(sorted).toEqual(['9', '10', 'A1', 'HC', 'HC-9', 'hc-9-2', 'HC-9-10', 'HC-10', 'HC-100']);
  });

  it('hold for the longest number there can be', () => {
    expect(numberKey('9'.repeat(40)) > numberKey(`1${'0'.repeat(38)}`)).toBeTrue();
  });

  it('fold case and accents', () => {
    expect(folded('Spännring ÉLAN')).toBe('spannring elan');
  });

  it('take a search apart into words', () => {
    expect(searchWords('  Hat \t STRINGER ')).toEqual(['hat', 'stringer']);
    expect(searchWords('   ')).toEqual([]);
  });

  it('find no word across two fields', () => {
    const { searchText } = partKeys({ number: 'HC-1', title: 'Angle', material: '2024-T3' });
    expect(searchText).not.toContain('hc-1angle');
    expect(searchText).toContain('2024-t3');
  });
});
