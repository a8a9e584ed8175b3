import { roomFor, seatLabels } from './seat-labels';

describe('seating labels in rows', () => {
  it('uses one row while there is room', () => {
    expect(seatLabels([0, 50, 100], 40, 10, 0, 100)).toEqual([0, 50, 100].map((place) => ({ place, row: 0 })));
  });

  it('keeps labels of a row and the leaders through it apart, however dense', () => {
    for (let count = 2; count <= 60; count++) {
      const wanted = Array.from({ length: count }, (_, index) => 50 + index * 7);
      const seats = seatLabels(wanted, 40, 10, 0, 2000);
      const tooNear = seats.flatMap((seat, index) =>
        seats.slice(index + 1).filter((other) => {
          // In another row it is only the leader that has to pass beside the figure.
          const least = other.row === seat.row ? 49.99 : 24.99;
          return Math.abs(other.place - seat.place) < least;
        }),
      );
      expect(tooNear).withContext(`${count} labels`).toEqual([]);
    }
  });

  it('runs over at the end, not at the start, when the room is too small', () => {
    expect(seatLabels([0, 10, 20], 40, 0, 0, 50, 1).map(({ place }) => place)).toEqual([0, 40, 80]);
    expect(seatLabels([], 40, 10, 0, 50)).toEqual([]);
  });

  it('says how much room they need', () => {
    expect(roomFor(10, 40, 10)).toBe(250);
    expect(roomFor(10, 40, 10, 1)).toBe(500);
  });
});
