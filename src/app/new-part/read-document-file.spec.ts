import { LARGEST_FILE, readDocumentFile } from './read-document-file';

describe('readDocumentFile', () => {
  const document = {
    format: 'leafwright/1',
    unit: 'in',
    thickness: 0.04,
    allowance: { method: 'handbook' },
    chain: [{ leg: 1 }],
  };
  const read = (text: string) => readDocumentFile(new File([text], 'part.json'));
  const messages = async (text: string): Promise<string[]> => {
    const file = await read(text);
    return file.ok ? [] : file.errors.map((error) => `${error.path} ${error.message}`);
  };

  it('reads a bare document and one beside its shop context', async () => {
    for (const value of [document, { document, shop: {} }]) {
      const file = await read(JSON.stringify(value));
      expect(file.ok && file.document.thickness).toBe(0.04);
    }
  });

  it('says what is wrong with a file that is none', async () => {
    expect((await messages('{'))[0]).toContain('not JSON');
    expect((await messages('[]'))[0]).toContain('part document');
    expect((await messages(JSON.stringify({ ...document, colour: 'red' })))[0]).toContain('colour');
  });

  it('reads no huge file, on both sides of the limit', async () => {
    expect((await messages(' '.repeat(LARGEST_FILE + 1)))[0]).toContain('too large');
    expect((await messages(' '.repeat(LARGEST_FILE)))[0]).toContain('not JSON');
  });
});
