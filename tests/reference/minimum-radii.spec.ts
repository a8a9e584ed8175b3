import { minimumRadii } from '../../shared/reference/minimum-radii';

const read = (material: string, inches: number): string[] =>
  minimumRadii(material, inches).map(({ table, lower, upper }) => `${table}: ${lower}-${upper}`);

describe('Published minimum radii for 90° cold bends, in thicknesses', () => {
  it('AC 43.13-1B table 4-6 (read in a text copy): 2024-T3 2-4 at .032, 3-5 at .064, 5-7 at .258', () => {
    expect(read('2024-T3', 0.032)).toContain('AC 43.13-1B: 2-4');
    expect(read('2024-T3', 0.064)).toContain('AC 43.13-1B: 3-5');
    expect(read('2024-T3', 0.258)).toEqual(['AC 43.13-1B: 5-7']);
    expect(read('7075-O', 0.128)).toContain('AC 43.13-1B: 0.5-1.5');
    expect(read('6061-T4', 0.182)).toEqual(['AC 43.13-1B: 1.5-3']);
  });

  it('Aluminum Association table 3-1 (read in a text copy): 2024-T3 3 at 1/32 and 4 at 1/16, 5052-H34 2 at 1/8', () => {
    expect(read('2024-T3', 1 / 32)).toContain('Aluminum Association: 3-3');
    expect(read('2024-T3', 1 / 16)).toContain('Aluminum Association: 4-4');
    expect(read('5052-H34', 1 / 8)).toContain('Aluminum Association: 2-2');
    expect(read('2014-T6', 1 / 2)).toEqual(['Aluminum Association: 9.5-9.5']);
  });

  it('the two tables differ for 2024-T3 at .040, and both are kept', () => {
    expect(read('2024-T3', 0.04)).toEqual(['AC 43.13-1B: 3-5', 'Aluminum Association: 4-4']);
  });

  it('a thickness between two columns takes the thicker; a gage at a column takes that column', () => {
    expect(read('2024-T3', 0.033)).toContain('AC 43.13-1B: 3-5');
    expect(read('2024-T3', 0.032)).toContain('Aluminum Association: 3-3');
    expect(read('5052-H34', 0.063)).toContain('Aluminum Association: 1.5-1.5');
    expect(read('5052-H34', 0.0635)).toContain('Aluminum Association: 2-2');
  });

  it('clad sheet reads the row of its alloy; past the last column nothing is said', () => {
    expect(read('Alclad 2024-T3', 0.032)).toEqual(read('2024-T3', 0.032));
    expect(read('2024-T3', 0.3)).toEqual([]);
    expect(read('2024-t3', 0.03)).toEqual([]);
  });
});
