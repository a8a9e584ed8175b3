/** Who may do what: every route, for every role and for a visitor. */
import type { Role } from '../../shared/contracts/session';
import { ROLES } from '../../shared/contracts/session';
import type { Part } from '../../shared/contracts/parts';
import { mountedRoutes } from '../support/mounted-routes';
import { type Caller, CHANNEL, openTestShop, type TestShop } from '../support/test-shop';

interface Row {
  readonly route: string;
  /** Status for whoever may. */
  readonly may: number;
  readonly who: 'anybody' | 'signed-in' | readonly Role[];
  readonly call: (caller: Caller, part: Part, n: number) => ReturnType<Caller['get']>;
}

const revisionPath = (part: Part): string => `/api/parts/${part.id}/revisions/A`;

const ROWS: readonly Row[] = [
  { route: 'get /healthz', may: 200, who: 'anybody', call: (caller) => caller.get('/healthz') },
  { route: 'get /api/session', may: 200, who: 'anybody', call: (caller) => caller.get('/api/session') },
  // 422, not 403: anybody may try to sign in.
  { route: 'post /api/session', may: 422, who: 'anybody', call: (caller) => caller.post('/api/session', {}) },
  { route: 'get /api/openapi.json', may: 200, who: 'anybody', call: (caller) => caller.get('/api/openapi.json') },
  { route: 'get /api/parts', may: 200, who: 'signed-in', call: (caller) => caller.get('/api/parts') },
  {
    route: 'post /api/parts',
    may: 201,
    who: ['designer'],
    call: (caller, _part, n) => caller.post('/api/parts', { number: `A-${n}`, title: 'Angle', document: CHANNEL }),
  },
  { route: 'get /api/parts/:id', may: 200, who: 'signed-in', call: (c, part) => c.get(`/api/parts/${part.id}`) },
  {
    route: 'patch /api/parts/:id',
    may: 200,
    who: ['designer'],
    call: (caller, part) => caller.patch(`/api/parts/${part.id}`, { version: 1, title: 'Another title' }),
  },
  {
    route: 'get /api/parts/:id/revisions/:letter',
    may: 200,
    who: 'signed-in',
    call: (caller, part) => caller.get(revisionPath(part)),
  },
  {
    route: 'put /api/parts/:id/revisions/:letter',
    may: 200,
    who: ['designer'],
    call: (caller, part) => caller.put(revisionPath(part), { version: 1, document: CHANNEL }),
  },
  {
    route: 'get /api/parts/:id/revisions/:letter/blank.pdf',
    may: 200,
    who: 'signed-in',
    call: (caller, part) => caller.get(`${revisionPath(part)}/blank.pdf`),
  },
  { route: 'post /api/solve', may: 200, who: 'signed-in', call: (caller) => caller.post('/api/solve', CHANNEL) },
  // Last: it ends the session of the caller.
  { route: 'delete /api/session', may: 200, who: 'anybody', call: (caller) => caller.delete('/api/session') },
];

describe('access', () => {
  let shop: TestShop;
  let part: Part;
  const callers = new Map<Role | 'visitor', Caller>();

  beforeAll(async () => {
    shop = await openTestShop();
    callers.set('visitor', await shop.visitor());
    for (const role of ROLES) callers.set(role, await shop.signedIn(role));
    const made = await callers.get('designer')!.post('/api/parts', { number: 'A', title: 'T', document: CHANNEL });
    part = made.body as Part;
  });

  afterAll(() => shop.close());

  it('is laid down here for every route that is mounted', () => {
    expect(ROWS.map((row) => row.route).sort()).toEqual(mountedRoutes(shop.express).sort());
  });

  // One spec in order: the rows end with signing out.
  it('is as the table says', async () => {
    let n = 0;
    for (const row of ROWS) {
      for (const [who, caller] of callers) {
        const open = row.who === 'anybody';
        const allowed = open || (who !== 'visitor' && (row.who === 'signed-in' || row.who.includes(who)));
        const status = allowed ? row.may : who === 'visitor' ? 401 : 403;
        const answer = await row.call(caller, part, (n += 1));
        expect(answer.status).withContext(`${row.route} as ${who}`).toBe(status);
      }
    }
  });
});
