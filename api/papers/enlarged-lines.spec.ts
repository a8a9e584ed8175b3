import { solve } from '../../shared/solve';
import type { Solved } from '../../shared/result';
import { drawEnlargedLines, firstLine } from './enlarged-lines';

const BOX = { x: 10, y: 10, width: 40, height: 26 };
const solved = (chain: unknown): Solved =>
  solve({ format: 'leafwright/1', unit: 'in', thickness: 0.04, allowance: { method: 'handbook' }, chain }) as Solved;

describe('the enlarged lines of a bend', () => {
  it('stand in the order of their stations, each with its figure', () => {
    const marks = drawEnlargedLines(solved([{ leg: 6 }, { bend: 90, turn: 'up', radius: 0.125 }, { leg: 8 }]), BOX);
    const words = marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : []));
    expect(words).toEqual(['5.835', '5.934', '5.947', '5.960', '6.059']);
  });

  it('are those of the first bend that has stations, or none', () => {
    expect(firstLine(solved([{ leg: 6 }]))).toBeNull();
    expect(drawEnlargedLines(solved([{ leg: 6 }]), BOX)).toEqual([]);
    const broken = solved([{ leg: 0.1 }, { bend: 90, turn: 'up', radius: 0.125 }, { leg: 8 }]);
    expect(firstLine(broken)).toBeNull();
  });
});
