import { restore } from './restore';
import { materialNameSchema } from './schema';

const channel = (more: object = {}, leg: object = {}) => ({
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  allowance: { method: 'handbook' },
  chain: [{ leg: 1, ...leg }],
  ...more,
});

const errorsOf = (document: unknown) => {
  const restored = restore(document);
  return restored.ok ? [] : restored.errors;
};

/** First and last of each refused run, and what stands just outside of it. */
const REFUSED = [
  '\u0000',
  '\u001f',
  '\n',
  '\u007f',
  '\u009f',
  '\ud800',
  '\udfff',
  '\u202a',
  '\u202e',
  '\u2066',
  '\u2069',
];
const TAKEN = [' ', '~', '\u00a0', '\ud83d\ude00', '\u2029', '\u202f', '\u2065', '\u206a', '\u200e', 'é', '鈑', 'عب'];

describe('text for people in a document', () => {
  it('is one line of plain text', () => {
    for (const character of REFUSED) {
      const text = `a${character}b`;
      const code = character.charCodeAt(0).toString(16);
      for (const [document, path] of [
        [channel({}, { name: text }), 'chain/0/name'],
        [channel({ material: text }), 'material'],
        [channel({ material: { name: text } }), 'material/name'],
        [channel({ dashNumbers: [{ dash: '-1', title: text }] }), 'dashNumbers/0/title'],
        [channel({ dashNumbers: [{ dash: text }] }), 'dashNumbers/0/dash'],
      ] as const) {
        const [error, ...more] = errorsOf(document);
        expect(error?.path).withContext(`${path} ${code}`).toBe(path);
        expect(error?.message)
          .withContext(`${path} ${code}`)
          .toMatch(/plain text/);
        expect(more).toEqual([]);
      }
    }
  });

  it('may be in any writing', () => {
    for (const character of TAKEN) {
      const text = `a${character}b`;
      const document = channel({ material: text, dashNumbers: [{ dash: '-1', title: text }] }, { name: text });
      expect(errorsOf(document)).withContext(character.charCodeAt(0).toString(16)).toEqual([]);
    }
  });

  it('has 200 characters at most, a material 100 and a dash number 20', () => {
    for (const [most, make] of [
      [200, (text: string) => channel({}, { name: text })],
      [200, (text: string) => channel({ dashNumbers: [{ dash: '-1', title: text }] })],
      [100, (text: string) => channel({ material: text })],
      [100, (text: string) => channel({ material: { name: text } })],
      [20, (text: string) => channel({ dashNumbers: [{ dash: text }] })],
    ] as const) {
      expect(errorsOf(make('x'.repeat(most)))).toEqual([]);
      const [error] = errorsOf(make('x'.repeat(most + 1)));
      expect(error?.message).toContain(`${most} characters`);
    }
  });
});

describe('the name of a material', () => {
  it('is kept without the spaces round it', () => {
    expect(materialNameSchema.parse(' 2024-T3 ')).toBe('2024-T3');
    const restored = restore(channel({ material: ' 2024-T3 ' }));
    expect(restored.ok && restored.document.material).toBe('2024-T3');
  });

  it('is more than spaces', () => {
    expect(materialNameSchema.safeParse('   ').success).toBeFalse();
    expect(errorsOf(channel({ material: '   ' }))[0]?.path).toBe('material');
  });
});
