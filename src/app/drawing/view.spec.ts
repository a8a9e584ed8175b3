import { fitView } from './view';

const square = [
  { x: 0, y: 0 },
  { x: 2, y: 0 },
  { x: 2, y: 1 },
  { x: 0, y: 1 },
];
const room = { left: 10, top: 10, right: 210, bottom: 210 };

describe('a view', () => {
  it('fits the model into the room, centred, with y up', () => {
    const view = fitView(square, 0, room);
    expect(view.scale).toBe(100);
    expect(view.place({ x: 0, y: 0 })).toEqual({ x: 10, y: 160 });
    expect(view.place({ x: 2, y: 1 })).toEqual({ x: 210, y: 60 });
  });

  it('lays the wanted heading level', () => {
    const view = fitView(square, 90, room);
    const from = view.place({ x: 0, y: 0 });
    const to = view.place({ x: 0, y: 1 });
    expect(to.y).toBeCloseTo(from.y, 9);
    expect(to.x).toBeGreaterThan(from.x);
  });
});
