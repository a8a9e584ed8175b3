import type { Finding, FindingLevel } from '../result';
import type { Check, CheckInput } from './check';
import { allowanceBeyondSheet } from './allowance-beyond-sheet';
import { grainAlongBend } from './grain-along-bend';
import { joggleRunTooShort } from './joggle-run-too-short';
import { kAboveHalf } from './k-above-half';
import { legConsumed } from './leg-consumed';
import { legsCross } from './legs-cross';
import { holeEdgeDistance } from './hole-edge-distance';
import { holeNearBend } from './hole-near-bend';
import { joggleRunSteep } from './joggle-run-steep';
import { moldPointFar } from './mold-point-far';
import { noseRadiusMismatch } from './nose-radius-mismatch';
import { radiusBelowMinimum } from './radius-below-minimum';
import { radiusNotChecked } from './radius-not-checked';
import { materialUnknown } from './material-unknown';

const CHECKS: readonly Check[] = [
  legConsumed,
  joggleRunTooShort,
  legsCross,
  radiusBelowMinimum,
  grainAlongBend,
  kAboveHalf,
  allowanceBeyondSheet,
  holeEdgeDistance,
  holeNearBend,
  joggleRunSteep,
  noseRadiusMismatch,
  moldPointFar,
  radiusNotChecked,
  materialUnknown,
];

const RANK: Readonly<Record<FindingLevel, number>> = { stop: 0, caution: 1, note: 2 };

/** Every finding of a part, stops first; within a level in the order of the checks, then along the chain. */
export function runChecks(input: CheckInput): readonly Finding[] {
  return CHECKS.flatMap((check) => check(input)).sort((a, b) => RANK[a.level] - RANK[b.level]);
}
