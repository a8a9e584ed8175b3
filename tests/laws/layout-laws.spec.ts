import { isBend, isLeg, type PartDocument } from '../../shared/part/document';
import { figuresOf } from '../support/plain-part';
import { randomFrom, SEED } from '../support/seed';
import { randomPart, withChain } from '../support/random-chains';
import { Worst } from './worst';

const CASES = 1000;
const NEAR = 1e-9;

/** Runs a law on random parts; a failing one is named by its number and the seed. */
function law(holds: (document: PartDocument, off: (miss: number) => void) => void, limit = NEAR): void {
  const random = randomFrom(SEED);
  const worst = new Worst(limit);
  for (let i = 0; i < CASES; i += 1) {
    holds(randomPart(random).document, (miss) => worst.note(miss, `seed ${SEED}, case ${i}`));
  }
  worst.expectWithin();
}

/** A miss of 0 where two answers are the same to the last digit, else an infinite one. */
const same = (a: unknown, b: unknown): number => (JSON.stringify(a) === JSON.stringify(b) ? 0 : Infinity);

const flipped = (document: PartDocument): PartDocument =>
  withChain(document, (entry) => (isBend(entry) ? { ...entry, turn: entry.turn === 'up' ? 'down' : 'up' } : entry));

const backwards = (document: PartDocument): PartDocument => ({
  ...document,
  chain: [...document.chain]
    .reverse()
    .map((entry) =>
      isLeg(entry) && Array.isArray(entry.measure)
        ? { ...entry, measure: [entry.measure[1], entry.measure[0]] }
        : entry,
    ),
});

const inMillimetres = (document: PartDocument): PartDocument => ({
  ...withChain(document, (entry) =>
    isLeg(entry)
      ? { ...entry, leg: (entry.leg as number) * 25.4 }
      : isBend(entry)
        ? { ...entry, radius: (entry.radius as number) * 25.4 }
        : entry,
  ),
  unit: 'mm',
  thickness: (document.thickness as number) * 25.4,
  width: (document.width as number) * 25.4,
});

describe('Laws of the layout, on 1,000 random chains', () => {
  it('flats and allowances add up to the developed length, and to mold lines less deductions', () => {
    law((document, off) => {
      const { legs, bends, developedLength } = figuresOf(document);
      const flats = legs.reduce((sum, leg) => sum + leg.flat, 0);
      const allowances = bends.reduce((sum, bend) => sum + bend.allowance, 0);
      off(flats + allowances - developedLength!);
      if (bends.some((bend) => bend.setback === null)) return;
      const moldLines = legs.reduce(
        (sum, leg, i) => sum + leg.flat + (bends[i - 1]?.setback ?? 0) + (bends[i]?.setback ?? 0),
        0,
      );
      const deductions = bends.reduce((sum, bend) => sum + bend.deduction!, 0);
      const size = Math.max(1, moldLines);
      off((moldLines - deductions - developedLength!) / size);
    });
  });

  it('stations run without a gap: leg, tangent, centre half way, tangent, leg', () => {
    law((document, off) => {
      const { legs, bends, developedLength } = figuresOf(document);
      off(legs[0]!.start!);
      bends.forEach((bend, i) => {
        off(same(bend.tangentStart, legs[i]!.end));
        off(same(bend.tangentEnd, legs[i + 1]!.start));
        off(bend.centre! - (bend.tangentStart! + bend.tangentEnd!) / 2);
        off(bend.sightLine!.startUnderNose - bend.tangentStart! - bend.radius);
        off(bend.tangentEnd! - bend.sightLine!.endUnderNose - bend.radius);
      });
      off(same(legs.at(-1)!.end, developedLength));
    });
  });

  it('mirror: turning every bend the other way leaves the blank as it is', () => {
    law((document, off) => {
      const [as, mirrored] = [figuresOf(document), figuresOf(flipped(document))];
      off(same(mirrored.legs, as.legs));
      off(
        same(
          mirrored.bends.map(({ turn: _, ...rest }) => rest),
          as.bends.map(({ turn: _, ...rest }) => rest),
        ),
      );
      off(same(mirrored.developedLength, as.developedLength));
    });
  });

  it('opposite hand: the same as turning every bend the other way', () => {
    law((document, off) => {
      const opposite = figuresOf({ ...document, hand: 'opposite' });
      off(same(opposite, figuresOf(flipped(document))));
    });
  });

  it('reverse: from the other end every station is the developed length less its own', () => {
    law((document, off) => {
      const [as, back] = [figuresOf(document), figuresOf(backwards(document))];
      const length = as.developedLength!;
      off(back.developedLength! - length);
      as.bends.forEach((bend, i) => {
        const other = back.bends[as.bends.length - 1 - i]!;
        off(other.tangentStart! - (length - bend.tangentEnd!));
        off(other.sightLine!.startUnderNose - (length - bend.sightLine!.endUnderNose));
      });
    });
  });

  it('inch and millimetre: every length grows by 25.4, every angle and K stays', () => {
    law((document, off) => {
      const [inch, metric] = [figuresOf(document), figuresOf(inMillimetres(document))];
      const grown = (a: number | null, b: number | null, power = 1): void => {
        if (a === null || b === null) off(same(a, b));
        else off((b / 25.4 ** power - a) / Math.max(1, Math.abs(a)));
      };
      grown(inch.developedLength, metric.developedLength);
      grown(inch.blank.area, metric.blank.area, 2);
      inch.bends.forEach((bend, i) => {
        grown(bend.tangentStart, metric.bends[i]!.tangentStart);
        grown(bend.setback, metric.bends[i]!.setback);
        grown(bend.kFactor, metric.bends[i]!.kFactor, 0);
      });
      const [a, b] = [inch.section, metric.section];
      off(same(a === null, b === null));
      if (a === null || b === null) return;
      grown(a.area, b.area, 2);
      off(b.principal.i1 / 25.4 ** 4 / a.principal.i1 - 1);
    });
  });

  it('K sweep: the developed length grows with K, by a·T for every bend', () => {
    const random = randomFrom(SEED + 1);
    law((document, off) => {
      const [low, high] = [0.01 + 0.4 * random(), 0.5 + 0.5 * random()];
      const at = (k: number): number =>
        figuresOf({ ...document, allowance: { method: 'k-factor', k } }).developedLength!;
      const turned = document.chain.reduce((sum, entry) => sum + (isBend(entry) ? (entry.bend as number) : 0), 0);
      const grows = ((turned * Math.PI) / 180) * (document.thickness as number) * (high - low);
      off(at(high) - at(low) - grows);
    });
  });

  it('splitting nothing: a leg cut in two by a bend of next to nothing is as long as before', () => {
    law((document, off) => {
      const [first, ...rest] = document.chain;
      if (first === undefined || !isLeg(first)) return;
      const leg = first.leg as number;
      const end = Array.isArray(first.measure) ? (first.measure[1] as string) : 'mold-line';
      const chain = [
        { leg: 0.01, measure: 'flat' },
        { bend: 1e-9, turn: 'up', radius: 0 },
        { leg: leg - 0.01, measure: ['flat', end] },
        ...rest,
      ];
      const whole = figuresOf(document).developedLength!;
      off(figuresOf({ ...document, chain }).developedLength! - whole);
    });
  });
});
