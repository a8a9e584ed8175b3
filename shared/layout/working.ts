/** The layout's own arithmetic, line by line, so that somebody with the handbook open can follow each figure. */
import { HANDBOOK_RADIUS, HANDBOOK_THICKNESS } from '../allowance/handbook';
import { RULE_90_RADIUS, RULE_90_THICKNESS } from '../allowance/rule-90';
import type { Allowance, Hardness, PartDocument } from '../part/document';
import { isLeg } from '../part/document';
import type { BendResult, Solved } from '../result';
import { significant } from '../units/format';

export interface WorkLine {
  /** What is worked out: "BA", "SB", "flat 2", "TDW". */
  readonly symbol: string;
  /** The rule in symbols. */
  readonly rule: string;
  /** The same with the part's figures, at five significant digits. */
  readonly figures: string;
  /** Full value; degrees or the part's unit. */
  readonly value: number;
  readonly source: string;
}

export interface BendWorking {
  readonly bend: number;
  readonly lines: readonly WorkLine[];
}

export interface Working {
  readonly bends: readonly BendWorking[];
  /** Flats and the developed length both ways; empty where a leg is consumed or a joggle can't be made. */
  readonly total: readonly WorkLine[];
}

/**
 * @param document the part @param solved its result
 * @returns for each bend its setback, allowance and deduction; for the whole the two ways to the developed length
 * @source each line names its own
 */
export function workingOf(document: PartDocument, solved: Solved): Working {
  const { thickness } = solved;
  return {
    bends: solved.bends.map((bend, i) => ({ bend: i, lines: bendLines(bend, thickness, ruleOf(document, bend)) })),
    total: totalLines(solved),
  };
}

function ruleOf(document: PartDocument, bend: BendResult): Allowance {
  const entry = document.chain[bend.chain];
  return entry === undefined || isLeg(entry) ? document.allowance : (entry.allowance ?? document.allowance);
}

function bendLines(bend: BendResult, thickness: number, rule: Allowance): readonly WorkLine[] {
  const lines: WorkLine[] = [];
  const [A, R, T] = [bend.angle, bend.radius, thickness].map((value) => significant(value)) as [string, string, string];
  if (bend.setback !== null) {
    lines.push({
      symbol: 'SB',
      rule: '(R + T) · tan(A/2)',
      figures: `(${R} + ${T}) · tan(${A}°/2)`,
      value: bend.setback,
      source: 'FAA-H-8083-31 ch. 4, setback; AC 43.13-1B table 4-7 for tan(A/2)',
    });
  }
  lines.push(...allowanceLines(bend, rule, A, R, T));
  if (bend.deduction !== null) {
    lines.push({
      symbol: 'BD',
      rule: '2 · SB − BA',
      figures: `2 · ${significant(bend.setback!)} − ${significant(bend.allowance)}`,
      value: bend.deduction,
      source: 'definition of the bend deduction',
    });
  }
  return lines;
}

function allowanceLines(bend: BendResult, rule: Allowance, A: string, R: string, T: string): readonly WorkLine[] {
  const line = (ruleText: string, figures: string, source: string): WorkLine => ({
    symbol: 'BA',
    rule: ruleText,
    figures,
    value: bend.allowance,
    source,
  });
  const arc = (source: string): WorkLine =>
    line('π/180 · A · (R + K · T)', `π/180 · ${A} · (${R} + ${significant(bend.kFactor)} · ${T})`, source);
  switch (rule.method) {
    case 'handbook':
      return [
        line(
          `(${HANDBOOK_RADIUS} · R + ${HANDBOOK_THICKNESS} · T) · A`,
          `(${HANDBOOK_RADIUS} · ${R} + ${HANDBOOK_THICKNESS} · ${T}) · ${A}`,
          'FAA-H-8083-31 ch. 4, bend allowance',
        ),
      ];
    case 'din-6935': {
      const k = 2 * bend.kFactor;
      const full = k === 1;
      return [
        {
          symbol: 'K',
          rule: full ? '1/2 (R/T above 5)' : '(0.65 + 0.5 · log10(R/T)) / 2',
          figures: full ? '1/2' : `(0.65 + 0.5 · log10(${R}/${T})) / 2`,
          value: bend.kFactor,
          source: 'DIN 6935',
        },
        arc('DIN 6935'),
      ];
    }
    case 'rule-90': {
      const c = RULE_90_THICKNESS[rule.hardness as Hardness];
      return [
        line(
          `(${c} · T + ${RULE_90_RADIUS} · R) · A/90`,
          `(${c} · ${T} + ${RULE_90_RADIUS} · ${R}) · ${A}/90`,
          "Machinery's Handbook, allowances for bending sheet metal",
        ),
      ];
    }
    case 'measured':
      return [line('stated for this bend', significant(bend.allowance), 'measured')];
    case 'shop':
      return [arc('K from the shop’s own coupons')];
    case 'k-factor':
      return [arc('definition of the K-factor; K as given')];
  }
}

function totalLines(solved: Solved): readonly WorkLine[] {
  const { developedLength: length, legs, bends, joggles } = solved;
  if (length === null) return [];
  const flats = legs.map((leg, i): WorkLine => {
    const symbol = `flat ${i + 1}`;
    const figures = [leg.dimension, ...leg.setback.filter((back) => back !== 0)]
      .map((value) => significant(value))
      .join(' − ');
    return {
      symbol,
      rule: 'dimension − setbacks',
      figures,
      value: leg.flat,
      source: 'FAA-H-8083-31 ch. 4, flat layout',
    };
  });
  const straights = joggles.flatMap((joggle) => (joggle.straight === null ? [] : [joggle.straight]));
  const added = [...legs.map((leg) => leg.flat), ...straights, ...bends.map((bend) => bend.allowance)];
  const total: WorkLine[] = [
    ...flats,
    {
      symbol: 'TDW',
      rule: straights.length === 0 ? 'Σ flats + Σ BA' : 'Σ flats + Σ joggle straights + Σ BA',
      figures: added.map((value) => significant(value)).join(' + '),
      value: sum(added),
      source: 'FAA-H-8083-31 ch. 4, flat layout',
    },
  ];
  const lengths = moldLineLengths(solved);
  if (lengths !== null) {
    const deductions = bends.map((bend) => bend.deduction!);
    total.push({
      symbol: 'TDW',
      rule: 'Σ mold-line lengths − Σ BD',
      figures: [
        lengths.map((value) => significant(value)).join(' + '),
        ...deductions.map((value) => significant(value)),
      ].join(' − '),
      value: sum(lengths) - sum(deductions),
      source: 'the same the other way',
    });
  }
  return total;
}

/**
 * Every straight from mold point to mold point (or free edge), whatever way it was dimensioned; null with a 180° bend, which has
 * no mold point. The straight of a joggle counts as one.
 */
function moldLineLengths({ legs, bends, joggles }: Solved): readonly number[] | null {
  if (bends.some((bend) => bend.setback === null)) return null;
  const flats: number[] = [];
  legs.forEach((leg, i) => {
    flats.push(leg.flat);
    const joggle = joggles.find((candidate) => candidate.chain === leg.chain + 1);
    if (i < legs.length - 1 && typeof joggle?.straight === 'number') flats.push(joggle.straight);
  });
  return flats.map((flat, i) => flat + (bends[i - 1]?.setback ?? 0) + (bends[i]?.setback ?? 0));
}

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
