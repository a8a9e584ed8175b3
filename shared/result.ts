/** What the engine answers: every figure of one part, or why the document was refused. */
import type { AllowanceMethod, Measure, Turn, Unit } from './part/document';

/** Where something is wrong: the path of the field (`chain/3/radius`, `` for the whole) and what was expected. */
export interface FieldError {
  readonly path: string;
  readonly message: string;
}

export type FindingLevel = 'stop' | 'caution' | 'note';

export interface Finding {
  readonly level: FindingLevel;
  readonly code: string;
  /** `chain/3`, or `chain/3 chain/7` for two; `` for the part as a whole. */
  readonly at: string;
  readonly message: string;
  readonly source: string;
}

export interface LegResult {
  readonly name: string | null;
  /** Index of the entry in the document's chain. */
  readonly chain: number;
  readonly dimension: number;
  readonly measure: readonly [Measure, Measure];
  readonly setback: readonly [number, number];
  readonly flat: number;
  /** Stations along the blank from the free end of leg 0; null where an earlier figure is broken. */
  readonly start: number | null;
  readonly end: number | null;
}

export interface Springback {
  readonly method: 'gardiner';
  readonly toolRadius: number;
  readonly toolAngle: number;
}

export interface BendResult {
  readonly name: string | null;
  /** Index of the entry in the document's chain (of the joggle, for a joggle's bends). */
  readonly chain: number;
  readonly angle: number;
  readonly turn: Turn;
  readonly radius: number;
  readonly method: AllowanceMethod;
  /** Used, or implied by the allowance. */
  readonly kFactor: number;
  readonly allowance: number;
  /** Mold-line setback, null at 180°. */
  readonly setback: number | null;
  readonly deduction: number | null;
  readonly tangentStart: number | null;
  readonly centre: number | null;
  readonly tangentEnd: number | null;
  /** Radius of the nose that the sight lines are laid out for. */
  readonly noseRadius: number;
  readonly sightLine: { readonly startUnderNose: number; readonly endUnderNose: number } | null;
  readonly springback: Springback | null;
  /** Index in `joggles`, or null. */
  readonly joggle: number | null;
}

export interface JoggleResult {
  readonly chain: number;
  readonly offset: number;
  readonly run: number;
  readonly angle: number | null;
  readonly straight: number | null;
  readonly bends: readonly [number, number] | null;
}

export type XY = readonly [number, number];

export type FaceElement =
  | { readonly line: readonly [XY, XY] }
  | { readonly arc: { readonly centre: XY; readonly radius: number; readonly from: number; readonly sweep: number } };

export interface Faces {
  readonly upper: readonly FaceElement[];
  readonly lower: readonly FaceElement[];
}

/** Outside to outside over two parallel legs. */
export interface Height {
  readonly legs: readonly [number, number];
  readonly height: number;
}

export interface Formed {
  readonly envelope: { readonly width: number; readonly height: number; readonly seat: number } | null;
  /** One a bend, null at 180°. */
  readonly moldPoints: readonly ({ readonly x: number; readonly y: number } | null)[];
  readonly faces: Faces | null;
  /** Each leg with the next one parallel to it. */
  readonly heights: readonly Height[];
}

export interface Section {
  readonly area: number;
  readonly centroid: { readonly x: number; readonly y: number };
  readonly ix: number;
  readonly iy: number;
  readonly ixy: number;
  readonly principal: { readonly i1: number; readonly i2: number; readonly angle: number | null };
  readonly radii: { readonly r1: number; readonly r2: number };
}

export interface HoleResult {
  /** Index in the document's `holes`; a row gives one result a hole. */
  readonly hole: number;
  readonly leg: number;
  readonly station: number | null;
  readonly across: number;
  readonly diameter: number;
}

export interface Blank {
  readonly length: number | null;
  readonly width: number | null;
  readonly area: number | null;
  readonly mass: { readonly value: number; readonly unit: 'lb' | 'kg' } | null;
  /** Net length plus the trim on both free ends. */
  readonly roughLength: number | null;
  readonly trim: { readonly start: number; readonly end: number };
}

export interface Solved {
  readonly ok: true;
  readonly unit: Unit;
  readonly thickness: number;
  readonly developedLength: number | null;
  readonly blank: Blank;
  readonly legs: readonly LegResult[];
  readonly bends: readonly BendResult[];
  readonly joggles: readonly JoggleResult[];
  readonly formed: Formed | null;
  readonly section: Section | null;
  readonly holes: readonly HoleResult[];
  readonly findings: readonly Finding[];
}

export interface Refused {
  readonly ok: false;
  readonly errors: readonly FieldError[];
}

export type SolveResult = Solved | Refused;
