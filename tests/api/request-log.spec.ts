import { CHANNEL, openTestShop } from '../support/test-shop';

describe('the log', () => {
  it('has a line a request, with the id that the caller sees, and nothing to act with', async () => {
    const lines: string[] = [];
    const shop = await openTestShop({ log: { write: (line) => void lines.push(line) } });
    const caller = await shop.signedIn('designer');
    lines.length = 0;
    const answer = await caller.post('/api/solve', CHANNEL).expect(200);
    await caller.post('/api/session', { email: 'a@b.example', password: 'a-typed-password' }).expect(401);
    await shop.close();
    expect(lines.length).toBe(2);
    expect(lines[0]).toContain(answer.headers['x-request-id']!);
    const text = lines.join('');
    expect(text).toContain('/api/solve');
    for (const secret of [caller.token, 'leafwright.session=', 'leafwright.visitor=', 'a-typed-password']) {
      expect(text).withContext(secret).not.toContain(secret);
    }
  });
});
