import { Criteria } from '../fit/criteria.ts';
import { pairScore } from '../fit/scores.ts';
import { TURN_COUNT, TURNS } from '../lattice/turns.ts';
import { ORDERS } from '../../convention.ts';
import type { EulerClass } from './euler-class.ts';
import { expectedNumbers, matrixRate, partsAlong, type RateHypothesis, type RateSample } from './hypotheses.ts';
import type { MeasuredRates } from './measured-rates.ts';

const DEG = Math.PI / 180;
/** Hypotheses on four numbers are tried on so many samples before the rest. */
const TRIED_FIRST = 48;
const SIGNS = [1, -1].flatMap((a) => [1, -1].flatMap((b) => [1, -1].map((c) => [a, b, c] as const)));

export interface RateFit {
  readonly hypothesis: RateHypothesis;
  /** Σ |r|² of the angular velocity that is left, (rad/s)². */
  readonly squaredError: number;
  readonly count: number;
}

/** Everything the search works on. */
export interface RateProblem {
  readonly measured: MeasuredRates;
  /** Observed numbers of the used samples, flat. */
  readonly observed: Float64Array;
  readonly width: 3 | 4 | 9;
  /** Standard deviation of a component of the observed rates, rad/s, and of the reference attitudes, rad. */
  readonly sigma: number;
  readonly attitudeSigma: number;
}

export function sampleAt({ matrices, bodyRates }: MeasuredRates, k: number): RateSample {
  return { c: matrices.subarray(9 * k, 9 * k + 9), omega: bodyRates.subarray(3 * k, 3 * k + 3) };
}

/** Every hypothesis that leaves no more than the noise. */
export function searchRates(problem: RateProblem): RateFit[] {
  switch (problem.width) {
    case 3: return [...angularVelocities(problem), ...eulerRates(problem)];
    case 4: return quaternionRates(problem);
    case 9: return matrixRates(problem);
  }
}

function criteriaOf({ measured, sigma, attitudeSigma }: RateProblem): Criteria {
  const rms = Math.sqrt(measured.bodyRates.reduce((sum, component) => sum + component * component, 0) / measured.samples.length);
  const floor = 1e-6 * Math.max(1, rms);
  return new Criteria(Math.max(sigma, floor), measured.stepVariance + attitudeSigma ** 2 * measured.noiseGain);
}

/** Σ o_j p_t over samples, with both squares. */
interface Cross {
  readonly sums: Float64Array;
  observedSquares: number;
  expectedSquares: number;
  count: number;
}

const newCross = (): Cross => ({ sums: new Float64Array(9), observedSquares: 0, expectedSquares: 0, count: 0 });

function add(cross: Cross, observed: Float64Array, at: number, part: ArrayLike<number>): void {
  for (let j = 0; j < 3; j++) {
    const o = observed[at + j]!;
    cross.observedSquares += o * o;
    cross.expectedSquares += part[j]! * part[j]!;
    for (let t = 0; t < 3; t++) cross.sums[3 * j + t]! += o * part[t]!;
  }
  cross.count++;
}

/** What is left with the numbers in each unit. */
function* errors({ sums, observedSquares, expectedSquares }: Cross, columns: readonly number[], signs: readonly number[]): Generator<{ readonly degrees: boolean; readonly squaredError: number }> {
  const score = signs[0]! * sums[columns[0]!]! + signs[1]! * sums[3 + columns[1]!]! + signs[2]! * sums[6 + columns[2]!]!;
  for (const degrees of [false, true]) {
    const factor = degrees ? DEG : 1;
    yield { degrees, squaredError: Math.max(0, factor * factor * observedSquares - 2 * factor * score + expectedSquares) };
  }
}

function angularVelocities(problem: RateProblem): RateFit[] {
  const { measured, observed } = problem;
  const criteria = criteriaOf(problem);
  const [body, reference] = [newCross(), newCross()];
  const inReference = new Float64Array(3);
  for (let k = 0; k < measured.samples.length; k++) {
    const { c, omega } = sampleAt(measured, k);
    add(body, observed, 3 * k, omega);
    for (let j = 0; j < 3; j++) inReference[j] = c[j]! * omega[0]! + c[3 + j]! * omega[1]! + c[6 + j]! * omega[2]!;
    add(reference, observed, 3 * k, inReference);
  }
  const fits: RateFit[] = [];
  for (const [kind, cross] of [['body', body], ['reference', reference]] as const) {
    TURNS.forEach(({ column, sign }, turn) => {
      for (const { degrees, squaredError } of errors(cross, column, sign)) {
        if (criteria.fits(squaredError, cross.count)) fits.push({ hypothesis: { kind, turn, degrees }, squaredError, count: cross.count });
      }
    });
  }
  return fits;
}

/**
 * Euler rates are judged by the angular velocity that they make, o_1 u + o_2 n + o_3 w, which exists up to gimbal lock; the
 * rates themselves grow without bound there, and with them their noise. n is at right angles to both others, so only
 * the product of the outer two rates takes the cosine between their lines.
 */
