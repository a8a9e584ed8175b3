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
    const change = (more: object) => designer.patch(`/api/parts/${id}`, more);
    const changed = (await change({ version: 1, number: 'T-2', title: 'New' }).expect(200)).body as Part;
    expect([changed.number, changed.title, changed.version, changed.revision.version]).toEqual(['T-2', 'New', 2, 1]);
    const found = (await designer.get('/api/parts?search=t-2+new')).body as { parts: { id: string }[] };
    expect(found.parts.map((part) => part.id)).toEqual([id]);
    await change({ version: 2, number: 't-2' }).expect(200);
    await change({ version: 3, number: 'HC-2101-1' }).expect(409);
    expect(((await change({ version: 3 }).expect(200)).body as Part).version).toBe(3);
  });

  it('keep what somebody else has changed in between', async () => {
    const { id, version } = (await create('T-1')).body as Part;
    expect(version).toBe(1);
    const change = (more: object) => designer.patch(`/api/parts/${id}`, more);
    const first = (await change({ version, number: 'T-2' }).expect(200)).body as Part;
    const late = await change({ version, title: 'Late' });
    expect(late.status).toBe(409);
    const problem = late.body as Problem;
    expect(problem.type).toBe('/problems/stale');
    expect(problem.detail).toBe('The number or the title was changed in between.');
    expect(problem.current).toEqual(first);
    // The same change again, because its answer was lost: it is done already.
    expect((await change({ version, number: 'T-2' }).expect(200)).body).toEqual(first);
    expect(((await change({ version: 2, title: 'Late' }).expect(200)).body as Part).number).toBe('T-2');
    expect((await change({ version: 99, title: 'Later' })).status).toBe(409);
    for (const wrong of [undefined, 0, '1', 1.5, null]) {
      const answer = await change({ version: wrong, title: 'X' });
      expect(answer.status).toBe(422);
      expect((answer.body as Problem).errors?.[0]?.path).toBe('version');
    }
  });

  it('of many changes at once let one through', async () => {
    const { id } = (await create('T-1')).body as Part;
    const answers = await Promise.all(
      ['a', 'b', 'c', 'd'].map((title) => designer.patch(`/api/parts/${id}`, { version: 1, title })),
    );
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409, 409, 409]);
  });

  it('have one number however many spaces are in it', async () => {
    expect(((await create('SP  1').expect(201)).body as Part).number).toBe('SP 1');
    await create('SP 1').expect(409);
    await create('SP \t 1').expect(409);
    await create('SP1').expect(201);
  });

  it('have titles and materials that show as they are: no marks that turn the writing direction', async () => {
    for (const bad of ['a\u0085b', 'a\u202eb', 'a\u2066b', 'a\ud800b']) {
      const raw = JSON.stringify({ number: 'T-1', title: bad, document: CHANNEL });
      const answer = await designer.raw('post', '/api/parts', raw).expect(422);
      expect((answer.body as Problem).errors).toEqual([
        { path: 'title', message: 'A title is one line of plain text.' },
      ]);
      expect((await create('T-1', 'Channel', { ...CHANNEL, material: bad })).status).toBe(422);
    }
    await create('T-1', 'العربية \u200f עברית').expect(201);
  });

  it('are found by any material that a part may have', async () => {
    const material = 'm'.repeat(100);
    await create('T-1', 'Channel', { ...CHANNEL, material: ` ${material} ` }).expect(201);
    const found = (await designer.get(`/api/parts?material=${material}`).expect(200)).body as { total: number };
    expect(found.total).toBe(1);
    await designer.get(`/api/parts?material=${material}m`).expect(422);
  });

  it('that are not there are not found, whatever stands in their place', async () => {
    for (const id of ['nothing', '__proto__', 'constructor', "' OR 1=1 --", '%F0%9F%98%80', 'x'.repeat(2000)]) {
      const path = `/api/parts/${encodeURIComponent(id)}`;
      const answers = [
        await designer.get(path),
        await designer.patch(path, { version: 1, title: 'x' }),
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
