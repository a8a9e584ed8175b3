/** The command that adds the first administrator: what it refuses leaves nothing behind. */
import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { openShopDatabase } from '../../api/open-shop-database';
import { Programs } from '../support/program';

const PASSWORD = 'a-decent-passphrase-9\n';

describe('npm run administrator', () => {
  const programs = new Programs();
  let folder: string;
  let dataDir: string;

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'leafwright-administrator-'));
    dataDir = join(folder, 'data');
  });

  afterEach(async () => {
    await programs.stop();
    rmSync(folder, { recursive: true, force: true });
  });

  async function add(
    email: string,
    env: Record<string, string | undefined> = {},
    password = PASSWORD,
    more: readonly string[] = [],
  ) {
    const args = ['--email', email, '--name', 'Ada Vane', ...more];
    const all = { SHOP: undefined, DATA_DIR: dataDir, ...env };
    const program = programs.start('api/cli/add-administrator.ts', args, all, { input: password });
    return { code: await program.ended, said: program.said.text };
  }

  const kind = async (): Promise<string | undefined> => {
    const database = await openShopDatabase({ dataDir, shop: 'own', shopName: null });
    const shop = await database.shop.findByPk(1);
    await database.close();
    return shop?.kind;
  };

  it('founds a shop of one’s own, also where SHOP is empty, and adds the person', async () => {
    expect(await add('ada@shop.example', { SHOP: '' })).toEqual({
      code: 0,
      said: 'Ada Vane (ada@shop.example) is an administrator now.\n',
    });
    expect(await kind()).toBe('own');
  }, 30_000);

  it('gives roles besides, so that somebody alone can also draw, and knows no others', async () => {
    const also = (...roles: string[]) =>
      add(
        'ada@shop.example',
        {},
        PASSWORD,
        roles.flatMap((role) => ['--also', role]),
      );
    expect((await also('welder')).said).toMatch(/^There is no role "welder"/);
    expect(existsSync(dataDir)).toBeFalse();
    const added = await also('designer', 'supervisor');
    expect(added.said).toBe('Ada Vane (ada@shop.example) is an administrator now, and designer, and supervisor.\n');
    const database = await openShopDatabase({ dataDir, shop: 'own', shopName: null });
    const person = await database.people.findOne({ where: { email: 'ada@shop.example' } });
    await database.close();
    // SQLite hands JSON back as it is stored, a text.
    expect(JSON.parse(String(person?.roles))).toEqual(['administrator', 'designer', 'supervisor']);
  }, 30_000);

  it('founds nothing where the address, the password or the kind of shop is refused', async () => {
    expect(await add('no address')).toEqual({ code: 1, said: 'That is not an e-mail address.\n' });
    expect(await add('ada@shop.example', {}, 'short\n')).toEqual({ code: 1, said: 'Use 12 characters or more.\n' });
    const demo = await add('ada@shop.example', { SHOP: 'demo' });
    expect(demo.code).toBe(1);
    expect(demo.said).toMatch(/^A demo shop has its demo people and no others\./);
    expect(existsSync(dataDir)).toBeFalse();
  }, 30_000);

  it('does not advise on a demo folder what it would refuse too', async () => {
    const database = await openShopDatabase({ dataDir, shop: 'demo', shopName: null }, new Date(), () =>
      Promise.resolve(),
    );
    await database.close();
    const refused = await add('ada@shop.example');
    expect(refused.code).toBe(1);
    expect(refused.said).toMatch(/^A demo shop has its demo people and no others\./);
    expect(refused.said).toContain('DATA_DIR');
    expect(refused.said).not.toContain('SHOP=demo');
  }, 30_000);

  it('says in one plain line that the data folder can’t be used', async () => {
    writeFileSync(dataDir, '');
    const refused = await add('ada@shop.example');
    expect(refused.code).toBe(1);
    expect(refused.said).toMatch(/^[^\n]* is not a folder\.[^\n]*\n$/);
  }, 30_000);
});
