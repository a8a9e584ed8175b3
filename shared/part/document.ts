/**
 * The part document: plain JSON, the same in the browser, the database, over HTTP and on the command line.
 * It says what a designer typed; nothing derived is ever kept in it.
 */
export const DOCUMENT_FORMAT = 'leafwright/1';

export type Unit = 'in' | 'mm';

/** A figure, or an expression over `variables` that gives one ("1 1/8", "W/2 - 1/16", "25 mm"). */
export type Expression = number | string;

export type Turn = 'up' | 'down';
export type Grain = 'along' | 'across';
export type Hardness = 'soft' | 'medium' | 'hard';
export type Hand = 'as-drawn' | 'opposite';

/** How the end of a leg is dimensioned. */
export type Measure = 'mold-line' | 'outside-edge' | 'inside' | 'flat';

export type Allowance =
  | { readonly method: 'k-factor'; readonly k: Expression }
  | { readonly method: 'handbook' }
  | { readonly method: 'din-6935' }
  | { readonly method: 'rule-90'; readonly hardness: Hardness }
  | { readonly method: 'shop'; readonly k: Expression; readonly figure?: string }
  | { readonly method: 'measured'; readonly allowance: Expression };

export type AllowanceMethod = Allowance['method'];

/** A material of the shop's own, for one part; a name points into the reference table instead. */
export interface Material {
  readonly name: string;
  /** kg/m³ */
  readonly density?: number;
  /** Young's modulus, MPa */
  readonly modulus?: number;
  /** Yield stress, MPa */
  readonly yield?: number;
}

export interface Leg {
  readonly id?: string;
  readonly leg: Expression;
  readonly name?: string;
  readonly measure?: Measure | readonly [Measure, Measure];
}

export interface Bend {
  readonly id?: string;
  /** Degrees the metal is bent from flat. */
  readonly bend: Expression;
  readonly turn: Turn;
  /** Finished inside radius. */
  readonly radius: Expression;
  readonly name?: string;
  readonly allowance?: Allowance;
  readonly nose?: Nose;
}

export interface Joggle {
  readonly id?: string;
  /** Depth, face to same face. */
  readonly joggle: Expression;
  /** Along the leg, between the two outer bend tangent lines. */
  readonly run: Expression;
  readonly turn: Turn;
  readonly radius: Expression;
  readonly name?: string;
  readonly allowance?: Allowance;
  readonly nose?: Nose;
}

export type ChainEntry = Leg | Bend | Joggle;

export interface Nose {
  /** Nose bar plus shims. */
  readonly radius: Expression;
}

export type HoleFrom = 'start' | 'end' | 'mold-start' | 'mold-end';

export interface Hole {
  readonly id?: string;
  /** Which leg, counted from 0. */
  readonly leg: number;
  readonly diameter: Expression;
  readonly from: HoleFrom;
  readonly at: Expression;
  readonly across: Expression;
  readonly count?: number;
  readonly pitch?: Expression;
  readonly name?: string;
}

/** `[minus, plus]`, both zero or more. */
export type Tolerance = readonly [Expression, Expression];

export interface Tolerances {
  readonly length?: Tolerance;
  readonly angle?: Tolerance;
  readonly radius?: Tolerance;
  readonly k?: Tolerance;
  readonly cut?: Tolerance;
  readonly thickness?: Tolerance;
}

export interface DashNumber {
  readonly dash: string;
  readonly variables?: Readonly<Record<string, Expression>>;
  readonly hand?: Hand;
  readonly title?: string;
}

export interface PartDocument {
  readonly format: typeof DOCUMENT_FORMAT;
  readonly unit: Unit;
  readonly thickness: Expression;
  readonly material?: string | Material;
  /** Length of the bend lines. */
  readonly width?: Expression;
  readonly grain?: Grain;
  readonly allowance: Allowance;
  readonly variables?: Readonly<Record<string, Expression>>;
  readonly chain: readonly ChainEntry[];
  readonly holes?: readonly Hole[];
  /** Index of the leg that lies level for the envelope. */
  readonly seat?: number;
  readonly nose?: Nose;
  readonly trim?: { readonly start?: Expression; readonly end?: Expression };
  readonly tolerances?: Tolerances;
  readonly hand?: Hand;
  readonly dashNumbers?: readonly DashNumber[];
}

export const isLeg = (entry: ChainEntry): entry is Leg => 'leg' in entry;
export const isBend = (entry: ChainEntry): entry is Bend => 'bend' in entry;
export const isJoggle = (entry: ChainEntry): entry is Joggle => 'joggle' in entry;
