import { measureEnds } from './measure';

describe('how the ends of a leg are measured', () => {
  it('is to the mold line when nothing is said', () => {
    expect(measureEnds({})).toEqual(['mold-line', 'mold-line']);
  });

  it('is said for both ends by one word, or for each by its own', () => {
    expect(measureEnds({ measure: 'inside' })).toEqual(['inside', 'inside']);
    expect(measureEnds({ measure: ['flat', 'outside-edge'] })).toEqual(['flat', 'outside-edge']);
  });
});
