import { exactFigure, instant, lengthFigure, otherFigure, sixtyfourthFigure, stationFigures } from './figures';

describe('figures of a paper', () => {
  it('says "no figure" where there is none, and has a true minus', () => {
    expect(lengthFigure(null, 'in')).toBe('no figure');
    expect(lengthFigure(-0.065, 'in')).toBe('−0.065');
    expect(stationFigures(null, 'in')).toEqual(['no figure']);
  });

  it('gives an inch station as decimal, as the nearest 1/64 with the miss of the mark, and in millimetres', () => {
    expect(stationFigures(5.835, 'in')).toEqual(['5.835', '5 53/64 −0.007', '148.21 mm']);
    expect(stationFigures(25.4, 'mm')).toEqual(['25.40', '1.000 in']);
    expect(otherFigure(1, 'in')).toBe('25.40 mm');
  });

  it('writes the nearest 1/64 with the miss of the mark', () => {
    expect(sixtyfourthFigure(0.8)).toBe('51/64 −0.003');
    expect(sixtyfourthFigure(0.5)).toBe('1/2 ±0.000');
  });

  it('keeps the fourth place of an inch radius only when there is one', () => {
    expect(exactFigure(0.125, 'in')).toBe('0.125');
    expect(exactFigure(5 / 32, 'in')).toBe('0.1563');
    expect(exactFigure(1.2, 'mm')).toBe('1.20');
  });

  it('writes an instant to the second in universal time', () => {
    expect(instant(new Date('2026-03-05T13:31:21.500Z'))).toBe('2026-03-05 13:31:21 UTC');
  });
});
