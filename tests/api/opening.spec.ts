/** Opening a shop: what a first start makes, and what a later one may not change. */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Config } from '../../api/config';
import type { Database } from '../../api/models/database';
import { openShopDatabase } from '../../api/open-shop-database';
import { DEMO_PARTS } from '../../api/seeders/demo/demo-parts';
import { seedDemo } from '../../api/seeders/demo/seed-demo';
import { addAdministrator } from '../../api/services/first-administrator';
import { hashPassword } from '../../api/services/password';
import { personByPassword } from '../../api/services/people';
import { readShop } from '../../api/services/shop';
import type { RevisionRecord } from '../../api/models/revisions';
import type { Solved } from '../../shared/result';

const NOW = new Date('2026-03-02T08:00:00.000Z');
const PASSWORD = 'a-decent-passphrase-9';

describe('opening a shop', () => {
  let dataDir: string;
  let database: Database | undefined;

  beforeEach(() => {
    dataDir = mkdtempSync(join(tmpdir(), 'leafwright-opening-'));
  });

  afterEach(async () => {
    await database?.close();
    database = undefined;
    rmSync(dataDir, { recursive: true, force: true });
  });

  const quickSeed: typeof seedDemo = (db, now) => seedDemo(db, now, (password) => hashPassword(password, 4));

  const open = async (shop: Config['shop'], shopName: string | null = null, seed = quickSeed): Promise<Database> => {
    await database?.close();
    database = undefined;
    return (database = await openShopDatabase({ dataDir, shop, shopName }, NOW, seed));
  };

  it('fills a demo shop once', async () => {
    await open('demo');
    const db = await open('demo');
    expect(await db.people.count()).toBe(4);
    expect(await db.parts.count()).toBe(8);
  });

  it('makes demo parts that can be made: no stop, no caution, grain across, every figure there', async () => {
    const db = await open('demo');
    const revisions: RevisionRecord[] = await db.revisions.findAll({ raw: true });
    expect(revisions.length).toBe(DEMO_PARTS.length);
    for (const revision of revisions) {
      const result = JSON.parse(revision.result) as Solved;
      const name = revision.document.slice(0, 200);
      expect(result.findings.filter(({ level }) => level !== 'note'))
        .withContext(name)
        .toEqual([]);
      expect(result.developedLength).withContext(name).toBeGreaterThan(0);
      expect(result.blank.mass).withContext(name).not.toBeNull();
      expect(revision.document).toContain('"grain":"across"');
      expect(revision.outline).withContext(name).not.toBeNull();
    }
    const bends = await db.parts.findAll({ attributes: ['bends', 'unit'], raw: true });
    expect(Math.max(...bends.map((part) => part.bends))).toBe(12);
    expect(new Set(bends.map((part) => part.unit))).toEqual(new Set(['in', 'mm'] as const));
  });

  it('goes on where a first start was cut short', async () => {
    const cut: typeof seedDemo = async (db, now) => {
      await quickSeed(db, now);
      const [part] = await db.parts.findAll({ limit: 1 });
      const revision = await db.revisions.findOne({ where: { partId: part!.id } });
      await db.revisionEditors.destroy({ where: { revisionId: revision!.id } });
      await revision!.destroy();
      await part!.destroy();
      throw new Error('power cut');
    };
    await expectAsync(open('demo', null, cut)).toBeRejectedWithError('power cut');
    const db = await open('demo');
    expect(await db.people.count()).toBe(4);
    expect(await db.parts.count()).toBe(8);
  });

  it('leaves an own shop empty, and names it when told', async () => {
    let db = await open('own');
    expect([await db.people.count(), await db.parts.count()]).toEqual([0, 0]);
    expect((await readShop(db))?.name).toBe('Our shop');
    db = await open('own', 'Vale Sheet Metal');
    db = await open('own');
    expect((await readShop(db))?.name).toBe('Vale Sheet Metal');
  });

  it('refuses to open one kind as the other, in plain words', async () => {
    await open('demo');
    await expectAsync(open('own')).toBeRejectedWithError(/holds a demo shop; this start is for a shop of your own/);
    await open('demo');
    rmSync(dataDir, { recursive: true, force: true });
    await open('own');
    await expectAsync(open('demo')).toBeRejectedWithError(/holds a shop of your own.*Set SHOP=own/);
  });

  it('gives an own shop its first administrator, and another only when wanted', async () => {
    const db = await open('own');
    const add = (email: string, another = false, password = PASSWORD) =>
      addAdministrator(db, { email, name: 'Ada Vane', password, another, also: [] }, NOW);
    expect(await add('Ada@Shop.example')).toEqual(jasmine.objectContaining({ ok: true }));
    expect((await personByPassword(db, 'ADA@shop.example', PASSWORD))?.roles).toEqual(['administrator']);
    expect(await add('bo@shop.example')).toEqual(jasmine.objectContaining({ ok: false }));
    expect(await add('ada@shop.example', true)).toEqual(jasmine.objectContaining({ ok: false }));
    expect(await add('bo@shop.example', true)).toEqual(jasmine.objectContaining({ ok: true }));
    expect(await add('no address', true)).toEqual(jasmine.objectContaining({ ok: false }));
    expect(await add('cy@shop.example', true, 'short')).toEqual(jasmine.objectContaining({ ok: false }));
    expect(await db.people.count()).toBe(2);
  });

  it('gives a demo shop no administrator of its own', async () => {
    const db = await open('demo');
    const wanted = { email: 'ada@shop.example', name: 'Ada Vane', password: PASSWORD, another: true, also: [] };
    expect(await addAdministrator(db, wanted, NOW)).toEqual({
      ok: false,
      message: 'A demo shop has its demo people and no others.',
    });
  });
});
