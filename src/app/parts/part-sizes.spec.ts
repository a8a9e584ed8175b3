import { blankWords, thicknessWords } from './part-sizes';
import { sampleRow } from './sample-rows';

describe('part sizes', () => {
  it('says length and width of the blank with the unit', () => {
    expect(blankWords(sampleRow('1'))).toBe('3.758 × 6.000 in');
    expect(blankWords(sampleRow('1', { unit: 'mm', blankLength: 78.443, blankWidth: 60 }))).toBe('78.44 × 60.00 mm');
  });

  it('invents nothing that is not known', () => {
    expect(blankWords(sampleRow('1', { blankWidth: null }))).toBe('3.758 in');
    expect(blankWords(sampleRow('1', { blankLength: null }))).toBe('—');
    expect(thicknessWords(sampleRow('1', { thickness: null }))).toBe('—');
  });

  it('says the thickness', () => {
    expect(thicknessWords(sampleRow('1'))).toBe('0.040 in');
  });
});
