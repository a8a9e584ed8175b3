import { STARTING_SECTIONS } from '@shared/part/starting-sections';
import { draftFrom } from './draft-document';
import { sampleValues } from './sample-values';
import { SECTION_SEATS } from './section-seats';

describe('SECTION_SEATS', () => {
  it('names every starting section and a leg that it has', () => {
    for (const { id } of STARTING_SECTIONS) {
      const { solved } = draftFrom(sampleValues({ section: id }), null);
      expect(solved?.formed?.envelope?.seat).withContext(id).toBe(SECTION_SEATS.get(id));
    }
  });

  it('gives the formed part the height that its sizes speak of', () => {
    for (const id of ['channel', 'z', 'hat', 'lipped-channel']) {
      const { solved } = draftFrom(sampleValues({ section: id }), null);
      expect(solved?.formed?.envelope?.height).withContext(id).toBeCloseTo(1, 6);
    }
  });
});
