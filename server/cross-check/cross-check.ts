import type { Convention } from '#shared/attitude/convention.ts';
import { NUMBERS_PER_ATTITUDE } from '#shared/attitude/convention.ts';
import { BigNumber, exactly, ulpsBetween } from './big-number.ts';
import { angleBetween, defectOf, meaningOf, nearest, numbersOf, relabelled, type Matrix } from './exact-conversion.ts';
import { angleBetweenQuaternions, quaternionBehind } from './package-conversion.ts';

export interface CrossCheckRequest {
  readonly from: Convention;
  readonly to: Convention;
  readonly input: Float64Array;
  /** What the core answered. */
  readonly output: Float64Array;
}

export interface CrossCheckResult {
  /** Largest difference of a component from the exact one, in units of its last place; differences below 1e-22, where components cancel to near nothing, count as none. */
  readonly maxUlp: number;
  /** Largest angle between the attitude answered and the exact one, rad. */
  readonly maxAngleRad: number;
  readonly methods: readonly { readonly method: string; readonly maxUlp?: number; readonly maxAngleRad: number }[];
}

/** Where a matrix is off orthogonal by more than this, it stands for the nearest rotation; up to here, for itself. */
const CLEAN = 1e-12;
const CANCELLED = 1e-22;

/** Computes every answer again, twice, by code that shares nothing with the core, and measures the differences. */
export function crossCheck({ from, to, input, output }: CrossCheckRequest): CrossCheckResult {
  const [inputWidth, outputWidth] = [NUMBERS_PER_ATTITUDE[from.representation], NUMBERS_PER_ATTITUDE[to.representation]];
  let [maxUlp, maxAngleRad, packageAngle] = [0, 0, 0];
  for (let i = 0; i < input.length / inputWidth; i++) {
    const numbers = Array.from(input.subarray(i * inputWidth, (i + 1) * inputWidth));
    const answer = Array.from(output.subarray(i * outputWidth, (i + 1) * outputWidth));
    const exact = relabelled(rotationOf(from, to, numbers), from, to);
    maxUlp = Math.max(maxUlp, ulpsOff(to, answer, numbersOf(to, exact)));
    maxAngleRad = Math.max(maxAngleRad, angleBetween(exact, meaningOf(to, answer)));
    const [before, after] = [quaternionBehind(from, numbers), quaternionBehind(to, answer)];
    if (before && after) packageAngle = Math.max(packageAngle, angleBetweenQuaternions(before, after));
  }
  return {
    maxUlp, maxAngleRad,
    methods: [
      { method: 'mathjs BigNumber, 64 digits', maxUlp, maxAngleRad },
      { method: 'quaternion package, double precision', maxAngleRad: packageAngle },
    ],
  };
}

function rotationOf(from: Convention, to: Convention, numbers: readonly number[]): Matrix {
  const meant = meaningOf(from, numbers);
  if (from.representation !== 'dcm') return meant;
  const takenAsItStands = defectOf(meant) <= CLEAN && (to.representation === 'dcm' || to.representation === 'euler');
  return takenAsItStands ? meant : nearest(meant);
}

/** Largest difference over the components; 0 at gimbal lock, where only the attitude can be compared. */
function ulpsOff(to: Convention, answer: readonly number[], exact: BigNumber[] | null): number {
  if (!exact) return 0;
  const candidates = to.representation === 'quaternion' || to.representation === 'axis-angle' || to.representation === 'rotation-vector' || to.representation === 'mrp'
    ? [exact, negated(to, exact)] : [exact];
  return Math.min(...candidates.map((candidate) => Math.max(...candidate.map((value, k) => ulps(to, answer[k]!, value)))));
}

function ulps(to: Convention, answer: number, exact: BigNumber): number {
  if (to.representation !== 'euler') return ulpsOrCancelled(answer, exact);
  // Angles are the same to whole turns: the one nearest to the answer is meant.
  const turn = to.unit === 'deg' ? new BigNumber(360) : BigNumber.acos(-1).times(2);
  const turns = exactly(answer).minus(exact).div(turn).round();
  return ulpsOrCancelled(answer, exact.plus(turn.times(turns)));
}

/** A component that cancels to near nothing is held to an absolute bound: its last place means nothing. */
const ulpsOrCancelled = (answer: number, exact: BigNumber): number => (exactly(answer).minus(exact).abs().lt(CANCELLED) ? 0 : ulpsBetween(answer, exact));

/** The other sign of a quaternion, and the other axis of a half turn. */
const negated = (to: Convention, exact: readonly BigNumber[]): BigNumber[] => exact.map((value, k) => (to.representation === 'axis-angle' && k === 3 ? value : value.neg()));
