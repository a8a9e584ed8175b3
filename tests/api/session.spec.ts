import bcrypt from 'bcryptjs';
import type { Session } from '../../shared/contracts/session';
import { SessionStore } from '../../api/middleware/session-store';
import { DEMO_PASSWORD } from '../../api/demo-shop';
import { type Caller, openTestShop, type TestShop } from '../support/test-shop';

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
    const stored = async () => (await shop.database.sessions.findOne({ raw: true }))!;
    const before = await stored();
    shop.passHours(0.24);
    await caller.get('/api/parts').expect(200);
    // Not even the time at which it would be swept up.
    expect(await stored()).toEqual(before);
    shop.passHours(0.01);
    const renewed = await caller.get('/api/parts').expect(200);
    expect((await stored()).data).not.toBe(before.data);
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

  it('is swept up when it is over, in turn with all who write', async () => {
    await shop.signedIn('designer');
    const expires = new Date(Date.now() - 1000);
    await shop.database.sessions.create({ sid: 'over', expires, data: '{}' });
    const store = new SessionStore(shop.database);
    let swept = false;
    const sweep = await shop.database.inTurn(async () => {
      const sweeping = new Promise<void>((resolve) => store.clearExpiredSessions(() => resolve()));
      void sweeping.then(() => (swept = true));
      // Time enough for a sweep that does not wait its turn.
      await shop.database.sessions.count();
      await shop.database.sessions.count();
      expect(swept).toBeFalse();
      expect(await shop.database.sessions.count()).toBe(2);
      return { sweeping };
    });
    await sweep.sweeping;
    store.stopExpiringSessions();
    expect((await shop.database.sessions.findAll()).map((session) => session.sid)).not.toContain('over');
    expect(await shop.database.sessions.count()).toBe(1);
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
  const limits = { windowMs: 60_000, perAddress: 8, perAccountAndAddress: 2, perAccount: 5 };
  const SUPERVISOR = 'supervisor@harrowcreek.example';
  let shop: TestShop;
  let caller: Caller;

  beforeEach(async () => {
    shop = await openTestShop({ signInLimits: limits, trustedProxies: 1 });
    caller = await shop.visitor();
  });

  afterEach(() => shop.close());

  const from = async (address: string, email: string, password: string) =>
    (await caller.post('/api/session', { email, password }).set('X-Forwarded-For', address)).status;

  it('stop guesses at one account, not at the others', async () => {
    expect((await caller.signIn(DESIGNER, 'a')).status).toBe(401);
    expect((await caller.signIn(DESIGNER.toUpperCase(), 'b')).status).toBe(401);
    const third = await caller.signIn(DESIGNER, DEMO_PASSWORD);
    expect(third.status).toBe(429);
    expect(Number(third.headers['retry-after'])).toBeGreaterThan(0);
    expect((third.body as { detail: string }).detail).toBe('Wait a minute and try again.');
    expect((await caller.signIn(SUPERVISOR, DEMO_PASSWORD)).status).toBe(200);
  });

  it('do not let a guesser lock out the person whose account it is', async () => {
    for (const status of [401, 401, 429]) expect(await from('10.0.0.1', DESIGNER, 'wrong')).toBe(status);
    expect(await from('10.0.0.2', DESIGNER, DEMO_PASSWORD)).toBe(200);
  });

  it('stop guesses at one account that come from many addresses', async () => {
    for (let n = 0; n < 5; n += 1) expect(await from(`10.0.0.${n}`, DESIGNER, 'wrong')).toBe(401);
    expect(await from('10.0.0.9', DESIGNER, DEMO_PASSWORD)).toBe(429);
  });

  it('stop an address that tries many accounts', async () => {
    for (let n = 0; n < 8; n += 1) expect(await from('10.0.0.1', `n${n}@x.example`, 'a')).toBe(401);
    expect(await from('10.0.0.1', 'n9@x.example', 'a')).toBe(429);
    expect(await from('10.0.0.2', 'n9@x.example', 'a')).toBe(401);
  });

  it('do not count sign-ins that succeed, nor those that are under way', async () => {
    for (let n = 0; n < 4; n += 1) expect((await caller.signIn(DESIGNER, DEMO_PASSWORD)).status).toBe(200);
    const visitors = await Promise.all(Array.from({ length: 20 }, () => shop.visitor()));
    const answers = await Promise.all(visitors.map((visitor) => visitor.signIn(DESIGNER, DEMO_PASSWORD)));
    expect(answers.map((answer) => answer.status)).toEqual(Array<number>(20).fill(200));
  });

  it('count guesses that come all at once', async () => {
    const statuses = await Promise.all(Array.from({ length: 12 }, () => from('10.0.0.1', DESIGNER, 'wrong')));
    expect(statuses.filter((status) => status === 401).length).toBe(2);
    expect(statuses.filter((status) => status === 429).length).toBe(10);
  });

  it('compare one password at a time', async () => {
    let under = 0;
    let most = 0;
    spyOn(bcrypt, 'compare').and.callFake(async () => {
      most = Math.max(most, (under += 1));
      await shop.database.people.count();
      under -= 1;
      return false;
    });
    await Promise.all([1, 2, 3, 4, 5, 6].map((n) => from('10.0.0.1', `n${n}@x.example`, 'a')));
    expect(most).toBe(1);
  });
});
