import type { Allowance, PartDocument } from '../part/document';
import type { Solved } from '../result';
import { solve } from '../solve';
import { workingOf, type WorkLine } from './working';

const DOCUMENT: PartDocument = {
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  allowance: { method: 'handbook' },
  chain: [
    { leg: 1, measure: 'inside' },
    { bend: 90, turn: 'up', radius: 0.16 },
    { leg: 2 },
    { joggle: 0.04, run: 0.3, turn: 'down', radius: 0.16 },
    { leg: 1 },
    { bend: 60, turn: 'down', radius: 0.125 },
    { leg: 1, measure: 'outside-edge' },
  ],
};

function solved(document: PartDocument): Solved {
  const result = solve(document);
  if (!result.ok) throw new Error(result.errors[0]?.message);
  return result;
}

const working = (document: PartDocument): ReturnType<typeof workingOf> => workingOf(document, solved(document));

/** Works a line's figures out by itself, from the text that a person reads. */
function workedOut({ figures }: WorkLine): number {
  const script = figures
    .replace(/−/g, '-')
    .replace(/·/g, '*')
    .replace(/π/g, 'Math.PI')
    .replace(/tan\(([\d.]+)°\/2\)/g, 'Math.tan($1 / 360 * Math.PI)')
    .replace(/log10/g, 'Math.log10');
  return new Function(`return ${script}`)() as number;
}

describe('the working of a layout', () => {
  it('gives each bend its setback, allowance and deduction by the rule in use', () => {
    const { bends } = working(DOCUMENT);
    expect(bends[0]?.lines.map(({ symbol }) => symbol)).toEqual(['SB', 'BA', 'BD']);
    expect(bends[0]?.lines[1]?.figures).toBe('(0.01743 · 0.16 + 0.0078 · 0.04) · 90');
    expect(bends[0]?.lines[1]?.value).toBeCloseTo(0.279072, 12);
  });

  it('has figures that give the value again, to the digits shown, for every method', () => {
    const methods: Allowance[] = [
      { method: 'handbook' },
      { method: 'din-6935' },
      { method: 'k-factor', k: 0.44 },
      { method: 'shop', k: 0.41 },
      { method: 'rule-90', hardness: 'hard' },
    ];
    for (const allowance of methods) {
      const { bends, total } = working({ ...DOCUMENT, allowance });
      for (const line of [...bends.flatMap(({ lines }) => lines), ...total]) {
        expect(workedOut(line))
          .withContext(`${allowance.method} ${line.rule}: ${line.figures}`)
          .toBeCloseTo(line.value, 3);
      }
    }
  });

  it('comes to the same developed length by flats + allowances and by mold lines − deductions, to 1e-9', () => {
    const { total } = working(DOCUMENT);
    const ways = total.filter(({ symbol }) => symbol === 'TDW').map(({ value }) => value);
    expect(ways.length).toBe(2);
    expect(Math.abs(ways[0]! - ways[1]!)).toBeLessThan(1e-9);
    expect(Math.abs(ways[0]! - solved(DOCUMENT).developedLength!)).toBeLessThan(1e-9);
  });

  it('leaves the mold-line way out where a 180° bend has no mold point', () => {
    const { total } = working({
      ...DOCUMENT,
      chain: [
        { leg: 1, measure: 'flat' },
        { bend: 180, turn: 'up', radius: 0.1 },
        { leg: 1, measure: 'outside-edge' },
      ],
    });
    expect(total.filter(({ symbol }) => symbol === 'TDW').length).toBe(1);
  });

  it('has no total where a leg is consumed', () => {
    expect(
      working({ ...DOCUMENT, chain: [{ leg: 0.1 }, { bend: 90, turn: 'up', radius: 0.16 }, { leg: 2 }] }).total,
    ).toEqual([]);
  });
});
