import type { Moments } from './moments.ts';
import type { Motion } from './motion.ts';
import { applied, dominantEigenvector } from './small-matrix.ts';

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
  /** Σ of the squared turn, rad², that a step of the scale makes. */
  readonly squaredTurn: number;
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
    set(SCALE, SCALE, scaled.squaredTurn / (step * step));
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
/**
 * A direction that the others take over all but for the curvature of the rotations, which is of the order of the mean
 * square residual, is not known by what is left of it: a ridge of so many times that share of its information.
 */
const CURVATURE = 10;
const MOST_CURVATURE = 0.1;
/**
 * A scale shrinks the noise with the numbers, so its gradient is off by up to ten times Σ |r|² for no reason. A ridge of
 * this many times N Σ |r|² keeps that from explaining more than about one sample's noise; where the motion shows a scale
 * at all, its information is far larger.
 */
const SHRINKAGE = 100;

export interface Solution {
  /** All eight; 0 where not freed. */
  readonly parameters: Float64Array;
  /** How much freeing them lowers Σ |r|². */
  readonly explained: number;
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
export const solve = (equations: NormalEquations, freed: readonly number[], variance: number): Solution =>
  solved(equations, freed, variance, Math.min(MOST_CURVATURE, (CURVATURE * equations.squaredError) / equations.count));

/** The step of Newton's from where the parameters are, without the ridges that keep a test from false gains. */
export const stepOf = (equations: NormalEquations, freed: readonly number[], variance: number): Float64Array => solved(equations, freed, variance, 0).parameters;

/** Information that is less than this part of what a parameter has alone is finite differences and curvature. */
const LEAST_SHARE = 1e-5;

/**
 * Standard deviation, worst direction, of the parameters from `from` on with all of `freed` free; their range where the
 * others can take them over.
 */
export function deviationOf(equations: NormalEquations, freed: readonly number[], from: number, size: number, variance: number): number {
  const inverse = inverseInformation(equations, freed, variance);
  const first = freed.indexOf(from);
  const block = new Float64Array(size * size);
  for (let i = 0; i < size; i++) for (let j = 0; j < size; j++) block[size * i + j] = inverse[freed.length * (first + i) + first + j]!;
  const worst = block.slice();
  dominantEigenvector(worst, size);
  const largest = Math.max(...Array.from({ length: size }, (_, i) => worst[(size + 1) * i]!));
  const alone = equations.information[(PARAMETERS + 1) * from]!;
  const share = Math.max(LEAST_SHARE, (CURVATURE * equations.squaredError) / equations.count);
  return largest * alone * share > 1 || alone === 0 ? RANGE[from]! : Math.min(RANGE[from]!, Math.sqrt(largest * variance));
}

const factor = new Float64Array(PARAMETERS * PARAMETERS);

/** Cholesky's factor of the information matrix of the freed parameters, with its ridges, row by row with stride PARAMETERS. */
function factorise({ information, squaredError, count }: NormalEquations, freed: readonly number[], variance: number, curvature: number): void {
  const ridge = Math.max(variance, 1e-12 * count);
  for (let i = 0; i < freed.length; i++) {
    const p = freed[i]!;
    for (let j = 0; j <= i; j++) {
      let sum = information[PARAMETERS * p + freed[j]!]!;
      if (i === j) {
        sum += ridge / RANGE[p]! ** 2 + curvature * sum;
        if (p === SCALE && curvature > 0) sum += SHRINKAGE * count * squaredError;
      }
      for (let k = 0; k < j; k++) sum -= factor[PARAMETERS * i + k]! * factor[PARAMETERS * j + k]!;
      // Below the ridge only by rounding.
      factor[PARAMETERS * i + j] = i === j ? Math.sqrt(Math.max(sum, 0.1 * ridge)) : sum / factor[PARAMETERS * j + j]!;
    }
  }
}

function solved(equations: NormalEquations, freed: readonly number[], variance: number, curvature: number): Solution {
  factorise(equations, freed, variance, curvature);
  const n = freed.length;
  const y = new Float64Array(PARAMETERS);
  let explained = 0;
  for (let i = 0; i < n; i++) {
    let sum = equations.gradient[freed[i]!]!;
    for (let k = 0; k < i; k++) sum -= factor[PARAMETERS * i + k]! * y[k]!;
    y[i] = sum / factor[(PARAMETERS + 1) * i]!;
    explained += y[i]! * y[i]!;
  }
  const parameters = new Float64Array(PARAMETERS);
  for (let i = n - 1; i >= 0; i--) {
    let sum = y[i]!;
    for (let k = i + 1; k < n; k++) sum -= factor[PARAMETERS * k + i]! * parameters[freed[k]!]!;
    parameters[freed[i]!] = sum / factor[(PARAMETERS + 1) * i]!;
  }
  return { parameters, explained, freed };
}

/** Inverse of the information matrix of the freed parameters, n × n, no ridge but the range's; times σ² their covariance. */
export function inverseInformation(equations: NormalEquations, freed: readonly number[], variance: number): Float64Array {
  const n = freed.length;
  const inverse = new Float64Array(n * n);
  for (let column = 0; column < n; column++) {
    const { parameters } = solved({ ...equations, gradient: unit(freed[column]!) }, freed, variance, 0);
    for (let i = 0; i < n; i++) inverse[n * i + column] = parameters[freed[i]!]!;
  }
  return inverse;
}

function unit(place: number): Float64Array {
  const out = new Float64Array(PARAMETERS);
  out[place] = 1;
  return out;
}
