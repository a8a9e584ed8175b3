import { chmodSync, existsSync, mkdirSync, mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { prepareDataFolder } from './data-folder';

describe('the data folder', () => {
  let above: string;
  let folder: string;
  let database: string;

  beforeEach(() => {
    above = mkdtempSync(join(tmpdir(), 'leafwright-data-folder-'));
    folder = join(above, 'deep', 'data');
    database = join(folder, 'leafwright.sqlite');
  });

  afterEach(() => rmSync(above, { recursive: true, force: true }));

  const mode = (path: string): string => (statSync(path).mode & 0o777).toString(8);

  function open(...names: string[]): void {
    mkdirSync(folder, { recursive: true });
    chmodSync(folder, 0o755);
    for (const name of names) {
      writeFileSync(join(folder, name), name);
      chmodSync(join(folder, name), 0o644);
    }
  }

  it('is made for its owner only, with an empty database in it', () => {
    expect(prepareDataFolder(folder)).toBe(database);
    expect([mode(folder), mode(database), statSync(database).size]).toEqual(['700', '600', 0]);
  });

  it('is closed to others where it stood open, with all that is ours in it', () => {
    const names = ['leafwright.sqlite', 'leafwright.sqlite-wal', 'leafwright.sqlite-shm', 'session-secret'];
    open(...names);
    prepareDataFolder(folder);
    expect(mode(folder)).toBe('700');
    for (const name of names) {
      expect(mode(join(folder, name)))
        .withContext(name)
        .toBe('600');
      expect(statSync(join(folder, name)).size)
        .withContext(name)
        .toBe(name.length);
    }
  });

  it('that holds other things stays as open as it is, and so do they', () => {
    open('leafwright.sqlite', 'letter.txt');
    prepareDataFolder(folder);
    expect([mode(folder), mode(join(folder, 'letter.txt')), mode(database)]).toEqual(['755', '644', '600']);
  });

  it('never gets rights that it did not have', () => {
    open('session-secret');
    chmodSync(join(folder, 'session-secret'), 0o444);
    prepareDataFolder(folder);
    expect(mode(join(folder, 'session-secret'))).toBe('400');
  });

  it('is no file, and nothing below one', () => {
    writeFileSync(join(above, 'deep'), '');
    expect(() => prepareDataFolder(join(above, 'deep'))).toThrowMatching((error) => error.code === 'EEXIST');
    expect(() => prepareDataFolder(folder)).toThrowMatching((error) => error.code === 'ENOTDIR');
    expect(existsSync(folder)).toBeFalse();
  });
});
