import * as fc from 'fast-check';
import { SEED } from '../../tests/support/seed';
import type { ChainEntry } from './document';
import { parseTypedChain, printTypedChain } from './typed-chain';

function chainOf(text: string, previous: readonly ChainEntry[] = []): readonly ChainEntry[] {
  const typed = parseTypedChain(text, previous);
  if (!typed.ok) throw new Error(`${text}: ${typed.errors[0]!.message}`);
  return typed.chain;
}

function errorOf(text: string): { message: string; place: string } {
  const typed = parseTypedChain(text);
  if (typed.ok) throw new Error(`${text} was accepted`);
  const { start, end, message } = typed.errors[0]!;
  return { message, place: text.slice(start, end) };
}

describe('A typed chain', () => {
  it('reads the channel, the radius kept from bend to bend', () => {
    expect(chainOf('1 up 90 r.16 2 up 90 1')).toEqual([
      { leg: 1 },
      { bend: 90, turn: 'up', radius: '.16' },
      { leg: 2 },
      { bend: 90, turn: 'up', radius: '.16' },
      { leg: 1 },
    ]);
    expect(chainOf('5')).toEqual([{ leg: 5 }]);
    expect(chainOf('1 UP 90 R.16 2')).toEqual(chainOf('1 up 90 r.16 2'));
  });

  it('reads mixed numbers, units, names and sums as legs', () => {
    expect(chainOf('1 1/8 up 90 r1/8 W/2 - 1/16 down 45 25 mm')).toEqual([
      { leg: '1 1/8' },
      { bend: 90, turn: 'up', radius: '1/8' },
      { leg: 'W/2 - 1/16' },
      { bend: 45, turn: 'down', radius: '1/8' },
      { leg: '25 mm' },
    ]);
    expect(chainOf('1 up 90 r(1 1/8) 2')[1]).toEqual({ bend: 90, turn: 'up', radius: '1 1/8' });
    expect(chainOf('1 up 90 r W/8 2')[1]).toEqual({ bend: 90, turn: 'up', radius: 'W/8' });
    expect(chainOf('1 up (A + 5) r.1 2')[1]).toEqual({ bend: 'A + 5', turn: 'up', radius: '.1' });
    expect(chainOf('max(1, 2) up 90 r.1 2')[0]).toEqual({ leg: 'max(1, 2)' });
  });

  it('reads how legs are measured, for both ends or each', () => {
    expect(chainOf('1 outside up 90 r.1 2 flat inside up 90 1 mold')).toEqual([
      { leg: 1, measure: 'outside-edge' },
      { bend: 90, turn: 'up', radius: '.1' },
      { leg: 2, measure: ['flat', 'inside'] },
      { bend: 90, turn: 'up', radius: '.1' },
      { leg: 1, measure: 'mold-line' },
    ]);
    expect(chainOf('1 flat flat')[0]).toEqual({ leg: 1, measure: 'flat' });
  });

  it('reads joggles', () => {
    expect(chainOf('1 joggle 0.04 run 0.3 up r.1 2')).toEqual([
      { leg: 1 },
      { joggle: 0.04, run: 0.3, turn: 'up', radius: '.1' },
      { leg: 2 },
    ]);
  });

  it('says where every field stands', () => {
    const typed = parseTypedChain('1 up 90 r.16 2');
    const at = (path: string): string => {
      const field = typed.ok ? typed.fields.find((candidate) => candidate.path === path) : undefined;
      return field === undefined ? 'nowhere' : '1 up 90 r.16 2'.slice(field.start, field.end);
    };
    expect(at('chain/0/leg')).toBe('1');
    expect(at('chain/1/turn')).toBe('up');
    expect(at('chain/1/bend')).toBe('90');
    expect(at('chain/1/radius')).toBe('.16');
    expect(at('chain/2/leg')).toBe('2');
  });

  it('says what is wrong, and where', () => {
    expect(errorOf('').message).toContain('Type a chain');
    expect(errorOf('   ').message).toContain('Type a chain');
    expect(errorOf('up 90 r.1 1')).toEqual({ message: 'The length of a leg is missing here.', place: 'up' });
    expect(errorOf('1 up 90 2')).toEqual({ message: 'Give the first bend its radius, for example r1/8.', place: 'up' });
    expect(errorOf('1 up 90 r.1').message).toBe('The length of a leg is missing here.');
    expect(errorOf('1 up').message).toBe('The angle of the bend is missing here.');
    expect(errorOf('1 up 90 r').message).toBe('The bend radius is missing here.');
    expect(errorOf('1 flat flat flat').message).toContain('two ends');
    expect(errorOf('1 left 90 r.1 2').place).toBe('left');
    expect(errorOf('1 2 up 90 r.1 2').message).toContain('side by side');
    expect(errorOf('1 up 90 r.1 2-3/16').place).toBe('2-3/16');
    expect(errorOf('1 up 90 r.1 2 joggle .04 up 1').message).toContain('run');
    expect(errorOf('1 joggle .04 run .3').message).toContain('steps up or down');
    expect(errorOf('1 up up 90 r.1 1').place).toBe('up');
    expect(errorOf('1 up 90 r.1 $').place).toBe('$');
  });

  it('never throws, whatever is typed', () => {
    const pieces = [
      '1',
      'up',
      'down',
      '90',
      'r',
      'r.1',
      '(',
      ')',
      'joggle',
      'run',
      'flat',
      '1/8',
      '-',
      '$',
      'W',
      ' ',
      'mm',
    ];
    const text = fc.array(fc.oneof(fc.constantFrom(...pieces), fc.string({ unit: 'binary', maxLength: 5 })), {
      maxLength: 20,
    });
    fc.assert(
      fc.property(text, (words) => {
        const typed = parseTypedChain(words.join(' '));
        return typed.ok || typed.errors.every(({ start, end }) => start >= 0 && end >= start);
      }),
      { seed: SEED, numRuns: 2000 },
    );
    expect(SEED).toBeGreaterThanOrEqual(0);
  });
});

