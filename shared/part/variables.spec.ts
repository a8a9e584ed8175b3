import type { Expression } from './document';
import { evaluateVariables } from './variables';

const read = (variables: Record<string, Expression>) => {
  const { scope, errors } = evaluateVariables(variables, 'in');
  return { values: Object.fromEntries([...scope].map(([name, { value }]) => [name, value])), errors };
};

describe('The variables of a part', () => {
  it('are evaluated once each, in whatever order they stand', () => {
    expect(read({ A: 'B + 1', B: 'C * 2', C: '1 1/2' }).values).toEqual({ A: 4, B: 3, C: 1.5 });
    expect(read({}).errors).toEqual([]);
  });

  it('are told apart by case, and may be named like units, functions and members of objects', () => {
    expect(read({ w: 1, W: 2 }).values).toEqual({ w: 1, W: 2 });
    const named = { in: 2, mm: 'in + 1', sqrt: 4, constructor: 5, toString: 'sqrt + constructor', q0: 6, e: 'q0' };
    expect(read(named).errors).toEqual([]);
    expect(read(named).values['mm']).toBe(3);
    expect(read(named).values['toString']).toBe(9);
    expect(read(named).values['e']).toBe(6);
  });

  it('carry their dimension along', () => {
    expect(read({ A: '25.4 mm', B: 'A + 1' }).values['B']).toBe(2);
    expect(read({ A: '25.4 mm', B: 'A + 5 deg' }).errors).toEqual([
      { path: 'variables/B', message: 'This mixes an angle with a length.' },
    ]);
  });

  it('are an error when broken, also when nothing uses them', () => {
    expect(read({ A: '1', unused: '2 +' }).errors).toEqual([
      { path: 'variables/unused', message: 'This is not complete: a figure or a sign is missing.' },
    ]);
    expect(read({ A: 'B' }).errors[0]!.path).toBe('variables/A');
    expect(read({ A: '1/0' }).errors).toEqual([{ path: 'variables/A', message: 'This divides by zero.' }]);
    expect(read({ A: '1e300', B: 'A * A' }).errors).toEqual([
      { path: 'variables/B', message: 'This gives no finite figure.' },
    ]);
    expect(read({ A: '?', B: '2 2' }).errors.map((error) => error.path)).toEqual(['variables/A', 'variables/B']);
  });

  it('have names of letters, digits and _ that start with no digit', () => {
    for (const name of ['W', '_w', 'Größe', 'w2', 'Δ'])
      expect(read({ [name]: 1 }).errors)
        .withContext(name)
        .toEqual([]);
    for (const name of ['2w', '', 'a b', 'a-b', 'a.b', '°', ' a', 'a/b']) {
      expect(read({ [name]: 1 }).errors.length)
        .withContext(name)
        .toBe(1);
    }
  });

  it('name the circle that they go round in', () => {
    expect(read({ A: 'A' }).errors[0]!.message).toBe('These variables go round in a circle: A → A.');
    const { errors } = read({ X: 'A', A: 'B', B: 'C', C: 'A' });
    expect(errors[0]!.message).toContain('A → B → C → A');
    const ring = Object.fromEntries(Array.from({ length: 100 }, (_, i) => [`v${i}`, `v${(i + 1) % 100}`]));
    expect(read(ring).errors[0]!.message).toContain('→ … →');
  });

  it('may be chained ten thousand deep, forwards and backwards', () => {
    const count = 10_000;
    const forwards = Object.fromEntries(
      Array.from({ length: count }, (_, i) => [`v${i}`, i === count - 1 ? '1' : `v${i + 1} + 1`]),
    );
    expect(read(forwards).values['v0']).toBe(count);
    const backwards = Object.fromEntries(
      Array.from({ length: count }, (_, i) => [`v${i}`, i === 0 ? '1' : `v${i - 1} + 1`]),
    );
    expect(read(backwards).values[`v${count - 1}`]).toBe(count);
  });
});
