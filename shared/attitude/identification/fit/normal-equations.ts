import type { Moments } from './moments.ts';
import type { Motion } from './motion.ts';
import { applied } from './small-matrix.ts';

/**
 * The continuous parameters of a hypothesis, about a point where M ≈ B C A: an offset a on the reference side (A ← A
 * exp(−[a×])), an offset b on the body side (B ← exp(−[b×]) B), a lag, and the logarithm of a scale of the numbers.
 */
export const REFERENCE_OFFSET = 0;
export const BODY_OFFSET = 3;
export const LAG = 6;
export const SCALE = 7;
export const PARAMETERS = 8;

/** J ᵀJ, Jᵀr and Σ |r|² of r = b + C a − ω lag + (∂r/∂ scale) scale. Rotation vectors in rad. */
export interface NormalEquations {
  readonly count: number;
  readonly information: Float64Array;
  readonly gradient: Float64Array;
  readonly squaredError: number;
  readonly hasLag: boolean;
  readonly hasScale: boolean;
}

/** The same sums with the numbers divided by e^step and by e^−step. */
export interface ScaledMoments {
  readonly step: number;
  readonly up: Moments;
  readonly down: Moments;
}

/** Sums that depend on the point alone. */
interface PointSums {
  readonly squaredError: number;
  readonly body: readonly [number, number, number];
  readonly reference: readonly [number, number, number];
  readonly lag: number;
}

const half = new Float64Array(81);

function sumsAt(moments: Moments, b: Float64Array, a: Float64Array): PointSums {
  const { cross, crossRate } = moments;
  // half[k,l,k',n] = Σ_m M[k,l] C[m,n] B[k',m]
  for (let kl = 0; kl < 9; kl++) for (let i = 0; i < 3; i++) for (let n = 0; n < 3; n++) {
    half[9 * kl + 3 * i + n] = cross[9 * kl + n]! * b[3 * i]! + cross[9 * kl + 3 + n]! * b[3 * i + 1]! + cross[9 * kl + 6 + n]! * b[3 * i + 2]!;
  }
  // x = Σ M (BCA)ᵀ, y = Σ (BCA)ᵀ M
  const x = (k: number, i: number): number => {
    let sum = 0;
    for (let l = 0; l < 3; l++) for (let n = 0; n < 3; n++) sum += half[9 * (3 * k + l) + 3 * i + n]! * a[3 * n + l]!;
    return sum;
  };
  const y = (j: number, l: number): number => {
    let sum = 0;
    for (let k = 0; k < 3; k++) for (let n = 0; n < 3; n++) sum += half[9 * (3 * k + l) + 3 * k + n]! * a[3 * n + j]!;
    return sum;
  };
  let lag = 0;
  if (crossRate) {
    for (let k = 0; k < 3; k++) for (let l = 0; l < 3; l++) for (let m = 0; m < 3; m++) for (let n = 0; n < 3; n++) {
      lag -= 0.5 * crossRate[9 * (3 * k + l) + 3 * m + n]! * b[3 * k + m]! * a[3 * n + l]!;
    }
  }
  return {
    squaredError: Math.max(0, moments.squares / 2 - x(0, 0) - x(1, 1) - x(2, 2)),
    body: [(x(1, 2) - x(2, 1)) / 2, (x(2, 0) - x(0, 2)) / 2, (x(0, 1) - x(1, 0)) / 2],
    reference: [(y(1, 2) - y(2, 1)) / 2, (y(2, 0) - y(0, 2)) / 2, (y(0, 1) - y(1, 0)) / 2],
    lag,
  };
}