function eulerRates(problem: RateProblem): RateFit[] {
  const { measured, observed } = problem;
  const criteria = criteriaOf(problem);
  const part = new Float64Array(4);
  const fits: RateFit[] = [];
  for (let i = 0; i < 3; i++) for (let k = 0; k < 3; k++) {
    const lines = [i, k] as const;
    const cross = newCross();
    const slanted = new Float64Array(9);
    for (let s = 0; s < measured.samples.length; s++) {
      const sample = sampleAt(measured, s);
      if (!partsAlong(sample, lines, part)) continue;
      add(cross, observed, 3 * s, part);
      const [o0, o1, o2] = [observed[3 * s]!, observed[3 * s + 1]!, observed[3 * s + 2]!];
      slanted[1]! += part[3]! * o0 * o1;
      slanted[2]! += part[3]! * o0 * o2;
      slanted[5]! += part[3]! * o1 * o2;
    }
    cross.expectedSquares = measured.bodyRates.reduce((sum, component) => sum + component * component, 0);
    if (cross.count === 0) continue;
    for (const order of ORDERS) for (const signs of SIGNS) {
      const listed = order.map((each) => each - 1) as unknown as EulerClass['listed'];
      const [outer, other] = [listed.indexOf(0), listed.indexOf(2)].sort() as [number, number];
      const product = 2 * signs[outer]! * signs[other]! * slanted[3 * outer + other]!;
      for (const { degrees, squaredError } of errors({ ...cross, observedSquares: cross.observedSquares + product }, listed, signs)) {
        if (criteria.fits(squaredError, cross.count)) fits.push({ hypothesis: { kind: 'euler', of: { lines, listed, signs: [...signs] }, degrees }, squaredError, count: cross.count });
      }
    }
  }
  return fits;
}

/** |Δq̇|² is a quarter of |Δω|². A quaternion's sign is free at every sample, and so is its derivative's. */
function quaternionRates(problem: RateProblem): RateFit[] {
  const { measured, observed } = problem;
  const criteria = criteriaOf(problem);
  const count = measured.samples.length;
  const stride = Math.max(1, Math.floor(count / TRIED_FIRST));
  const left = (hypothesis: RateHypothesis, step: number): { squaredError: number; count: number } => {
    let squaredError = 0;
    let used = 0;
    for (let k = 0; k < count; k += step) {
      const expected = expectedNumbers(hypothesis, sampleAt(measured, k))!;
      let [minus, plus] = [0, 0];
      for (let j = 0; j < 4; j++) {
        minus += (observed[4 * k + j]! - expected[j]!) ** 2;
        plus += (observed[4 * k + j]! + expected[j]!) ** 2;
      }
      squaredError += 4 * Math.min(minus, plus);
      used++;
    }
    return { squaredError, count: used };
  };
  const fits: RateFit[] = [];
  for (const scalarLast of [false, true]) for (const conjugated of [false, true]) {
    for (let pair = 0; pair < TURN_COUNT * TURN_COUNT; pair++) {
      const hypothesis: RateHypothesis = { kind: 'quaternion', scalarLast, conjugated, bodyTurn: Math.floor(pair / TURN_COUNT), referenceTurn: pair % TURN_COUNT };
      const first = left(hypothesis, stride);
      if (!criteria.fits(first.squaredError, first.count)) continue;
      const all = stride === 1 ? first : left(hypothesis, 1);
      if (criteria.fits(all.squaredError, all.count)) fits.push({ hypothesis, ...all });
    }
  }
  return fits;
}

/** |ΔĊ|² is twice |Δω|². */
function matrixRates(problem: RateProblem): RateFit[] {
  const { measured, observed } = problem;
  const criteria = criteriaOf(problem);
  const count = measured.samples.length;
  const [plain, transposed] = [new Float64Array(81), new Float64Array(81)];
  let squares = 0;
  for (let k = 0; k < count; k++) {
    const { c, omega } = sampleAt(measured, k);
    const rate = matrixRate(c, omega);
    for (let i = 0; i < 3; i++) for (let j = 0; j < 3; j++) {
      const o = observed[9 * k + 3 * i + j]!;
      squares += o * o + rate[3 * i + j]! ** 2;
      for (let n = 0; n < 9; n++) {
        plain[9 * (3 * i + j) + n]! += o * rate[n]!;
        transposed[9 * (3 * j + i) + n]! += o * rate[n]!;
      }
    }
  }
  const fits: RateFit[] = [];
  for (const [sums, isTransposed] of [[plain, false], [transposed, true]] as const) {
    for (let pair = 0; pair < TURN_COUNT * TURN_COUNT; pair++) {
      const squaredError = Math.max(0, squares / 2 - pairScore(sums, pair));
      if (criteria.fits(squaredError, count)) fits.push({ hypothesis: { kind: 'dcm', transposed: isTransposed, bodyTurn: Math.floor(pair / TURN_COUNT), referenceTurn: pair % TURN_COUNT }, squaredError, count });
    }
  }
  return fits;
}
