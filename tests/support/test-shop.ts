/** A real shop for a test: the very app, on a real SQLite file in a folder of its own, with a clock that the test moves. */
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { DestinationStream } from 'pino';
import supertest from 'supertest';
import { createApp } from '../../api/app';
import { makeLog } from '../../api/middleware/request-log';
import type { SignInLimits } from '../../api/middleware/sign-in-limits';
import type { Waits } from '../../api/models/database';
import { openShopDatabase } from '../../api/open-shop-database';
import { DEMO_PASSWORD } from '../../api/demo-shop';
import { seedDemo } from '../../api/seeders/demo/seed-demo';
import { hashPassword } from '../../api/services/password';
import type { Role, Session } from '../../shared/contracts/session';
import type { PartDocument } from '../../shared/part/document';

/** The cheapest hash there is: what is tested is who gets in, not how long a guess takes. */
const quickHash = (password: string): Promise<string> => hashPassword(password, 4);

export interface TestShopOptions {
  readonly shop?: 'demo' | 'own';
  readonly signInLimits?: SignInLimits;
  readonly trustedProxies?: number;
  /** How long writers wait, for a test in which they wait in vain. */
  readonly waits?: Waits;
  /** Files of a built app, by name. */
  readonly appFiles?: Readonly<Record<string, string>>;
  readonly log?: DestinationStream;
}

export async function openTestShop(options: TestShopOptions = {}) {
  const folder = mkdtempSync(join(tmpdir(), 'leafwright-test-'));
  const appFolder = join(folder, 'app');
  mkdirSync(appFolder);
  for (const [name, text] of Object.entries(options.appFiles ?? {})) writeFileSync(join(appFolder, name), text);
  const clock = { now: new Date('2026-03-02T08:00:00.000Z') };
  const config = { dataDir: join(folder, 'data'), shop: options.shop ?? 'demo', shopName: null } as const;
  const database = await openShopDatabase(config, clock.now, (db, now) => seedDemo(db, now, quickHash), options.waits);
  const app = createApp({
    database,
    secret: 'a secret of the tests, longer than thirty-two characters',
    log: makeLog({ logLevel: options.log ? 'info' : 'silent' }, options.log),
    version: '0.0.0',
    appFolder,
    trustedProxies: options.trustedProxies ?? 0,
    now: () => clock.now,
    ...(options.signInLimits ? { signInLimits: options.signInLimits } : {}),
  });
  return {
    folder,
    database,
    express: app.express,
    clock,
    visitor: () => Caller.arrive(app.express),
    signedIn: (role: Role) => Caller.signedIn(app.express, role),
    passHours(hours: number): void {
      clock.now = new Date(clock.now.getTime() + hours * 60 * 60 * 1000);
    },
    async close(): Promise<void> {
      app.stop();
      await database.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

export type TestShop = Awaited<ReturnType<typeof openTestShop>>;

type Express = ReturnType<typeof createApp>['express'];

/** A browser as the server sees one: it keeps cookies and sends the token back. */
export class Caller {
  readonly agent: ReturnType<typeof supertest.agent>;
  token = '';

  private constructor(express: Express) {
    this.agent = supertest.agent(express);
  }

  static async arrive(express: Express): Promise<Caller> {
    const caller = new Caller(express);
    caller.token = ((await caller.agent.get('/api/session').expect(200)).body as Session).csrfToken;
    return caller;
  }

  static async signedIn(express: Express, role: Role): Promise<Caller> {
    const caller = await Caller.arrive(express);
    const answer = await caller.signIn(`${role}@harrowcreek.example`, DEMO_PASSWORD);
    if (answer.status !== 200) throw new Error(`Sign-in as ${role}: ${answer.status} ${answer.text}`);
    return caller;
  }

  async signIn(email: string, password: string): Promise<supertest.Response> {
    const answer = await this.post('/api/session', { email, password });
    if (answer.status === 200) this.token = (answer.body as Session).csrfToken;
    return answer;
  }

  get(path: string): supertest.Test {
    return this.agent.get(path);
  }

  post(path: string, body: unknown): supertest.Test {
    return this.send('post', path, body);
  }

  put(path: string, body: unknown): supertest.Test {
    return this.send('put', path, body);
  }

  patch(path: string, body: unknown): supertest.Test {
    return this.send('patch', path, body);
  }

  delete(path: string): supertest.Test {
    return this.agent.delete(path).set('X-CSRF-Token', this.token);
  }

  /** A body exactly as given. */
  raw(method: 'post' | 'put' | 'patch', path: string, text: string, type = 'application/json'): supertest.Test {
    return this.agent[method](path).set('X-CSRF-Token', this.token).set('Content-Type', type).send(text);
  }

  private send(method: 'post' | 'put' | 'patch', path: string, body: unknown): supertest.Test {
    return this.raw(method, path, JSON.stringify(body));
  }
}

/** The handbook channel: flats 0.80 / 1.60 / 0.80. */
export const CHANNEL: PartDocument = {
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  material: '2024-T3',
  width: 6,
  allowance: { method: 'handbook' },
  chain: [
    { leg: 1, name: 'Left flange' },
    { bend: 90, turn: 'up', radius: 0.16 },
    { leg: 2, name: 'Web' },
    { bend: 90, turn: 'up', radius: 0.16 },
    { leg: 1, name: 'Right flange' },
  ],
};
