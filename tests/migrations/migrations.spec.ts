/** Every state of the database that was ever shipped still opens, with what was in it. */
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sqlite3 from 'sqlite3';
import { listPartsSchema } from '../../shared/contracts/parts';
import { migrate } from '../../api/migrations/migrate';
import { MIGRATIONS } from '../../api/migrations/migrations';
import { type Database, openDatabase } from '../../api/models/database';
import { openShopDatabase } from '../../api/open-shop-database';
import { readPart } from '../../api/services/parts';
import { personByPassword } from '../../api/services/people';
import { listParts } from '../../api/services/register';

const FIXTURES = join(__dirname, 'fixtures');

function load(file: string, sql: string): Promise<void> {
  return new Promise((resolve, reject) => {
    const database = new sqlite3.Database(file);
    database.exec(sql, (error) => {
      if (error) reject(error);
      else database.close((failed) => (failed ? reject(failed) : resolve()));
    });
  });
}

describe('migrations', () => {
  let folder: string;
  let database: Database;

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'leafwright-migrations-'));
  });

  afterEach(async () => {
    await database.close();
    rmSync(folder, { recursive: true, force: true });
  });

  const tables = async (): Promise<unknown[]> => {
    const query = "SELECT type, name, sql FROM sqlite_schema WHERE name NOT LIKE 'sqlite_%' ORDER BY name";
    return (await database.sequelize.query(query))[0];
  };

  const anew = async (): Promise<void> => {
    database = openDatabase(join(folder, 'new.sqlite'));
    await migrate(database);
  };

  it('make every table from nothing, and nothing twice', async () => {
    database = openDatabase(join(folder, 'new.sqlite'));
    expect(await migrate(database)).toEqual(MIGRATIONS.map((migration) => migration.name));
    expect(await migrate(database)).toEqual([]);
  });

  it('leave a fixture each', async () => {
    await anew();
    const names = readdirSync(FIXTURES).map((name) => name.replace('.sql', ''));
    expect(names.sort()).toEqual(MIGRATIONS.map((migration) => migration.name).sort());
  });

  for (const fixture of readdirSync(FIXTURES)) {
    it(`bring ${fixture} up to the newest tables, with everything in it`, async () => {
      await anew();
      const newest = await tables();
      await database.close();

      mkdirSync(join(folder, 'data'));
      await load(join(folder, 'data', 'leafwright.sqlite'), readFileSync(join(FIXTURES, fixture), 'utf8'));
      database = await openShopDatabase({ dataDir: join(folder, 'data'), shop: 'demo', shopName: null });
      expect(await tables()).toEqual(newest);

      const designer = await personByPassword(database, 'designer@harrowcreek.example', 'harrow-creek-demo');
      expect(designer?.name).toBe('Ilka Dornbach');
      const listed = await listParts(database, listPartsSchema.parse({ sort: 'number' }));
      if (!listed.ok) throw new Error('The register did not open.');
      expect(listed.value.parts.map((part) => part.number)).toEqual(['HC-2102-1', 'HC-2107-1']);
      const versions = listed.value.parts.map(async ({ id }) => (await readPart(database, id))?.version);
      expect(await Promise.all(versions)).toEqual([1, fixture < '0002' ? 1 : 3]);
      const channel = await readPart(database, listed.value.parts[0]!.id);
      expect(channel?.revision.result.developedLength).toBeCloseTo(3.758, 3);
      expect(channel?.revision.editors).toEqual(['Ilka Dornbach']);
    });
  }

  it('refuse a database from a newer program, and leave it as it is', async () => {
    await anew();
    await database.sequelize.query("INSERT INTO migrations VALUES ('9999-later', '2030-01-01')");
    await expectAsync(migrate(database)).toBeRejectedWithError(/newer Leafwright \(it knows 9999-later\)/);
  });

  it('are done whole or not at all', async () => {
    await anew();
    const before = await tables();
    const broken = { name: '9998-broken', statements: ['CREATE TABLE half (x TEXT)', 'CREATE TABLE'] };
    await expectAsync(migrate(database, [...MIGRATIONS, broken])).toBeRejected();
    expect(await tables()).toEqual(before);
    expect(await migrate(database)).toEqual([]);
  });
});

describe('a database', () => {
  let folder: string;
  let database: Database;

  beforeEach(async () => {
    folder = mkdtempSync(join(tmpdir(), 'leafwright-database-'));
    database = openDatabase(join(folder, 'x.sqlite'));
    await migrate(database);
  });

  afterEach(async () => {
    await database.close();
    rmSync(folder, { recursive: true, force: true });
  });

  const pragma = async (name: string): Promise<unknown> => {
    const [rows] = await database.sequelize.query(`SELECT * FROM pragma_${name}`);
    return Object.values((rows as object[])[0] ?? {})[0];
  };

  it('is opened so that nothing saved is lost and nothing points nowhere', async () => {
    expect(await pragma('journal_mode')).toBe('wal');
    expect(await pragma('synchronous')).toBe(2);
    expect(await pragma('foreign_keys')).toBe(1);
    expect(await pragma('busy_timeout')).toBe(5000);
  });

  it('is opened so for every transaction too', async () => {
    await database.write(async (transaction) => {
      const [rows] = await database.sequelize.query('SELECT * FROM pragma_foreign_keys', { transaction });
      expect(rows).toEqual([{ foreign_keys: 1 }]);
    });
    const orphan = "INSERT INTO revision_editors VALUES ('no revision', 'nobody', '', '')";
    await expectAsync(
      database.write((transaction) => database.sequelize.query(orphan, { transaction })),
    ).toBeRejected();
  });

  it('takes many writers at once, one after the other', async () => {
    const at = '2026-01-01';
    const people = Array.from({ length: 40 }, (_, n) => ({
      id: `${n}`,
      email: `p${n}@shop.example`,
      name: 'P',
      passwordHash: '',
      roles: [],
      createdAt: at,
    }));
    await Promise.all(
      people.map((person) => database.write((transaction) => database.people.create(person, { transaction }))),
    );
    expect(await database.people.count()).toBe(40);
  });

  it('keeps nothing of work that fails half way, and goes on', async () => {
    const failing = database.write(async (transaction) => {
      await database.shop.create({ id: 1, name: 'X', kind: 'own', createdAt: '', filledAt: null }, { transaction });
      throw new Error('half way');
    });
    await expectAsync(failing).toBeRejectedWithError('half way');
    expect(await database.shop.count()).toBe(0);
    await database.write((transaction) =>
      database.shop.create({ id: 1, name: 'X', kind: 'own', createdAt: '', filledAt: null }, { transaction }),
    );
    expect(await database.shop.count()).toBe(1);
  });
});
