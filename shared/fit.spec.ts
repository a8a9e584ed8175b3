import { fitTo, type Giving, type Held } from './fit';
import type { PartDocument } from './part/document';
import { solve } from './solve';

const CHANNEL: PartDocument = {
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  allowance: { method: 'handbook' },
  variables: { W: '2' },
  chain: [
    { leg: 1 },
    { bend: 90, turn: 'up', radius: 0.16 },
    { leg: 'W' },
    { bend: 90, turn: 'up', radius: 0.16 },
    { leg: 1 },
  ],
};
const HAT: PartDocument = {
  seat: 2,
  ...CHANNEL,
  chain: [
    { leg: 0.75 },
    { bend: 60, turn: 'up', radius: 0.16 },
    { leg: 1.5 },
    { bend: 60, turn: 'down', radius: 0.16 },
    { leg: 1 },
    { bend: 60, turn: 'down', radius: 0.16 },
    { leg: 1.5 },
    { bend: 60, turn: 'up', radius: 0.16 },
    { leg: 0.75 },
  ],
};

function fitted(
  document: PartDocument,
  held: Held,
  size: number,
  giving: Giving,
): Extract<ReturnType<typeof fitTo>, { ok: true }> {
  const outcome = fitTo(document, held, size, giving);
  if (!outcome.ok) throw new Error(outcome.message);
  return outcome;
}

describe('fit', () => {
  it('gives a blank length to a leg or a variable, exactly', () => {
    const leg = fitted(CHANNEL, { figure: 'blank-length' }, 4, { chain: 0, field: 'leg' });
    expect(leg.exact).toBeTrue();
    expect(leg.value).toBeCloseTo(1 + 4 - 3.758144, 10);
    const variable = fitted(CHANNEL, { figure: 'blank-length' }, 4, { variable: 'W' });
    expect(variable.exact).toBeTrue();
    expect(variable.document.variables?.['W']).toBeCloseTo(2 + 4 - 3.758144, 10);
    const solved = solve(variable.document);
    expect(solved.ok && solved.developedLength).toBeCloseTo(4, 12);
  });

  it('searches where the size does not grow in a straight line, and says how near it came', () => {
    const { value, exact, residual } = fitted(HAT, { figure: 'envelope-height' }, 1.4, { chain: 2, field: 'leg' });
    expect(value).toBeGreaterThan(1.5);
    expect(exact || Math.abs(residual) < 1.4e-9).toBeTrue();
    const plain = { ...CHANNEL, chain: [{ leg: 2 }, ...CHANNEL.chain.slice(3)] };
    const angle = fitted(plain, { figure: 'envelope-height' }, 0.9, { chain: 1, field: 'bend' });
    expect(Math.abs(angle.residual)).toBeLessThan(1e-9);
    expect(angle.exact).toBeFalse();
  });

  it('holds an outside height', () => {
    const { value } = fitted(CHANNEL, { figure: 'height', leg: 0 }, 3, { variable: 'W' });
    expect(value).toBeCloseTo(3, 10);
  });

  it('says when it can not be done', () => {
    const say = (held: Held, size: number, giving: Giving): string => {
      const outcome = fitTo(CHANNEL, held, size, giving);
      return outcome.ok ? 'done' : outcome.message;
    };
    expect(say({ figure: 'blank-length' }, 0, { variable: 'W' })).toContain('above 0');
    expect(say({ figure: 'blank-length' }, 4, { variable: 'X' })).toContain('no such figure');
    expect(say({ figure: 'blank-length' }, 4, { chain: 9, field: 'leg' })).toContain('no such figure');
    expect(say({ figure: 'blank-length' }, 1, { variable: 'W' })).toContain('No figure for it');
    expect(say({ figure: 'height', leg: 1 }, 3, { variable: 'W' })).toContain('no such size');
  });
});
