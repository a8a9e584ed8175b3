/** Whatever is sent: a clear refusal in the one shape, never a 500. */
import supertest from 'supertest';
import type { Problem } from '../../shared/contracts/problem';
import type { SolveResult } from '../../shared/result';
import { type Caller, CHANNEL, openTestShop, type TestShop } from '../support/test-shop';

describe('bad input', () => {
  let shop: TestShop;
  let designer: Caller;

  beforeAll(async () => {
    shop = await openTestShop();
    designer = await shop.signedIn('designer');
  });

  afterAll(() => shop.close());

  const raw = (text: string, type?: string) => designer.raw('post', '/api/parts', text, type);

  const expectProblem = (
    answer: { status: number; headers: Record<string, string>; body: unknown },
    status: number,
  ): void => {
    expect(answer.status).toBe(status);
    expect(answer.headers['content-type']).toContain('application/problem+json');
    expect((answer.body as Problem).status).toBe(status);
    expect((answer.body as Problem).title).toBeTruthy();
  };

  it('of a broken JSON is 400', async () => {
    for (const text of ['{', '{"a":}', 'undefined', '{"number":"x"', '\u0000', '"\\ud83']) {
      expectProblem(await raw(text), 400);
    }
  });

  it('of no body at all is 400', async () => {
    expectProblem(await designer.agent.post('/api/parts').set('X-CSRF-Token', designer.token), 400);
    expectProblem(await raw(''), 400);
  });

  it('of a body just over 1 MB, or of 6 MB, is 413; just under it is read', async () => {
    const body = (bytes: number): string => `"${'x'.repeat(bytes - 2)}"`;
    expectProblem(await raw(body(6 * 1024 * 1024)), 413);
    expectProblem(await raw(body(1024 * 1024 + 1)), 413);
    expectProblem(await raw(body(1024 * 1024)), 422);
  });

  it('of another media type is 415', async () => {
    expectProblem(await raw('number=x', 'application/x-www-form-urlencoded'), 415);
    expectProblem(await raw('<part/>', 'text/xml'), 415);
    expectProblem(await raw('{}', 'application/json; charset=iso-8859-1'), 415);
    expectProblem(await raw('{}').set('Content-Encoding', 'zip'), 415);
  });

  it('of another shape is 422', async () => {
    for (const text of ['null', '[]', '1', '"text"', 'true', '{}']) expectProblem(await raw(text), 422);
  });

  it('of an unknown field is 422 at that field', async () => {
    const answer = await designer.post('/api/parts', { number: 'B-1', title: 'B', document: CHANNEL, colour: 'blue' });
    expectProblem(answer, 422);
    expect((answer.body as Problem).errors).toEqual([{ path: 'colour', message: 'There is no field “colour” here.' }]);
  });

  it('of very many unknown fields, or one with a very long name, gets a short answer', async () => {
    const many = Object.fromEntries(Array.from({ length: 40_000 }, (_, n) => [`unknown-${n}`, n]));
    const long = { ['x'.repeat(900_000)]: 1 };
    const part = { number: 'B-4', title: 'B' };
    for (const body of [
      { ...part, ...many, document: CHANNEL },
      { ...part, ...long, document: CHANNEL },
      { ...part, document: { ...CHANNEL, ...many } },
      { ...part, document: { ...CHANNEL, ...long } },
      { ...part, document: { ...CHANNEL, variables: { ['x'.repeat(900_000)]: {} } } },
    ]) {
      const answer = await designer.post('/api/parts', body);
      expectProblem(answer, 422);
      expect((answer.body as Problem).errors?.length).toBeLessThanOrEqual(50);
      expect(answer.text.length).toBeLessThan(20_000);
    }
    const cut = (await designer.post('/api/parts', { ...part, ...long, document: CHANNEL })).body as Problem;
    const name = 'x'.repeat(60);
    expect(cut.errors).toEqual([{ path: name, message: `There is no field “${name}” here.` }]);
  });

  it('of more than 16 kB to the sign-in is 413, with that figure', async () => {
    const visitor = await shop.visitor();
    const body = (bytes: number): string => `"${'x'.repeat(bytes - 2)}"`;
    expectProblem(await visitor.raw('post', '/api/session', body(16 * 1024)), 422);
    const answer = await visitor.raw('post', '/api/session', body(16 * 1024 + 1));
    expectProblem(answer, 413);
    expect((answer.body as Problem).detail).toBe('A request may have 16 kB at most.');
    expect(((await raw(body(1024 * 1024 + 1))).body as Problem).detail).toBe('A request may have 1 MB at most.');
  });

  it('is answered in words for people, never in those of a library', async () => {
    const { parts } = (await designer.get('/api/parts')).body as { parts: { id: string }[] };
    const one = `/api/parts/${parts[0]?.id}`;
    const values = [undefined, null, '', 5, -1, 1.5, true, 'x'.repeat(5000), [], {}, 2 ** 60];
    const answers = [
      await designer.post('/api/parts', { number: 'B-5', title: 'B' }),
      await designer.get('/api/parts?limit=abc'),
      await designer.get('/api/parts?limit=0'),
      await designer.get('/api/parts?limit=201'),
      await designer.get('/api/parts?sort=colour'),
      await designer.get('/api/parts?unit=ft'),
      await designer.get('/api/parts?unit=in&unit=mm'),
      await designer.get(`/api/parts?search=${'x'.repeat(101)}`),
      await designer.get('/api/parts?material='),
      await designer.get(`${one}/revisions/A/blank.pdf?size=a5`),
    ];
    for (const value of values) {
      answers.push(
        await designer.post('/api/parts', { number: value, title: value }),
        await designer.patch(one, { version: value, number: 5, title: [] }),
        await designer.put(`${one}/revisions/A`, { version: value }),
        await designer.post('/api/session', { email: value, password: 5 }),
        await designer.post('/api/parts', value ?? null),
      );
    }
    for (const answer of answers) {
      expectProblem(answer, 422);
      for (const { message } of (answer.body as Problem).errors ?? []) {
        expect(message).toMatch(/^[A-Z“].*\.$/);
        expect(message).not.toMatch(/invalid|received|undefined|NaN|unrecognized|too (small|big)|nonoptional/i);
      }
    }
    expect((answers[0]?.body as Problem).errors).toEqual([{ path: 'document', message: 'This is missing.' }]);
  });

  it('of prototype keys changes nothing', async () => {
    const document = JSON.stringify(CHANNEL);
    for (const extra of ['"__proto__":{"roles":["designer"]}', '"constructor":{"prototype":{"x":1}}']) {
      expectProblem(await raw(`{${extra},"number":"B-2","title":"B","document":${document}}`), 422);
      expectProblem(await raw(`{"number":"B-2","title":"B","document":{${extra},${document.slice(1)}}`), 422);
    }
    expect(({} as Record<string, unknown>)['x']).toBeUndefined();
  });

  it('of a very deep body is refused', async () => {
    const deep = '['.repeat(200_000) + ']'.repeat(200_000);
    expectProblem(await raw(`{"number":"B-3","title":"B","document":${deep}}`), 422);
    const solved = await designer.raw('post', '/api/solve', deep).expect(200);
    expect((solved.body as SolveResult).ok).toBeFalse();
  });

  it('of a broken path is 400, of an unknown one 404, of a wrong method 405', async () => {
    expectProblem(await designer.get('/api/parts/%E0%A4%A'), 400);
    expectProblem(await designer.get('/api/parts/a%00b'), 400);
    expectProblem(await designer.get('/%'), 404);
    expectProblem(await designer.get('/api/nothing'), 404);
    expectProblem(await designer.get('/api'), 404);
    expectProblem(await designer.get('/api/parts/../../etc/passwd'), 404);
    expectProblem(await designer.get('/nothing'), 404);
    const wrong = await designer.delete('/api/parts');
    expectProblem(wrong, 405);
    expect(wrong.headers['allow']).toBe('HEAD, GET, POST');
  });

  it('of a version that is none is 422', async () => {
    const { parts } = (await designer.get('/api/parts')).body as { parts: { id: string }[] };
    for (const version of [0, -1, 1.5, '1', null, 2 ** 60]) {
      const answer = await designer.put(`/api/parts/${parts[0]?.id}/revisions/A`, { version, document: CHANNEL });
      expectProblem(answer, 422);
    }
  });

  it('of broken cookies is a visitor', async () => {
    for (const cookie of ['leafwright.session=s%3Ax.y', 'leafwright.session=%', '=;;=', 'x'.repeat(4000)]) {
      expectProblem(await supertest(shop.express).get('/api/parts').set('Cookie', cookie), 401);
    }
  });
});

describe('solve', () => {
  let shop: TestShop;
  let reader: Caller;

  beforeAll(async () => {
    shop = await openTestShop();
    reader = await shop.signedIn('technician');
  });

  afterAll(() => shop.close());

  const solve = async (body: unknown): Promise<SolveResult> =>
    (await reader.post('/api/solve', body).expect(200)).body as SolveResult;

  it('answers a bare document and one with what the shop knows alike', async () => {
    const bare = await solve(CHANNEL);
    expect(bare.ok && bare.developedLength).toBeCloseTo(3.758, 3);
    expect(await solve({ document: CHANNEL })).toEqual(bare);
    expect(await solve({ document: CHANNEL, shop: {} })).toEqual(bare);
  });

  it('answers a refused document with the paths, not with a problem', async () => {
    for (const [body, path] of [
      [null, ''],
      [5, ''],
      [{ document: CHANNEL, shape: {} }, 'shape'],
      [{ ...CHANNEL, thickness: 'thick' }, 'thickness'],
      [{ ...CHANNEL, chain: [{ leg: null }] }, 'chain/0/leg'],
    ] as const) {
      const result = await solve(body);
      expect(!result.ok && result.errors[0]?.path).toBe(path);
    }
  });
});
