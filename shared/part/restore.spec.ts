import { bendUp, partOf } from '../../tests/support/plain-part';
import { restore } from './restore';

const CHANNEL = [{ leg: 1 }, bendUp(90, 0.16), { leg: 2 }, bendUp(90, 0.16), { leg: 1 }];

function pathsOf(document: unknown): string[] {
  const restored = restore(document);
  return restored.ok ? [] : restored.errors.map((error) => error.path);
}

const withField = (name: string, value: unknown): object => partOf(CHANNEL, { [name]: value });
const without = (name: string): object =>
  Object.fromEntries(Object.entries(partOf(CHANNEL)).filter(([key]) => key !== name));
const legWith = (more: object): object => partOf([{ leg: 1, ...more }]);
const bendWith = (more: object): object => partOf([{ leg: 1 }, { ...bendUp(90, 0.1), ...more }, { leg: 1 }]);

describe('restore', () => {
  it('takes a whole document and gives it back as it is', () => {
    const whole = partOf([{ leg: 'W', id: 'a', name: 'Web', measure: ['flat', 'inside'] }, ...CHANNEL.slice(1)], {
      material: { name: 'shop', density: 2700, modulus: 70000, yield: 300 },
      width: '6',
      grain: 'across',
      variables: { W: '2', toString: 1, constructor: 2 },
      holes: [{ id: 'h', leg: 0, diameter: 0.1, from: 'mold-end', at: 1, across: 1, count: 2, pitch: 1, name: 'Row' }],
      seat: 1,
      nose: { radius: 0.1 },
      trim: { start: 0.5 },
      tolerances: { length: [0.01, 0.01], angle: ['1/2', 1] },
      hand: 'opposite',
      dashNumbers: [{ dash: '-1', variables: { W: 3 }, hand: 'as-drawn', title: 'Left' }],
    });
    const before = JSON.stringify(whole);
    const restored = restore(whole);
    expect(restored.ok && JSON.parse(JSON.stringify(restored.document))).toEqual(JSON.parse(before) as unknown);
    expect(JSON.stringify(whole)).toBe(before);
  });

  it('refuses what is no object', () => {
    for (const value of [null, undefined, 1, 'text', true, [], [partOf(CHANNEL)], () => 1, Symbol('x'), 1n]) {
      expect(pathsOf(value))
        .withContext(typeof value)
        .toEqual(['']);
    }
  });

  it('wants its five fields', () => {
    for (const field of ['format', 'unit', 'thickness', 'allowance', 'chain']) {
      expect(pathsOf(without(field)))
        .withContext(field)
        .toEqual([field]);
      expect(pathsOf(withField(field, null)))
        .withContext(field)
        .toEqual([field]);
    }
    expect(pathsOf({})).toEqual(['format', 'unit', 'thickness', 'allowance', 'chain']);
  });

  it('refuses a wrong type at the field that holds it', () => {
    const wrong: readonly (readonly [field: string, value: unknown, path?: string])[] = [
      ['format', 'leafwright/2'],
      ['unit', 'cm'],
      ['unit', 'IN'],
      ['thickness', NaN],
      ['thickness', Infinity],
      ['thickness', true],
      ['thickness', {}],
      ['width', [1]],
      ['grain', 'with'],
      ['material', 5],
      ['material', ''],
      ['material', { density: 1 }, 'material'],
      ['allowance', { method: 'guess' }, 'allowance/method'],
      ['allowance', { method: 'k-factor' }, 'allowance/k'],
      ['allowance', { method: 'handbook', k: 0.4 }, 'allowance/k'],
      ['allowance', { method: 'rule-90', hardness: 'stiff' }, 'allowance/hardness'],
      ['variables', { W: {} }, 'variables/W'],
      ['variables', [1]],
      ['chain', {}],
      ['chain', 'leg'],
      ['holes', {}],
      ['seat', 0.5],
      ['seat', -1],
      ['nose', 0.1],
      ['nose', {}, 'nose/radius'],
      ['trim', { start: null }, 'trim/start'],
      ['tolerances', { length: [0.1] }, 'tolerances/length'],
      ['tolerances', { width: [0, 0] }, 'tolerances/width'],
      ['hand', 'left'],
      ['dashNumbers', [{}], 'dashNumbers/0/dash'],
    ];
    for (const [field, value, path = field] of wrong) {
      const restored = restore(withField(field, value));
      const [first] = restored.ok ? [] : restored.errors;
      expect(first?.path.startsWith(path))
        .withContext(`${field}: ${JSON.stringify(value)} at ${first?.path}`)
        .toBeTrue();
      expect(first?.message.length).withContext(field).toBeGreaterThan(10);
    }
  });

  it('refuses unknown fields, at every depth', () => {
    expect(pathsOf(withField('colour', 1))).toEqual(['colour']);
    expect(pathsOf(legWith({ colour: 1 }))).toEqual(['chain/0/colour']);
    expect(pathsOf(bendWith({ angle: 90 }))).toEqual(['chain/1/angle']);
    expect(pathsOf(withField('nose', { radius: 1, shim: 1 }))).toEqual(['nose/shim']);
    expect(pathsOf(withField('holes', [{ leg: 0, diameter: 1, from: 'start', at: 1, across: 1, deep: 1 }]))).toEqual([
      'holes/0/deep',
    ]);
  });

  it('refuses fields named like the prototype, and takes such names from nowhere', () => {
    const parsed = (text: string): unknown => JSON.parse(text) as unknown;
    const frame = '"format":"leafwright/1","unit":"in","thickness":1,"allowance":{"method":"handbook"}';
    expect(pathsOf(parsed(`{${frame},"chain":[{"leg":1}],"__proto__":{"width":1}}`))).toEqual(['__proto__']);
    expect(pathsOf(parsed(`{${frame},"chain":[{"leg":1,"__proto__":{}}]}`))).toEqual(['chain/0/__proto__']);
    expect(pathsOf(parsed(`{${frame},"chain":[{"leg":1}],"variables":{"__proto__":1}}`))).toEqual([
      'variables/__proto__',
    ]);
    const dashed = `"dashNumbers":[{"dash":"-1"},{"dash":"-3","variables":{"__proto__":1}}]`;
    expect(pathsOf(parsed(`{${frame},"chain":[{"leg":1}],${dashed}}`))).toEqual(['dashNumbers/1/variables/__proto__']);
    expect(pathsOf(Object.create(partOf(CHANNEL)))).toContain('format');
    expect(pathsOf(withField('constructor', 1))).toEqual(['constructor']);
    expect(pathsOf(partOf([Object.create({ leg: 1 }) as object]))).toEqual(['chain/0']);
  });

  it('wants a chain of leg, joint, leg, and says where it is not', () => {
    const bend = bendUp(90, 0.1);
    expect(pathsOf(partOf([]))).toEqual(['chain']);
    expect(pathsOf(partOf([{ leg: 1 }]))).toEqual([]);
    expect(pathsOf(partOf([bend]))).toEqual(['chain/0']);
    expect(pathsOf(partOf([{ leg: 1 }, bend]))).toEqual(['chain/1']);
    expect(pathsOf(partOf([{ leg: 1 }, { leg: 1 }, { leg: 1 }]))).toEqual(['chain/1']);
    expect(pathsOf(partOf([{ leg: 1 }, bend, bend]))).toEqual(['chain/2']);
    expect(pathsOf(partOf([{ leg: 1 }, null, { leg: 1 }]))).toEqual(['chain/1']);
    expect(pathsOf(partOf([{ leg: 1, ...bend }]))).toEqual(['chain/0']);
    expect(pathsOf(partOf([{ leg: 1 }, { turn: 'up', radius: 1 }, { leg: 1 }]))).toEqual(['chain/1/bend']);
    expect(pathsOf(partOf([{ leg: 1 }, { run: 1, turn: 'up', radius: 1 }, { leg: 1 }]))).toEqual(['chain/1/joggle']);
    expect(pathsOf(partOf([{ name: 'Web' }]))).toEqual(['chain/0/leg']);
  });

  it('refuses a list with gaps, which holds no entry there', () => {
    const gap: unknown[] = [{ leg: 1 }, bendUp(90, 0.1), { leg: 1 }];
    delete gap[1];
    expect(pathsOf(partOf(gap))).toEqual(['chain/1']);
  });

  it('takes 200 bends and refuses 201, a joggle counting two', () => {
    const chainOf = (joints: readonly object[]): object =>
      partOf([{ leg: 1 }, ...joints.flatMap((joint) => [joint, { leg: 1 }])]);
    const joggle = { joggle: 0.04, run: 0.3, turn: 'up', radius: 0.1 };
    const bends = (count: number): object[] => Array.from({ length: count }, () => bendUp(90, 0.1));
    const joggles = (count: number): object[] => Array.from({ length: count }, () => joggle);
    expect(pathsOf(chainOf(bends(200)))).toEqual([]);
    expect(pathsOf(chainOf(bends(201)))).toEqual(['chain']);
    expect(pathsOf(chainOf(joggles(100)))).toEqual([]);
    expect(pathsOf(chainOf([...joggles(100), bendUp(90, 0.1)]))).toEqual(['chain']);
    expect(pathsOf(chainOf([...joggles(99), ...bends(2)]))).toEqual([]);
    expect(pathsOf(chainOf(bends(100_000)))).toEqual(['chain']);
  });

  it('refuses an id that is given twice, in the chain or in the holes', () => {
    const hole = { leg: 0, diameter: 0.1, from: 'start', at: 0.5, across: 0.5 };
    expect(pathsOf(partOf([{ leg: 1, id: 'a' }, { ...bendUp(90, 0.1), id: 'a' }, { leg: 1 }]))).toEqual(['chain/1/id']);
    expect(pathsOf(partOf([{ leg: 1, id: 'a' }], { holes: [{ ...hole, id: 'a' }] }))).toEqual(['holes/0/id']);
    expect(pathsOf(partOf([{ leg: 1, id: 'a' }], { holes: [{ ...hole, id: 'b' }] }))).toEqual([]);
    expect(pathsOf(legWith({ id: '' }))).toEqual(['chain/0/id']);
    expect(pathsOf(legWith({ id: 'x'.repeat(100) }))).toEqual([]);
    expect(pathsOf(legWith({ id: 'x'.repeat(101) }))).toEqual(['chain/0/id']);
  });

  it('takes names of 200 characters and refuses 201', () => {
    expect(pathsOf(legWith({ name: 'x'.repeat(200) }))).toEqual([]);
    expect(pathsOf(legWith({ name: 'x'.repeat(201) }))).toEqual(['chain/0/name']);
  });

  it('takes 1 to 1000 holes in a row, whole ones', () => {
    const row = (count: unknown): string[] =>
      pathsOf(withField('holes', [{ leg: 0, diameter: 0.1, from: 'start', at: 0, across: 0, count, pitch: 1 }]));
    expect(row(1)).toEqual([]);
    expect(row(1000)).toEqual([]);
    for (const count of [0, 1001, 1.5, -1, '2'])
      expect(row(count)).withContext(String(count)).toEqual(['holes/0/count']);
  });

  it('takes 2000 holes in all, rows spread out, and refuses 2001', () => {
    const row = { leg: 0, diameter: 0.1, from: 'start', at: 0, across: 0, count: 1000, pitch: 1 };
    expect(pathsOf(withField('holes', [row, { ...row, count: 999 }, { ...row, count: undefined }]))).toEqual([]);
    expect(pathsOf(withField('holes', [row, row, { ...row, count: 1 }]))).toEqual(['holes']);
  });

  it('takes 200,000 characters of variables, names included, and refuses one more', () => {
    const variables = (last: string): object => ({
      ...Object.fromEntries(Array.from({ length: 19_999 }, (_, i) => [`v${i + 10_000}`, '1+1+'])),
      v99999: last,
    });
    expect(pathsOf(withField('variables', variables('1+1+')))).toEqual([]);
    expect(pathsOf(withField('variables', variables('1+1+1')))).toEqual(['variables']);
  });

  it('gives 50 errors at most', () => {
    const broken = Array.from({ length: 201 }, () => ({ leg: null }));
    expect(pathsOf(partOf(broken)).length).toBe(50);
  });
});
