import { DatabaseError, TimeoutError } from 'sequelize';
import { problemOf } from './error-handler';
import { ProblemError } from './problem';

const sqlite = (code: string) => Object.assign(new Error(code), { code, sql: '' });

describe('problem of an error', () => {
  it('is the problem that a route has thrown', () => {
    expect(problemOf(new ProblemError('taken')).status).toBe(409);
  });

  for (const code of ['SQLITE_BUSY', 'SQLITE_FULL', 'SQLITE_READONLY', 'SQLITE_IOERR', 'SQLITE_CANTOPEN']) {
    it(`is “unavailable” for ${code}: the work can be sent again`, () => {
      expect(problemOf(new DatabaseError(sqlite(code))).status).toBe(503);
      expect(problemOf(new TimeoutError(sqlite(code))).status).toBe(503);
      expect(problemOf(sqlite(code)).status).toBe(503);
    });
  }

  it('says nothing of the inside of a bug', () => {
    for (const error of [
      new Error('secret path /srv'),
      new DatabaseError(sqlite('SQLITE_ERROR')),
      null,
      'text',
      undefined,
    ]) {
      const answer = problemOf(error);
      expect(answer).toEqual({
        type: '/problems/internal',
        title: 'Something went wrong on the server.',
        status: 500,
      });
    }
  });

  it('does not take a status above the 400s on trust', () => {
    expect(problemOf(Object.assign(new Error('x'), { status: 502 })).status).toBe(500);
    expect(problemOf(Object.assign(new Error('x'), { status: 499 })).status).toBe(400);
    expect(problemOf(Object.assign(new Error('x'), { status: 399 })).status).toBe(500);
  });
});