/** @param b - B, @param a - A, nine numbers each. */
export function normalEquations(moments: Moments, motion: Motion, b: Float64Array, a: Float64Array, scaled: ScaledMoments | null): NormalEquations {
  const at = sumsAt(moments, b, a);
  const h = new Float64Array(PARAMETERS * PARAMETERS);
  const gradient = new Float64Array(PARAMETERS);
  const set = (i: number, j: number, value: number): void => { h[PARAMETERS * i + j] = h[PARAMETERS * j + i] = value; };
  gradient.set(at.reference, REFERENCE_OFFSET);
  gradient.set(at.body, BODY_OFFSET);
  const c = motion.sumMatrix;
  for (let i = 0; i < 3; i++) {
    set(REFERENCE_OFFSET + i, REFERENCE_OFFSET + i, moments.count);
    set(BODY_OFFSET + i, BODY_OFFSET + i, moments.count);
    for (let j = 0; j < 3; j++) {
      let sum = 0;
      for (let m = 0; m < 3; m++) for (let n = 0; n < 3; n++) sum += b[3 * i + m]! * c[3 * m + n]! * a[3 * n + j]!;
      set(BODY_OFFSET + i, REFERENCE_OFFSET + j, sum);
    }
  }
  const hasLag = moments.crossRate !== null;
  if (hasLag) {
    gradient[LAG] = at.lag;
    set(LAG, LAG, motion.sumSquareRate);
    const inBody = applied(b, ...(motion.sumBodyRate as unknown as [number, number, number]));
    const [p, q, r] = motion.sumReferenceRate as unknown as [number, number, number];
    for (let i = 0; i < 3; i++) {
      set(BODY_OFFSET + i, LAG, -inBody[i]!);
      set(REFERENCE_OFFSET + i, LAG, -(a[i]! * p + a[3 + i]! * q + a[6 + i]! * r));
    }
  }
  if (scaled) {
    const up = sumsAt(scaled.up, b, a);
    const down = sumsAt(scaled.down, b, a);
    const { step } = scaled;
    gradient[SCALE] = (down.squaredError - up.squaredError) / (4 * step);
    set(SCALE, SCALE, Math.max(0, (up.squaredError + down.squaredError - 2 * at.squaredError) / (2 * step * step)));
    for (let i = 0; i < 3; i++) {
      set(REFERENCE_OFFSET + i, SCALE, (down.reference[i]! - up.reference[i]!) / (2 * step));
      set(BODY_OFFSET + i, SCALE, (down.body[i]! - up.body[i]!) / (2 * step));
    }
    set(LAG, SCALE, (down.lag - up.lag) / (2 * step));
  }
  return { count: moments.count, information: h, gradient, squaredError: at.squaredError, hasLag, hasScale: scaled !== null };
}

/** How large each parameter may be at all: a ridge that keeps what the data do not tell at rest. rad, rad, s, ln. */
const RANGE = [1, 1, 1, 1, 1, 1, 2, 0.5];

export interface Solution {
  /** All eight; 0 where not freed. */
  readonly parameters: Float64Array;
  /** How much freeing them lowers Σ |r|². */
  readonly explained: number;
  /** Inverse of the information matrix of the freed ones, ridge included; times σ² it is their covariance. */
  readonly inverse: Float64Array;
  readonly freed: readonly number[];
}

/** Places of the parameters of some blocks, those left out that these equations do not have. */
export function placesOf(blocks: readonly number[], { hasLag, hasScale }: NormalEquations): number[] {
  return blocks.flatMap((block) => {
    if (block === LAG) return hasLag ? [LAG] : [];
    if (block === SCALE) return hasScale ? [SCALE] : [];
    return [block, block + 1, block + 2];
  });
}

/** @param variance - of a component of r, rad²: the scale of the ridge. */
export function solve(equations: NormalEquations, freed: readonly number[], variance: number): Solution {
  const n = freed.length;
  const ridge = Math.max(variance, 1e-12 * equations.count);
  const m = new Float64Array(n * 2 * n);
  freed.forEach((p, i) => {
    freed.forEach((q, j) => { m[2 * n * i + j] = equations.information[PARAMETERS * p + q]!; });
    m[2 * n * i + i]! += ridge / RANGE[p]! ** 2;
    m[2 * n * i + n + i] = 1;
  });
  // Gauss and Jordan, positive definite by the ridge: no pivoting.
  for (let k = 0; k < n; k++) {
    const pivot = m[2 * n * k + k]!;
    for (let j = 0; j < 2 * n; j++) m[2 * n * k + j]! /= pivot;
    for (let i = 0; i < n; i++) {
      if (i === k) continue;
      const factor = m[2 * n * i + k]!;
      if (factor !== 0) for (let j = 0; j < 2 * n; j++) m[2 * n * i + j]! -= factor * m[2 * n * k + j]!;
    }
  }
  const inverse = new Float64Array(n * n);
  const parameters = new Float64Array(PARAMETERS);
  let explained = 0;
  for (let i = 0; i < n; i++) {
    let value = 0;
    for (let j = 0; j < n; j++) {
      inverse[n * i + j] = m[2 * n * i + n + j]!;
      value += inverse[n * i + j]! * equations.gradient[freed[j]!]!;
    }
    parameters[freed[i]!] = value;
    explained += value * equations.gradient[freed[i]!]!;
  }
  return { parameters, explained: Math.max(0, explained), inverse, freed };
}
