import type { Moments } from './moments.ts';
import type { Motion } from './motion.ts';
import { BODY_OFFSET, normalEquations, placesOf, REFERENCE_OFFSET, solve } from './normal-equations.ts';
import { fitReferenceGiven } from './scores.ts';
import { bestRotation } from './best-rotation.ts';
import { frameRotation, multiply } from './small-matrix.ts';

export interface BothSides {
  readonly b: Float64Array;
  readonly a: Float64Array;
  readonly squaredError: number;
}

/**
 * Rotations B and A that fit M = B C A best, from a start for B: Newton's steps on both at once, since turning them
 * one after the other creeps where the motion is small.
 */
export function fitBothSides(moments: Moments, motion: Motion, start: Float64Array): BothSides {
  let b: Float64Array = start;
  let a = fitReferenceGiven(moments, b);
  let equations = normalEquations(moments, motion, b, a, null);
  const freed = placesOf([REFERENCE_OFFSET, BODY_OFFSET], equations);
  for (let step = 0; step < 20; step++) {
    const { parameters, explained } = solve(equations, freed, 1e-12);
    if (explained <= 1e-9 * equations.squaredError + 1e-18 * moments.count) break;
    const nextB = multiply(frameRotation(parameters[3]!, parameters[4]!, parameters[5]!), b);
    const nextA = fitReferenceGiven(moments, nextB);
    const next = normalEquations(moments, motion, nextB, nextA, null);
    if (next.squaredError >= equations.squaredError) break;
    [b, a, equations] = [nextB, nextA, next];
  }
  return { b, a, squaredError: equations.squaredError };
}

/**
 * A start for B: M_i M_jᵀ = B (C_i C_jᵀ) Bᵀ, so B carries the axes of the reference's relative rotations into those of
 * the matrices', whatever stands on the reference side.
 *
 * @param pairs - indices of samples, two by two. @param m - matrices of these samples, transposed or not.
 */
export function startForBody(m: Float64Array, c: Float64Array, pairs: Int32Array, transposed: boolean): Float64Array {
  const g = new Float64Array(9);
  const u = new Float64Array(3);
  const v = new Float64Array(3);
  for (let p = 0; p < pairs.length; p += 2) {
    relativeAxis(m, pairs[p]!, pairs[p + 1]!, transposed, u);
    relativeAxis(c, pairs[p]!, pairs[p + 1]!, false, v);
    for (let i = 0; i < 3; i++) for (let j = 0; j < 3; j++) g[3 * i + j]! += u[i]! * v[j]!;
  }
  return bestRotation(g);
}

/** sin(angle) · axis of X_i X_jᵀ. */
function relativeAxis(x: Float64Array, i: number, j: number, transposed: boolean, into: Float64Array): void {
  const [along, across] = transposed ? [1, 3] : [3, 1];
  const entry = (row: number, column: number): number => {
    const p = 9 * i + row * along, q = 9 * j + column * along;
    return x[p]! * x[q]! + x[p + across]! * x[q + across]! + x[p + 2 * across]! * x[q + 2 * across]!;
  };
  into[0] = (entry(1, 2) - entry(2, 1)) / 2;
  into[1] = (entry(2, 0) - entry(0, 2)) / 2;
  into[2] = (entry(0, 1) - entry(1, 0)) / 2;
}