describe('A chain printed and read again', () => {
  const figure = fc.oneof(
    fc.integer({ min: 1, max: 400 }).map((n) => n / 32),
    fc.double({ min: 1e-7, max: 1e7, noNaN: true }),
    fc.constantFrom(
      '1 1/8',
      'W',
      'W/2',
      '-W + 3',
      '25 mm',
      '(1 + 2)',
      '( W )',
      'max(1, 2)',
      'sqrt(2)',
      'r',
      'R2',
      'up',
      'up + 1',
      '.16',
      'run',
      '(W) + (H)',
    ),
  );
  const turn = fc.constantFrom('up' as const, 'down' as const);
  const kind = fc.constantFrom('mold-line' as const, 'outside-edge' as const, 'inside' as const, 'flat' as const);
  const leg = fc.oneof(
    figure.map((value) => ({ leg: value })),
    fc.tuple(figure, kind).map(([value, measure]) => ({ leg: value, measure })),
    fc.tuple(figure, kind, kind).map(([value, a, b]) => ({ leg: value, measure: [a, b] as const })),
  );
  const joint = fc.oneof(
    fc.record({ bend: figure, turn, radius: figure }),
    fc.record({ joggle: figure, run: figure, turn, radius: figure }),
  );
  const chains = fc
    .tuple(leg, fc.array(fc.tuple(joint, leg), { maxLength: 8 }))
    .map(([first, rest]): ChainEntry[] => [first, ...rest.flat()]);

  /** A leg's measure said in its shortest form. */
  const plain = (entry: ChainEntry): unknown => {
    if (!('leg' in entry)) return entry;
    const { measure = 'mold-line' } = entry;
    const [start, end] = typeof measure === 'string' ? [measure, measure] : measure;
    return { leg: entry.leg, measure: start === end ? start : [start, end] };
  };

  it('is the same, on random chains', () => {
    fc.assert(
      fc.property(chains, (chain) => {
        const text = printTypedChain(chain);
        expect(chainOf(text).map(plain)).withContext(text).toEqual(chain.map(plain));
      }),
      { seed: SEED, numRuns: 500 },
    );
  });

  it('is printed short: the radius once, the default measure not at all', () => {
    expect(printTypedChain(chainOf('1 up 90 r.16 2 up 90 r.16 1 mold'))).toBe('1 up 90 r.16 2 up 90 1');
    expect(printTypedChain([{ leg: 1 }, { bend: 90, turn: 'up', radius: 'W/8' }, { leg: 2 }])).toBe('1 up 90 r W/8 2');
    expect(printTypedChain([{ leg: 'up' }])).toBe('(up)');
  });
});

describe('What a typed chain keeps of the one before', () => {
  const before: readonly ChainEntry[] = [
    { id: 'a', leg: 1, name: 'Left' },
    { id: 'b', bend: 90, turn: 'up', radius: '.16', allowance: { method: 'k-factor', k: 0.4 }, nose: { radius: 0.1 } },
    { id: 'c', leg: 2, name: 'Web' },
    { id: 'd', bend: 90, turn: 'up', radius: '.16', name: 'Last' },
    { id: 'e', leg: 1, name: 'Right' },
  ];

  it('names, ids, allowances and noses of entries in their place, the figures being new', () => {
    const [left, bend, web] = chainOf('3 up 45 r.2 4 down 90 1', before);
    expect(left).toEqual({ id: 'a', leg: 3, name: 'Left' });
    expect(bend).toEqual({ ...before[1]!, bend: 45, radius: '.2' } as ChainEntry);
    expect(web).toEqual({ id: 'c', leg: 4, name: 'Web' });
  });

  it('those alike from both ends when the chain grows or shrinks', () => {
    expect(chainOf('1 up 90 r.16 2 up 90 5 up 90 1', before).map((entry) => entry.id)).toEqual([
      'a',
      'b',
      'c',
      'd',
      undefined,
      undefined,
      'e',
    ]);
    expect(chainOf('1 up 90 r.16 1', before).map((entry) => entry.id)).toEqual(['a', 'b', 'e']);
  });

  it('no id twice, and nothing of a bend that became a joggle', () => {
    const joggled = chainOf('1 joggle .04 run .3 up r.16 2 up 90 1', before);
    expect(joggled[1]!.id).toBeUndefined();
    for (const text of ['1 up 90 r.16 2', '1', '1 up 90 r.16 2 up 90 1 up 90 1 up 90 1', '2 up 90 r.16 1']) {
      const ids = chainOf(text, before).flatMap((entry) => entry.id ?? []);
      expect(new Set(ids).size).withContext(text).toBe(ids.length);
    }
  });
});
