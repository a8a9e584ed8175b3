/** A part whose expressions have become figures: what the layout works on. */
import type { AllowanceMethod, Grain, Hardness, HoleFrom, Material, Measure, Turn, Unit } from './document';

export interface FigureAllowance {
  readonly method: AllowanceMethod;
  /** k-factor and shop. */
  readonly k?: number;
  /** rule-90. */
  readonly hardness?: Hardness;
  /** measured: arc length. */
  readonly length?: number;
  /** Path of the field that holds it, for messages. */
  readonly path: string;
}

export interface FigureLeg {
  readonly chain: number;
  readonly name: string | null;
  readonly dimension: number;
  /** As typed; a joggle end becomes flat in the layout. */
  readonly measure: readonly [Measure, Measure];
}

export interface FigureBend {
  readonly kind: 'bend';
  readonly chain: number;
  readonly name: string | null;
  readonly angle: number;
  readonly turn: Turn;
  readonly radius: number;
  readonly allowance: FigureAllowance;
  readonly noseRadius: number;
}

export interface FigureJoggle {
  readonly kind: 'joggle';
  readonly chain: number;
  readonly name: string | null;
  readonly depth: number;
  readonly run: number;
  readonly turn: Turn;
  readonly radius: number;
  readonly allowance: FigureAllowance;
  readonly noseRadius: number;
}

/** What stands between two legs. */
export type Joint = FigureBend | FigureJoggle;

export interface FigureHole {
  readonly hole: number;
  readonly leg: number;
  readonly diameter: number;
  readonly from: HoleFrom;
  readonly at: number;
  readonly across: number;
}

export interface PartFigures {
  readonly unit: Unit;
  readonly thickness: number;
  readonly width: number | null;
  readonly material: Material | null;
  /** The name as typed when the reference table does not know it. */
  readonly unknownMaterial: string | null;
  readonly grain: Grain | null;
  readonly legs: readonly FigureLeg[];
  /** One fewer than legs: joint i stands between leg i and leg i + 1. */
  readonly joints: readonly Joint[];
  readonly holes: readonly FigureHole[];
  /** Chain indices of the bends for which a nose was chosen, their own or the part's. */
  readonly noses: ReadonlySet<number>;
  readonly seat: number | null;
  readonly trim: { readonly start: number; readonly end: number };
}
