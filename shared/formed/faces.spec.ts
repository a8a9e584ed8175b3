import { bendDown, bendUp, figuresOf, partOf } from '../../tests/support/plain-part';
import type { FaceElement, XY } from '../result';

const formedOf = (chain: readonly unknown[], more: Record<string, unknown> = {}) =>
  figuresOf(partOf(chain, more)).formed!;
const arcsOf = (face: readonly FaceElement[]) => face.flatMap((element) => ('arc' in element ? [element.arc] : []));
const near = (point: XY | undefined, x: number, y: number): void => {
  expect(point?.[0]).toBeCloseTo(x, 12);
  expect(point?.[1]).toBeCloseTo(y, 12);
};

describe('The faces of the formed part', () => {
  it('of a strip are two lines, the sheet between y = 0 and y = T', () => {
    expect(formedOf([{ leg: 2 }]).faces).toEqual({
      upper: [
        {
          line: [
            [0, 0.04],
            [2, 0.04],
          ],
        },
      ],
      lower: [
        {
          line: [
            [0, 0],
            [2, 0],
          ],
        },
      ],
    });
  });

  it('of an up bend turn toward +y, the upper face inside', () => {
    const { faces } = formedOf([{ leg: 6 }, bendUp(90, 0.125), { leg: 8 }]);
    const [inner] = arcsOf(faces!.upper);
    const [outer] = arcsOf(faces!.lower);
    near(inner!.centre, 5.835, 0.165);
    expect([inner!.radius, inner!.from, inner!.sweep]).toEqual([0.125, -90, 90]);
    expect([outer!.radius, outer!.from, outer!.sweep]).toEqual([0.165, -90, 90]);
    const last = faces!.lower.at(-1)!;
    if ('line' in last) near(last.line[1], 6, 8);
  });

  it('of a down bend turn toward −y, the lower face inside', () => {
    const { faces } = formedOf([{ leg: 6 }, bendDown(90, 0.125), { leg: 8 }]);
    const [outer] = arcsOf(faces!.upper);
    const [inner] = arcsOf(faces!.lower);
    near(outer!.centre, 5.835, -0.125);
    expect([outer!.radius, outer!.from, outer!.sweep]).toEqual([0.165, 90, -90]);
    expect(inner!.radius).toBe(0.125);
    const last = faces!.upper.at(-1)!;
    if ('line' in last) near(last.line[1], 6, 0.04 - 8);
  });

  it('have arcs that begin in every quarter of the turn', () => {
    const box = [3, 2, 1.5, 1, 0.6].flatMap((leg, i) => (i === 0 ? [{ leg }] : [bendUp(90, 0.1), { leg }]));
    expect(arcsOf(formedOf(box).faces!.upper).map((arc) => ((arc.from % 360) + 360) % 360)).toEqual([270, 0, 90, 180]);
    const turned = box.map((entry) => ('turn' in entry ? { ...entry, turn: 'down' } : entry));
    expect(arcsOf(formedOf(turned).faces!.upper).map((arc) => ((arc.from % 360) + 360) % 360)).toEqual([
      90, 0, 270, 180,
    ]);
  });

  it('leave out the inside arc of a sharp bend, and nothing else', () => {
    const { faces } = formedOf([{ leg: 1 }, bendUp(90, 0), { leg: 1 }]);
    expect(faces!.upper.length).toBe(2);
    expect(faces!.lower.length).toBe(3);
    const [first, second] = faces!.upper;
    if ('line' in first! && 'line' in second!) expect(first.line[1]).toEqual(second.line[0]);
  });
});

describe('Mold points', () => {
  it('lie where the outside faces meet: below for an up bend, above for a down bend', () => {
    const { moldPoints } = formedOf([{ leg: 1 }, bendUp(90, 0.1), { leg: 2 }, bendDown(90, 0.1), { leg: 1 }]);
    expect(moldPoints[0]!.x).toBeCloseTo(1, 12);
    expect(moldPoints[0]!.y).toBeCloseTo(0, 12);
    // The web's dimension runs from the lower outside to the upper outside.
    expect(moldPoints[1]!.x).toBeCloseTo(1 - 0.04, 12);
    expect(moldPoints[1]!.y).toBeCloseTo(2, 12);
  });

  it('lie off the part at a closed bend, and are not there at 180°', () => {
    const { moldPoints } = formedOf([{ leg: 3 }, bendUp(135, 0.1), { leg: 3 }]);
    expect(moldPoints[0]!.x).toBeCloseTo(3, 12);
    expect(moldPoints[0]!.y).toBeCloseTo(0, 12);
    const outside = { leg: 1, measure: 'outside-edge' };
    expect(formedOf([outside, bendUp(180, 0.1), outside]).moldPoints).toEqual([null]);
  });

  it('are one a bend, joggles included', () => {
    const joggle = { joggle: 0.04, run: 0.3, turn: 'up', radius: 0.1 };
    expect(formedOf([{ leg: 1 }, joggle, { leg: 1 }, bendUp(90, 0.1), { leg: 1 }]).moldPoints.length).toBe(3);
  });
});
