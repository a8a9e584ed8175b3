import { partOf } from '../tests/support/plain-part';
import { solve } from './solve';
import { solveRequest } from './solve-request';

const STRIP = partOf([{ leg: 1 }]);
const pathsOf = (value: unknown): string[] => {
  const result = solveRequest(value);
  return result.ok ? [] : result.errors.map((error) => error.path);
};

describe('A request to solve', () => {
  it('is a bare document, or a document with its shop', () => {
    expect(solveRequest(STRIP)).toEqual(solve(STRIP));
    expect(solveRequest({ document: STRIP })).toEqual(solve(STRIP));
    expect(solveRequest({ document: STRIP, shop: {} })).toEqual(solve(STRIP));
    expect(solveRequest({ document: STRIP, shop: undefined })).toEqual(solve(STRIP));
  });

  it('hands the shop on', () => {
    const steep = partOf([{ leg: 1 }, { joggle: 0.1, run: 0.3, turn: 'up', radius: 0.05 }, { leg: 1 }]);
    const result = solveRequest({ document: steep, shop: { limits: { joggleRun: 5 } } });
    expect(result.ok && result.findings.map((finding) => finding.code)).toContain('joggle-run-steep');
  });

  it('is refused with the path of what is wrong', () => {
    for (const value of [null, 5, 'text', [], [STRIP]]) expect(pathsOf(value)).toEqual(['']);
    expect(pathsOf({ document: null })).toEqual(['']);
    expect(pathsOf({ document: STRIP, shop: 5 })).toEqual(['shop']);
    expect(pathsOf({ document: STRIP, shop: null })).toEqual(['shop']);
    expect(pathsOf({ document: STRIP, shop: [] })[0]).toBe('shop');
    expect(pathsOf({ document: STRIP, extra: 1 })).toEqual(['extra']);
    expect(pathsOf({ ...STRIP, document: STRIP })).toEqual(['format']);
    expect(pathsOf(Object.create({ document: STRIP }))).toContain('format');
  });
});
