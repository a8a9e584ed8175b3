import type { Session } from '../../shared/contracts/session';
import { SessionStore } from '../../api/middleware/session-store';
import { DEMO_PASSWORD } from '../../api/seeders/demo/demo-people';
import { openTestShop, type TestShop } from '../support/test-shop';

const DESIGNER = 'designer@harrowcreek.example';
const HOUR = 60 * 60 * 1000;

const sessionCookie = (headers: Record<string, string>): string | undefined =>
  (headers['set-cookie'] as unknown as string[] | undefined)?.find((cookie) =>
    cookie.startsWith('leafwright.session='),
  );

describe('session', () => {
  let shop: TestShop;

  beforeEach(async () => {
    shop = await openTestShop();
  });

  afterEach(() => shop.close());

  const person = async (caller: { get(path: string): PromiseLike<{ body: unknown }> }): Promise<string | undefined> =>
    ((await caller.get('/api/session')).body as Session).person?.email;

  it('tells a visitor which shop this is and that it is a demo', async () => {
    const session = (await (await shop.visitor()).get('/api/session')).body as Session;
    expect(session.person).toBeNull();
    expect(session.shop.name).toBe('Harrow Creek');
    expect(session.shop.demo).toBeTrue();
    expect(session.shop.demoSignIns?.length).toBe(4);
  });

  it('knows who signed in, and nobody after signing out', async () => {
    const caller = await shop.visitor();
    const answer = await caller.signIn(DESIGNER, DEMO_PASSWORD);
    expect((answer.body as Session).person?.roles).toEqual(['designer']);
    expect(JSON.stringify(answer.body)).not.toContain('$2');
    expect(await person(caller)).toBe(DESIGNER);
    const out = await caller.delete('/api/session').expect(200);
    expect((out.body as Session).person).toBeNull();
    expect(await shop.database.sessions.count()).toBe(0);
    expect(await person(caller)).toBeUndefined();
  });

  it('takes an address in any case, with spaces round it', async () => {
    const caller = await shop.visitor();
    expect((await caller.signIn(`  ${DESIGNER.toUpperCase()} `, DEMO_PASSWORD)).status).toBe(200);
  });

  it('answers alike to an unknown account, a wrong password and one that is too long', async () => {
    const caller = await shop.visitor();
    const answers = [
      await caller.signIn('nobody@harrowcreek.example', DEMO_PASSWORD),
      await caller.signIn(DESIGNER, 'wrong'),
      await caller.signIn(DESIGNER, DEMO_PASSWORD + 'x'.repeat(73)),
      await caller.signIn('designer\0@harrowcreek.example', DEMO_PASSWORD),
    ];
    for (const answer of answers) {
      expect(answer.status).toBe(401);
      expect(answer.body).toEqual(answers[0]?.body as object);
    }
  });

  it('says which field is empty', async () => {
    const answer = await (await shop.visitor()).post('/api/session', { email: ' ', password: '' });
    expect(answer.status).toBe(422);
    expect((answer.body as { errors: { path: string }[] }).errors.map((error) => error.path)).toEqual([
      'email',
      'password',
    ]);
  });

  it('keeps its cookie from scripts and other sites', async () => {
    const answer = await (await shop.visitor()).signIn(DESIGNER, DEMO_PASSWORD);
    expect(sessionCookie(answer.headers)).toMatch(/; HttpOnly; SameSite=Lax$/);
  });

  it('gets a new id at every sign-in', async () => {
    const caller = await shop.visitor();
    const first = sessionCookie((await caller.signIn(DESIGNER, DEMO_PASSWORD)).headers);
    const second = sessionCookie((await caller.signIn(DESIGNER, DEMO_PASSWORD)).headers);
    expect(first).toBeDefined();
    expect(second?.split(';')[0]).not.toBe(first?.split(';')[0]);
    expect(await shop.database.sessions.count()).toBe(1);
  });

  it('lasts while it is used, up to a day, and ends after eight idle hours', async () => {
    const caller = await shop.signedIn('designer');
    shop.passHours(7.9);
    expect(await person(caller)).toBe(DESIGNER);
    shop.passHours(7.9);
    expect(await person(caller)).toBe(DESIGNER);
    shop.passHours(7.9);
    expect(await person(caller)).toBe(DESIGNER);
    shop.passHours(0.3);
    expect(await person(caller)).toBeUndefined();

    const idle = await shop.signedIn('supervisor');
    shop.passHours(8);
    await idle.get('/api/parts').expect(401);
  });

  it('is written once a quarter of an hour at most, however much is read', async () => {
    const caller = await shop.signedIn('designer');
    const stored = async (): Promise<string | undefined> => (await shop.database.sessions.findOne({ raw: true }))?.data;
    const before = await stored();
    shop.passHours(0.24);
    await caller.get('/api/parts').expect(200);
    expect(await stored()).toBe(before);
    shop.passHours(0.01);
    const renewed = await caller.get('/api/parts').expect(200);
    expect(await stored()).not.toBe(before);
    expect(sessionCookie(renewed.headers)).toBeDefined();
  });

  it('is not brought back by a request that was under way at sign-out', async () => {
    const caller = await shop.signedIn('designer');
    const sid = (await shop.database.sessions.findOne({ raw: true }))!.sid;
    await shop.database.sessions.destroy({ where: { sid } });
    const store = new SessionStore(shop.database);
    const now = shop.clock.now.getTime();
    const data = { cookie: { originalMaxAge: HOUR }, signedInAt: now, renewedAt: now + HOUR };
    await new Promise((resolve) => store.set(sid, data, resolve));
    store.stopExpiringSessions();
    expect(await shop.database.sessions.count()).toBe(0);
    await caller.get('/api/parts').expect(401);
  });

  it('ends when the person may no longer sign in', async () => {
    const caller = await shop.signedIn('designer');
    await shop.database.people.update({ active: false }, { where: { email: DESIGNER } });
    await caller.get('/api/parts').expect(401);
    expect((await (await shop.visitor()).signIn(DESIGNER, DEMO_PASSWORD)).status).toBe(401);
  });

  it('of an own shop has nobody from the demo', async () => {
    const own = await openTestShop({ shop: 'own' });
    const caller = await own.visitor();
    const session = (await caller.get('/api/session')).body as Session;
    expect(session.shop).toEqual({ name: 'Our shop', demo: false });
    expect((await caller.signIn(DESIGNER, DEMO_PASSWORD)).status).toBe(401);
    await own.close();
  });
});

