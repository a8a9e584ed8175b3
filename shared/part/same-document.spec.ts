import { sameDocument } from './same-document';

describe('sameDocument', () => {
  const document = { unit: 'in', thickness: 0.04, chain: [{ leg: 1, name: 'Web' }, { bend: 90 }, { leg: '2' }] };

  it('takes no notice of the order of fields, nor of fields that are undefined', () => {
    const turned = { width: undefined, chain: [{ name: 'Web', leg: 1 }, { bend: 90 }, { leg: '2' }] };
    expect(sameDocument(document, { ...turned, thickness: 0.04, unit: 'in' })).toBeTrue();
  });

  it('sees every difference', () => {
    for (const other of [
      { ...document, thickness: '0.04' },
      { ...document, width: 6 },
      { ...document, chain: document.chain.slice(0, 2) },
      { ...document, chain: [document.chain[2], document.chain[1], document.chain[0]] },
      { ...document, chain: { 0: { leg: 1, name: 'Web' }, 1: { bend: 90 }, 2: { leg: '2' } } },
      { ...document, chain: null },
      null,
      'text',
    ]) {
      expect(sameDocument(document, other)).withContext(JSON.stringify(other)).toBeFalse();
      expect(sameDocument(other, document)).withContext(JSON.stringify(other)).toBeFalse();
    }
  });
});
