import { draftFrom } from './draft-document';
import { sampleValues } from './sample-values';

describe('draftFrom', () => {
  const sized = (height: string, width = '2') => {
    const values = sampleValues();
    return { ...values, sizes: { ...values.sizes, channel: { height, width } } };
  };

  it('makes the channel of the handbook from overall sizes', () => {
    const { solved, messages } = draftFrom(sampleValues(), null);
    expect(messages).toEqual({});
    expect(solved?.legs.map((leg) => leg.flat.toFixed(2))).toEqual(['0.80', '1.60', '0.80']);
    expect(solved?.developedLength?.toFixed(3)).toBe('3.758');
  });

  it('makes the same from a typed chain', () => {
    const { solved, document } = draftFrom(sampleValues({ way: 'chain', chain: '1 up 90 r.16 2 up 90 1' }), null);
    expect(solved?.developedLength?.toFixed(3)).toBe('3.758');
    expect(document?.chain).toHaveSize(5);
  });

  it('leaves out what was left open', () => {
    const { document } = draftFrom(sampleValues(), null);
    expect(document).not.toEqual(jasmine.objectContaining({ material: jasmine.anything() }));
    expect(document?.width).toBeUndefined();
    const filled = draftFrom(sampleValues({ width: '6', material: ' 2024-T3 ' }), null).document;
    expect(filled?.material).toBe('2024-T3');
    expect(filled?.width).toBe(6);
  });

  it('reads a comma as the point of a plain figure, and a material of the table in any case', () => {
    const { document, messages } = draftFrom(sampleValues({ thickness: '0,040', material: '7075-t6' }), null);
    expect(messages).toEqual({});
    expect(document?.thickness).toBe('0.040');
    expect(document?.material).toBe('7075-T6');
    expect(draftFrom(sampleValues({ material: 'our own' }), null).document?.material).toBe('our own');
  });

  it('puts each message at the box it is about', () => {
    expect(Object.keys(draftFrom(sized('one'), null).messages)).toEqual(['size/height']);
    expect(Object.keys(draftFrom(sized('0'), null).messages)).toEqual(['size/height']);
    expect(Object.keys(draftFrom(sized(''), null).messages)).toEqual(['size/height']);
    expect(Object.keys(draftFrom(sampleValues({ thickness: '0' }), null).messages)).toEqual(['thickness']);
    expect(Object.keys(draftFrom(sampleValues({ thickness: '' }), null).messages)).toEqual(['thickness']);
    expect(Object.keys(draftFrom(sampleValues({ radius: '-1' }), null).messages)).toEqual(['radius']);
    expect(Object.keys(draftFrom(sampleValues({ width: 'wide' }), null).messages)).toEqual(['width']);
    expect(Object.keys(draftFrom(sampleValues({ method: 'k-factor', k: '2' }), null).messages)).toEqual(['k']);
  });

  it('has neither document nor figures while anything is broken', () => {
    const draft = draftFrom(sized('one'), null);
    expect(draft.document).toBeNull();
    expect(draft.solved).toBeNull();
  });

  it('points at the word of a typed chain', () => {
    const chain = '1 upp 90 r.16 2';
    const { chainErrors, messages } = draftFrom(sampleValues({ way: 'chain', chain }), null);
    expect(chain.slice(chainErrors[0]!.start, chainErrors[0]!.end)).toBe('upp');
    expect(messages['chain']).toBe(chainErrors[0]!.message);
  });

  it('asks for a chain where none is typed', () => {
    expect(draftFrom(sampleValues({ way: 'chain', chain: ' ' }), null).messages['chain']).toContain('Type the chain');
  });

  it('takes an imported document as it is, and says where it is broken', () => {
    const { document } = draftFrom(sampleValues(), null);
    const imported = draftFrom(sampleValues({ way: 'document', thickness: 'nonsense' }), document);
    expect(imported.document).toBe(document);
    const broken = draftFrom(sampleValues({ way: 'document' }), { ...document!, thickness: 'thin' });
    expect(broken.document).toBeNull();
    expect(broken.messages['document']).toMatch(/^thickness: /);
    expect(draftFrom(sampleValues({ way: 'document' }), null).document).toBeNull();
  });

  it('keeps the figures of a part with a stop: a draft may have one', () => {
    const { document, solved } = draftFrom(sized('0.1'), null);
    expect(document).not.toBeNull();
    expect(solved?.findings.map((finding) => finding.level)).toContain('stop');
  });
});
