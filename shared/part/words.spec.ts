import {
  angleWords,
  between,
  betweenLegs,
  faceUp,
  inOneLine,
  legName,
  lineName,
  lineNote,
  measureWords,
} from './words';

describe('the words of a part', () => {
  it('note a bend line: its name, the face that is up, the angle bent and the one between the legs', () => {
    expect(inOneLine(lineNote({ turn: 'down', angle: 90 }, 1))).toBe('L2 · face B up · 90° (90° between legs)');
    expect(lineNote({ turn: 'up', angle: 60 }, 0)).toEqual({
      line: 'L1',
      face: 'face A up',
      angle: '60°',
      between: '120° between legs',
    });
  });

  it('never give an angle between legs without saying that it is one', () => {
    expect(between(22.5)).toBe('157.5° between');
    expect(betweenLegs(90)).toBe('90° between legs');
    expect(angleWords(60)).toBe('60° (120° between legs)');
    expect(betweenLegs(180)).toBe('0° between legs');
  });

  it('know the face that is up by the turn', () => {
    expect(faceUp({ turn: 'up' })).toBe('face A up');
    expect(faceUp({ turn: 'down' })).toBe('face B up');
  });

  it('name a leg by its own name, else by its number', () => {
    expect(legName('Web', 1)).toBe('Web');
    expect(legName(' Web ', 1)).toBe('Web');
    expect(legName(null, 1)).toBe('Leg 2');
    expect(legName('  ', 0)).toBe('Leg 1');
    expect(lineName(23)).toBe('L24');
  });

  it('say once how both ends are measured when they are measured alike', () => {
    expect(measureWords(['outside-edge', 'outside-edge'])).toBe('by calipers');
    expect(measureWords(['inside', 'mold-line'])).toBe('inside / mold line');
  });
});