describe('sign-in limits', () => {
  const limits = { windowMs: 60_000, perAddress: 5, perAccount: 2 };
  let shop: TestShop;

  beforeEach(async () => {
    shop = await openTestShop({ signInLimits: limits });
  });

  afterEach(() => shop.close());

  it('stop guesses at one account, not at the others', async () => {
    const caller = await shop.visitor();
    expect((await caller.signIn(DESIGNER, 'a')).status).toBe(401);
    expect((await caller.signIn(DESIGNER.toUpperCase(), 'b')).status).toBe(401);
    const third = await caller.signIn(DESIGNER, DEMO_PASSWORD);
    expect(third.status).toBe(429);
    expect(Number(third.headers['retry-after'])).toBeGreaterThan(0);
    expect((third.body as { detail: string }).detail).toBe('Wait a minute and try again.');
    expect((await caller.signIn('supervisor@harrowcreek.example', DEMO_PASSWORD)).status).toBe(200);
  });

  it('stop an address that tries many accounts', async () => {
    const caller = await shop.visitor();
    for (let n = 0; n < 5; n += 1) expect((await caller.signIn(`n${n}@x.example`, 'a')).status).toBe(401);
    expect((await caller.signIn('n6@x.example', 'a')).status).toBe(429);
  });

  it('do not count sign-ins that succeed', async () => {
    const caller = await shop.visitor();
    for (let n = 0; n < 6; n += 1) expect((await caller.signIn(DESIGNER, DEMO_PASSWORD)).status).toBe(200);
  });
});
