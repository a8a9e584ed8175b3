/** Another program holds the database: whoever writes is told soon, and what was refused is never done afterwards. */
import { join } from 'node:path';
import sqlite3 from 'sqlite3';
import type { Part } from '../../shared/contracts/parts';
import type { Problem } from '../../shared/contracts/problem';
import type { Revision } from '../../shared/contracts/revisions';
import { type Caller, CHANNEL, openTestShop, type TestShop } from '../support/test-shop';

/** A connection of another program. */
class Other {
  readonly #connection: sqlite3.Database;

  constructor(file: string) {
    this.#connection = new sqlite3.Database(file);
  }

  exec(sql: string): Promise<void> {
    return new Promise((resolve, reject) => {
      this.#connection.exec(sql, (error) => (error ? reject(error) : resolve()));
    });
  }

  close(): Promise<void> {
    return new Promise((resolve, reject) => {
      this.#connection.close((error) => (error ? reject(error) : resolve()));
    });
  }
}

describe('a database that another program has locked', () => {
  let shop: TestShop;
  let designer: Caller;
  let part: Part;
  let other: Other;

  beforeEach(async () => {
    shop = await openTestShop({ waits: { busy: 400, queue: 400 } });
    designer = await shop.signedIn('designer');
    part = (await designer.post('/api/parts', { number: 'T-1', title: 'Channel', document: CHANNEL })).body as Part;
    other = new Other(join(shop.folder, 'data', 'leafwright.sqlite'));
  });

  afterEach(async () => {
    await other.close();
    await shop.close();
  });

  it('tells every writer within the two waits, reads on, and does nothing of it afterwards', async () => {
    const path = `/api/parts/${part.id}/revisions/A`;
    const save = (width: number) => designer.put(path, { version: 1, document: { ...CHANNEL, width } });
    await other.exec('BEGIN IMMEDIATE');
    const started = Date.now();
    const answers = await Promise.all([1, 2, 3, 4, 5, 6, 7, 8].map(save));
    // One waits inside SQLite, one more may have got its turn when that gave up; nobody waits for the sum of all.
    expect(Date.now() - started).toBeLessThan(2500);
    for (const answer of answers) {
      expect(answer.status).toBe(503);
      expect((answer.body as Problem).type).toBe('/problems/unavailable');
      expect(answer.headers['retry-after']).toBe('5');
    }
    expect((await designer.get(path)).status).toBe(200);
    await other.exec('COMMIT');
    const saved = (await save(9).expect(200)).body as Revision;
    expect([saved.version, saved.document.width]).toEqual([2, 9]);
  });

  it('is taken for writing as soon as work begins, not when it first writes', async () => {
    await shop.database.write(async () => {
      await other.exec('PRAGMA busy_timeout = 0');
      await expectAsync(other.exec('BEGIN IMMEDIATE')).toBeRejectedWithError(/SQLITE_BUSY/);
    });
    await other.exec('BEGIN IMMEDIATE; COMMIT');
  });
});
