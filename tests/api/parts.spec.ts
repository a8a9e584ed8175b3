import type { Part } from '../../shared/contracts/parts';
import type { Problem } from '../../shared/contracts/problem';
import { type Caller, CHANNEL, openTestShop, type TestShop } from '../support/test-shop';

describe('parts', () => {
  let shop: TestShop;
  let designer: Caller;

  beforeEach(async () => {
    shop = await openTestShop();
    designer = await shop.signedIn('designer');
  });

  afterEach(() => shop.close());

  const create = (number: string, title = 'Channel', document: unknown = CHANNEL) =>
    designer.post('/api/parts', { number, title, document });

  it('start with a draft that the server has computed', async () => {
    const answer = await create(' T-1 ', ' Channel, test ');
    expect(answer.status).toBe(201);
    const part = answer.body as Part;
    expect(answer.headers['location']).toBe(`/api/parts/${part.id}`);
    expect(part.number).toBe('T-1');
    expect(part.title).toBe('Channel, test');
    expect(part.createdBy).toBe('Ilka Dornbach');
    expect(part.createdAt).toBe('2026-03-02T08:00:00.000Z');
    const { letter, state, version, document, result, editors, engineVersion } = part.revision;
    expect({ letter, state, version, editors }).toEqual({
      letter: 'A',
      state: 'draft',
      version: 1,
      editors: ['Ilka Dornbach'],
    });
    expect(document).toEqual(CHANNEL);
    expect(engineVersion).toMatch(/^\d+\.\d+\.\d+$/);
    expect(result.legs.map((leg) => leg.flat.toFixed(3))).toEqual(['0.800', '1.600', '0.800']);
    expect(result.developedLength).toBeCloseTo(3.758, 3);
    expect((await designer.get(`/api/parts/${part.id}`)).body).toEqual(part);
  });

  it('are refused with the paths of a broken document, and nothing is kept', async () => {
    const chain = [{ leg: 1 }, { bend: 90, turn: 'up', radius: 'abc' }, { leg: -1 }];
    const answer = await create('T-1', 'Angle', { ...CHANNEL, chain });
    expect(answer.status).toBe(422);
    const problem = answer.body as Problem;
    expect(problem.type).toBe('/problems/invalid');
    expect(problem.errors?.map((error) => error.path)).toEqual(['chain/1/radius', 'chain/2/leg']);
    expect(await shop.database.parts.count({ where: { number: 'T-1' } })).toBe(0);
    expect(await shop.database.revisions.count()).toBe(8);
  });

  it('are accepted with a stop: a draft may be unfinished', async () => {
    const answer = await create('T-1', 'Angle', {
      ...CHANNEL,
      chain: [{ leg: 0.1 }, { bend: 90, turn: 'up', radius: 0.16 }, { leg: 1 }],
    });
    expect(answer.status).toBe(201);
    expect((answer.body as Part).revision.result.developedLength).toBeNull();
  });

  it('have a number each, whatever its case', async () => {
    await create('T-1').expect(201);
    const answer = await create('t-1');
    expect(answer.status).toBe(409);
    expect(answer.body).toEqual({
      type: '/problems/taken',
      title: 'That is already in use.',
      status: 409,
      errors: [{ path: 'number', message: 'There is a part t-1 already.' }],
    });
    await create('T-10').expect(201);
  });

  it('that are made twice at once give one part', async () => {
    const answers = await Promise.all([create('T-1'), create('T-1'), create('T-1')]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 409, 409]);
  });

  for (const [number, title, paths] of [
    ['', 'Angle', ['number']],
    ['T-1', '', ['title']],
    ['x'.repeat(41), 'x'.repeat(121), ['number', 'title']],
    ['T\u0000', 'a\nb', ['number', 'title']],
    ['-1', 'Angle', ['number']],
  ] as const) {
    it(`need a number and a title that can be read: ${JSON.stringify([number, title]).slice(0, 40)}`, async () => {
      const answer = await create(number, title);
      expect(answer.status).toBe(422);
      const named = new Set((answer.body as Problem).errors?.map((error) => error.path));
      expect([...named]).toEqual([...paths]);
    });
  }

  it('take a number of 40 and a title of 120 characters', async () => {
    expect((await create('x'.repeat(40), '¼ ø “é” 鈑'.padEnd(120, 'x'))).status).toBe(201);
  });

  it('can be given another number and title', async () => {
    const { id } = (await create('T-1')).body as Part;
    shop.passHours(1);
    const changed = (await designer.patch(`/api/parts/${id}`, { number: 'T-2', title: 'New' }).expect(200))
      .body as Part;
    expect([changed.number, changed.title, changed.revision.version]).toEqual(['T-2', 'New', 1]);
    const found = (await designer.get('/api/parts?search=t-2+new')).body as { parts: { id: string }[] };
    expect(found.parts.map((part) => part.id)).toEqual([id]);
    await designer.patch(`/api/parts/${id}`, { number: 't-2' }).expect(200);
    await designer.patch(`/api/parts/${id}`, { number: 'HC-2101-1' }).expect(409);
    await designer.patch(`/api/parts/${id}`, {}).expect(200);
  });

  it('that are not there are not found, whatever stands in their place', async () => {
    for (const id of ['nothing', '__proto__', 'constructor', "' OR 1=1 --", '%F0%9F%98%80', 'x'.repeat(2000)]) {
      const path = `/api/parts/${encodeURIComponent(id)}`;
      const answers = [
        await designer.get(path),
        await designer.patch(path, { title: 'x' }),
        await designer.get(`${path}/revisions/A`),
        await designer.put(`${path}/revisions/A`, { version: 1, document: CHANNEL }),
        await designer.get(`${path}/revisions/A/blank.pdf`),
      ];
      expect(answers.map((answer) => answer.status))
        .withContext(id)
        .toEqual([404, 404, 404, 404, 404]);
    }
  });
});
