import type { Part } from '../../shared/contracts/parts';
import type { Problem } from '../../shared/contracts/problem';
import type { Revision } from '../../shared/contracts/revisions';
import type { PartDocument } from '../../shared/part/document';
import { DEMO_PASSWORD } from '../../api/demo-shop';
import { addPerson } from '../../api/services/people';
import { hashPassword } from '../../api/services/password';
import { type Caller, CHANNEL, openTestShop, type TestShop } from '../support/test-shop';

const withWeb = (web: number | string): PartDocument => ({
  ...CHANNEL,
  chain: CHANNEL.chain.map((entry, i) => (i === 2 ? { ...entry, leg: web } : entry)),
});

describe('revisions', () => {
  let shop: TestShop;
  let designer: Caller;
  let part: Part;
  let path: string;

  beforeEach(async () => {
    shop = await openTestShop();
    designer = await shop.signedIn('designer');
    part = (await designer.post('/api/parts', { number: 'T-1', title: 'Channel', document: CHANNEL })).body as Part;
    path = `/api/parts/${part.id}/revisions/A`;
    shop.passHours(1);
  });

  afterEach(() => shop.close());

  const save = (version: number, document: unknown) => designer.put(path, { version, document });

  const secondDesigner = async (): Promise<Caller> => {
    const passwordHash = await hashPassword(DEMO_PASSWORD, 4);
    const second = { email: 'second@harrowcreek.example', name: 'Wenna Tarrow', roles: ['designer' as const] };
    await shop.database.write((t) => addPerson(shop.database, { ...second, passwordHash }, shop.clock.now, t));
    const other = await shop.visitor();
    await other.signIn(second.email, DEMO_PASSWORD);
    return other;
  };

  it('are computed again with every save', async () => {
    const saved = (await save(1, withWeb(3)).expect(200)).body as Revision;
    expect(saved.version).toBe(2);
    expect(saved.changedAt).toBe('2026-03-02T09:00:00.000Z');
    expect(saved.result.developedLength).toBeCloseTo(4.758, 3);
    expect((await designer.get(path)).body).toEqual(saved);
  });

  it('show in the register what they are now', async () => {
    await save(1, { ...withWeb(3), material: '6061-T6', width: 10 }).expect(200);
    const { parts } = (await designer.get('/api/parts?search=T-1')).body as { parts: Record<string, unknown>[] };
    expect(parts[0]?.['blankLength']).toBeCloseTo(4.758, 3);
    expect(parts[0]?.['blankWidth']).toBe(10);
    expect(parts[0]?.['material']).toBe('6061-T6');
    expect(parts[0]?.['changedAt']).toBe('2026-03-02T09:00:00.000Z');
    expect((parts[0]?.['outline'] as { path: string }).path).toMatch(/^M.*Z$/);
  });

  it('are kept as they were typed', async () => {
    const typed = { ...withWeb('W + 1 1/8'), variables: { W: '2' } };
    expect(((await save(1, typed)).body as Revision).document).toEqual(typed);
  });

  it('refuse a save that started from an older version, and show the newest', async () => {
    await save(1, withWeb(3)).expect(200);
    const answer = await save(1, withWeb(4));
    expect(answer.status).toBe(409);
    const problem = answer.body as Problem;
    expect(problem.type).toBe('/problems/stale');
    expect((problem.current as Revision).version).toBe(2);
    expect((problem.current as Revision).document).toEqual(withWeb(3));
    expect((await designer.get(path)).body).toEqual(problem.current);
  });

  it('refuse a save from a version that never was', async () => {
    expect((await save(2, withWeb(3))).status).toBe(409);
  });

  it('take the same save twice as one, as when its answer was lost', async () => {
    const first = (await save(1, withWeb(3)).expect(200)).body as Revision;
    const again = (await save(1, withWeb(3)).expect(200)).body as Revision;
    expect(again).toEqual(first);
    await save(1, withWeb(3.5)).expect(409);
  });

  it('do not take the same document from somebody else for the same save', async () => {
    const other = await secondDesigner();
    await save(1, withWeb(3)).expect(200);
    expect((await other.put(path, { version: 1, document: withWeb(3) })).status).toBe(409);
  });

  it('let one of many saves at once through', async () => {
    const answers = await Promise.all([3, 4, 5, 6, 7].map((web) => save(1, withWeb(web))));
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409, 409, 409, 409]);
    expect(((await designer.get(path)).body as Revision).version).toBe(2);
  });

  it('refuse a document that the engine refuses, by the path of the field', async () => {
    for (const [document, wrong] of [
      [withWeb('two'), 'chain/2/leg'],
      [withWeb(0), 'chain/2/leg'],
      [withWeb(-1), 'chain/2/leg'],
      [{ ...CHANNEL, chain: [] }, 'chain'],
      [{ ...CHANNEL, colour: 'blue' }, 'colour'],
      [{ ...CHANNEL, thickness: 0 }, 'thickness'],
      [null, ''],
      ['text', ''],
    ] as const) {
      const answer = await save(1, document);
      expect(answer.status).withContext(wrong).toBe(422);
      expect((answer.body as Problem).errors?.[0]?.path).toBe(wrong);
    }
    expect(((await designer.get(path)).body as Revision).version).toBe(1);
  });

  it('keep a draft in which the bends consume a leg, and count its stops', async () => {
    const saved = (await save(1, withWeb(0.2)).expect(200)).body as Revision;
    expect(saved.result.findings.some((finding) => finding.level === 'stop')).toBeTrue();
    const { parts } = (await designer.get('/api/parts?search=T-1')).body as { parts: { stops: number }[] };
    expect(parts[0]?.stops).toBeGreaterThan(0);
  });

  it('record everybody who has edited them, from when to when', async () => {
    const other = await secondDesigner();
    await other.put(path, { version: 1, document: withWeb(3) }).expect(200);
    shop.passHours(1);
    const saved = (await save(2, withWeb(4)).expect(200)).body as Revision;
    expect(saved.editors).toEqual(['Ilka Dornbach', 'Wenna Tarrow']);
    const kept = await shop.database.revisionEditors.findAll({ where: { revisionId: saved.id }, raw: true });
    const times = kept.map((editor) => [editor.firstEditAt.slice(11, 13), editor.lastEditAt.slice(11, 13)]);
    expect(times.sort()).toEqual([
      ['08', '10'],
      ['09', '09'],
    ]);
  });

  it('count another number or title of the part as an edit', async () => {
    const other = await secondDesigner();
    const renamed = (await other.patch(`/api/parts/${part.id}`, { version: 1, title: 'Hat' }).expect(200)).body as Part;
    expect(renamed.revision.editors).toEqual(['Ilka Dornbach', 'Wenna Tarrow']);
    const [kept] = await shop.database.revisionEditors.findAll({ where: { firstEditAt: '2026-03-02T09:00:00.000Z' } });
    expect(kept?.revisionId).toBe(renamed.revision.id);
  });

  it('come as a paper with the number of the part in its name', async () => {
    const answer = await designer.get(`${path}/blank.pdf?size=letter`).expect(200);
    expect(answer.headers['content-type']).toBe('application/pdf');
    expect(answer.headers['content-disposition']).toBe('attachment; filename="T-1-A-blank.pdf"');
    expect(answer.headers['cache-control']).toBe('private, no-store');
    expect((answer.body as Buffer).subarray(0, 5).toString()).toBe('%PDF-');
    await designer.get(`${path}/blank.pdf?size=a5`).expect(422);
    await designer.get(`${path}/blank.pdf?sise=a4`).expect(422);
  });

  it('come as a paper also where the blank has no figure', async () => {
    await save(1, withWeb(0.2)).expect(200);
    expect((await designer.get(`${path}/blank.pdf`)).status).toBe(200);
  });
});
