import type { Piece } from '../layout/lay-out';
import type { BendResult } from '../result';
import { formSolids, type Solid } from './solid';

/** How far the part has come: the bends done, and at most one on its way. */
export interface Progress {
  /** Indices of finished bends. */
  readonly done: ReadonlySet<number>;
  /** A bend at `angle` degrees so far, its rest still straight on the side away from the clamp. */
  readonly swinging?: { readonly bend: number; readonly angle: number; readonly leafSide: 'start' | 'end' };
}

/**
 * The part with some of its bends done. A bend not yet made is flat, as long as its allowance. The one on its way wraps the
 * nose: an arc of its radius over the angle so far, the rest of its neutral length straight on the leaf side.
 *
 * @param pieces of the finished part @param bends results, for allowances and angles @param thickness T > 0
 * @param progress which bends are done; a swinging angle is held between 0 and the bend's own
 * @returns solids in the frame of leg 0, in order
 * @source geometry: the neutral length is kept
 * @example partlyFormed(pieces, bends, 0.04, { done: new Set() }) // the flat blank
 */
export function partlyFormed(
  pieces: readonly Piece[],
  bends: readonly BendResult[],
  thickness: number,
  progress: Progress,
): readonly Solid[] {
  return formSolids(
    pieces.flatMap((piece) => (piece.kind === 'straight' ? [piece] : bendPieces(piece, bends[piece.bend]!, progress))),
    thickness,
  );
}

type ArcPiece = Extract<Piece, { kind: 'arc' }>;

function bendPieces(arc: ArcPiece, { allowance }: BendResult, { done, swinging }: Progress): readonly Piece[] {
  if (done.has(arc.bend)) return [arc];
  const flat = (length: number): Piece => ({ kind: 'straight', length, leg: null, chain: arc.chain });
  if (swinging?.bend !== arc.bend || swinging.angle <= 0) return [flat(allowance)];
  const angle = Math.min(swinging.angle, arc.angle);
  const rest = allowance * (1 - angle / arc.angle);
  if (rest === 0) return [arc];
  const swung: Piece = { ...arc, angle };
  return swinging.leafSide === 'start' ? [flat(rest), swung] : [swung, flat(rest)];
}
