import { type Caller, openTestShop, type TestShop } from '../support/test-shop';

const PAGE = `<!doctype html><html><body class="x">\n  <lw-app></lw-app>\n  <script src="main-ABCDEF12.js"></script></body></html>`;

describe('the app’s files', () => {
  let shop: TestShop;
  let visitor: Caller;

  beforeAll(async () => {
    shop = await openTestShop({
      appFiles: { 'index.html': PAGE, 'main-ABCDEF12.js': 'console.log(1);', 'mark.svg': '<svg/>' },
    });
    visitor = await shop.visitor();
  });

  afterAll(() => shop.close());

  const navigate = (path: string) => visitor.get(path).set('Accept', 'text/html,application/xhtml+xml,*/*;q=0.8');

  it('give the first page at every address that a person may keep', async () => {
    for (const path of ['/', '/sign-in', '/parts', '/parts/HC-2101', '/index.html', '/parts?search=a.b']) {
      const answer = await navigate(path);
      expect(answer.status).withContext(path).toBe(200);
      expect(answer.headers['content-type']).toContain('text/html');
      expect(answer.headers['cache-control']).toBe('no-cache');
      expect(answer.text).toContain('<lw-app');
    }
  });

  it('give the first page a nonce of its own, the one its policy names', async () => {
    const answers = [await navigate('/'), await navigate('/')];
    const nonces = answers.map((answer) => /<lw-app ngCspNonce="([^"]+)">/.exec(answer.text)?.[1]);
    expect(nonces[0]).toBeDefined();
    expect(nonces[0]).not.toBe(nonces[1]);
    expect(answers[0]?.headers['content-security-policy']).toContain(`'nonce-${nonces[0]}'`);
  });

  it('are kept for good when their name holds a hash, else asked for again', async () => {
    const chunk = await visitor.get('/main-ABCDEF12.js').expect(200);
    expect(chunk.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect((await visitor.get('/mark.svg').expect(200)).headers['cache-control']).toBe('no-cache');
  });

  it('are missing when they are missing: no page in place of a chunk, a picture or an answer', async () => {
    for (const path of ['/chunk-ZZZZZZZZ.js', '/parts/x.svg', '/api/nothing']) {
      expect((await navigate(path)).status)
        .withContext(path)
        .toBe(404);
    }
    expect((await visitor.get('/parts').set('Accept', 'application/json')).status).toBe(404);
    expect((await visitor.post('/parts', {})).status).toBe(404);
  });

  it('give the first page to those who read it, by either of its addresses', async () => {
    expect((await visitor.agent.head('/index.html')).status).toBe(200);
    for (const method of ['post', 'put', 'patch', 'delete', 'options'] as const) {
      const answer = await visitor.agent[method]('/index.html');
      expect(answer.status).withContext(method).toBe(405);
      expect(answer.headers['allow']).toBe('GET, HEAD');
      expect(answer.headers['content-type']).toContain('application/problem+json');
    }
  });

  it('allow no script and no request from elsewhere', async () => {
    const policy = (await navigate('/')).headers['content-security-policy'] ?? '';
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain("script-src 'self';");
    expect(policy).toContain("style-src-attr 'none'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toContain('upgrade-insecure-requests');
    expect(policy).not.toContain('unsafe-eval');
    expect(policy).not.toContain('unsafe-inline');
    expect(policy).not.toMatch(/https?:|\*/);
  });

  it('never lead outside their folder', async () => {
    for (const path of [
      '/../package.json',
      '/..%2fpackage.json',
      '/../data/leafwright.sqlite',
      '/%2e%2e/data/leafwright.sqlite',
      '/.git/config',
    ]) {
      expect((await visitor.get(path)).status)
        .withContext(path)
        .not.toBe(200);
    }
  });
});
