import { ConnectionError, DatabaseError } from 'sequelize';
import { StartRefused } from './config';
import { startRefusal } from './start-refusal';

const coded = (code: string) => Object.assign(new Error(code), { code, sql: '' });

describe('why the data folder keeps the shop from opening', () => {
  for (const [code, words] of [
    ['SQLITE_CANTOPEN', /can’t be opened/],
    ['SQLITE_READONLY', /can only be read/],
    ['SQLITE_NOTADB', /is not a Leafwright database/],
    ['SQLITE_CORRUPT', /is damaged/],
    ['SQLITE_BUSY', /another program/],
    ['SQLITE_FULL', /full/],
    ['SQLITE_IOERR', /could not be read or written/],
  ] as const) {
    it(`is a plain sentence for ${code}, however it is wrapped`, () => {
      for (const error of [coded(code), new DatabaseError(coded(code)), new ConnectionError(coded(code))]) {
        const refusal = startRefusal(error, '/srv/shop') as Error;
        expect(refusal).toBeInstanceOf(StartRefused);
        expect(refusal.message).toMatch(words);
        expect(refusal.message).toContain('/srv/shop');
      }
    });
  }

  for (const [code, words] of [
    ['EACCES', /no right to/],
    ['EPERM', /no right to/],
    ['EROFS', /can only be read/],
    ['EEXIST', /is not a folder/],
    ['ENOTDIR', /is not a folder/],
    ['EISDIR', /is a folder/],
    ['ENOSPC', /full/],
    ['ENOENT', /can’t be made/],
  ] as const) {
    it(`is a plain sentence for ${code}`, () => {
      const refusal = startRefusal(coded(code), '/srv/shop') as Error;
      expect(refusal).toBeInstanceOf(StartRefused);
      expect(refusal.message).toMatch(words);
    });
  }

  it('leaves a bug what it is, and a refusal with its own words', () => {
    const bug = new TypeError('x is not a function');
    expect(startRefusal(bug, '/srv/shop')).toBe(bug);
    expect(startRefusal(coded('SQLITE_ERROR'), '/srv/shop')).not.toBeInstanceOf(StartRefused);
    const refused = new StartRefused('Because.');
    expect(startRefusal(refused, '/srv/shop')).toBe(refused);
    expect(startRefusal(undefined, '/srv/shop')).toBeUndefined();
  });
});
