import { DEMO_PASSWORD } from '../../api/demo-shop';
import { CHANNEL, openTestShop, type TestShop } from '../support/test-shop';

const SIGN_IN = { email: 'designer@harrowcreek.example', password: DEMO_PASSWORD };

describe('changing requests', () => {
  let shop: TestShop;

  beforeAll(async () => {
    shop = await openTestShop();
  });

  afterAll(() => shop.close());

  it('need a token', async () => {
    const caller = await shop.signedIn('designer');
    caller.token = '';
    const answer = await caller.post('/api/solve', CHANNEL);
    expect(answer.status).toBe(403);
    expect((answer.body as { type: string }).type).toBe('/problems/csrf');
  });

  it('need the token of their own session, not of another', async () => {
    const [one, other] = [await shop.signedIn('designer'), await shop.signedIn('designer')];
    one.token = other.token;
    expect((await one.post('/api/solve', CHANNEL)).status).toBe(403);
  });

  it('need a token from after the sign-in', async () => {
    const caller = await shop.visitor();
    const before = caller.token;
    await caller.signIn(SIGN_IN.email, SIGN_IN.password);
    caller.token = before;
    expect((await caller.post('/api/solve', CHANNEL)).status).toBe(403);
  });

  for (const token of ['x', '.', 'a.b', 'a.b.c', '%00', 'é'.normalize('NFD').slice(0, 1) + '.'.repeat(3)]) {
    it(`are refused with the token ${JSON.stringify(token)}`, async () => {
      const caller = await shop.visitor();
      caller.token = token;
      expect((await caller.post('/api/session', SIGN_IN)).status).toBe(403);
    });
  }

  it('are refused from another site, whatever token they bring', async () => {
    const caller = await shop.signedIn('designer');
    const from = (headers: Record<string, string>) => caller.post('/api/solve', CHANNEL).set(headers);
    expect((await from({ 'Sec-Fetch-Site': 'cross-site' })).status).toBe(403);
    expect((await from({ 'Sec-Fetch-Site': 'same-site' })).status).toBe(403);
    expect((await from({ Origin: 'http://elsewhere.example' })).status).toBe(403);
    expect((await from({ Origin: 'null' })).status).toBe(403);
    expect((await from({ 'Sec-Fetch-Site': 'same-origin' })).status).toBe(200);
    expect((await from({ Origin: 'http://shop.example', Host: 'shop.example' })).status).toBe(200);
  });

  it('are not needed for reading', async () => {
    const caller = await shop.signedIn('technician');
    caller.token = '';
    expect((await caller.get('/api/parts')).status).toBe(200);
  });
});
