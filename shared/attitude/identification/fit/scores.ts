import { TURN_COUNT, TURNS } from '../lattice/turns.ts';
import { bestRotation, dot9 } from './best-rotation.ts';
import type { Moments } from './moments.ts';

/** For each pair of turns the nine places of the sums that its trace takes, and their signs. */
const PLACES = new Uint8Array(TURN_COUNT * TURN_COUNT * 9);
const SIGNS = new Int8Array(TURN_COUNT * TURN_COUNT * 9);
TURNS.forEach((body, b) => TURNS.forEach((reference, r) => {
  for (let k = 0; k < 3; k++) for (let l = 0; l < 3; l++) {
    const to = 9 * (TURN_COUNT * b + r) + 3 * k + l;
    PLACES[to] = 9 * (3 * k + l) + 3 * body.column[k]! + reference.column[l]!;
    SIGNS[to] = body.sign[k]! * reference.sign[l]!;
  }
}));

/** Σ tr(Mᵀ P_b C P_rᵀ) for one pair of turns. */
export function pairScore(sums: Float64Array, pair: number): number {
  let score = 0;
  for (let k = 9 * pair; k < 9 * pair + 9; k++) score += SIGNS[k]! * sums[PLACES[k]!]!;
  return score;
}

/**
 * Σ |r|² over the samples, r the error rotation: |M − A|² / 2 = 4 sin²(|r| / 2), from the squares of the matrices as
 * they are, since 3 − trace would be first order in their rounding. May come out a rounding error below 0.
 */
export const squaredError = ({ squares }: Moments, score: number): number => Math.max(0, squares / 2 - score);

/** A rotation fitted on one side, with its score. */
export interface SideFit {
  readonly rotation: Float64Array;
  readonly score: number;
}

const g = new Float64Array(9);
const SQRT3 = Math.sqrt(3);

/** The rotation A that fits M = P_b C A best, or null where no rotation can score `atLeast`. */
export function fitReferenceSide({ cross }: Moments, bodyTurn: number, atLeast: number): SideFit | null {
  const { column, sign } = TURNS[bodyTurn]!;
  for (let m = 0; m < 3; m++) for (let l = 0; l < 3; l++) {
    let sum = 0;
    for (let k = 0; k < 3; k++) sum += sign[k]! * cross[9 * (3 * k + l) + 3 * column[k]! + m]!;
    g[3 * m + l] = sum;
  }
  return fitted(atLeast);
}

/** The rotation B that fits M = B C P_rᵀ best, or null where no rotation can score `atLeast`. */
export function fitBodySide({ cross }: Moments, referenceTurn: number, atLeast: number): SideFit | null {
  const { column, sign } = TURNS[referenceTurn]!;
  for (let k = 0; k < 3; k++) for (let m = 0; m < 3; m++) {
    let sum = 0;
    for (let l = 0; l < 3; l++) sum += sign[l]! * cross[9 * (3 * k + l) + 3 * m + column[l]!]!;
    g[3 * k + m] = sum;
  }
  return fitted(atLeast);
}

function fitted(atLeast: number): SideFit | null {
  // No rotation scores more than √3 |G|.
  if (SQRT3 * Math.sqrt(dot9(g, g)) < atLeast) return null;
  const rotation = bestRotation(g);
  const score = dot9(g, rotation);
  return score < atLeast ? null : { rotation, score };
}

/** Best rotation A for M = B C A with any rotation B. */
export function fitReferenceGiven({ cross }: Moments, b: Float64Array): Float64Array {
  for (let m = 0; m < 3; m++) for (let l = 0; l < 3; l++) {
    let sum = 0;
    for (let n = 0; n < 3; n++) for (let k = 0; k < 3; k++) sum += cross[9 * (3 * k + l) + 3 * n + m]! * b[3 * k + n]!;
    g[3 * m + l] = sum;
  }
  return bestRotation(g);
}
