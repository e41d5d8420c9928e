import { ARC_TANGENTS_DEGREES, ARC_TANGENTS_RADIANS, HALF_PI, PI, TANGENT_STEPS } from './tables.gen.ts';
import { twoSum } from './two-sum.ts';

type DoubleDouble = readonly [number, number];

/**
 * Whether the arc adds to or takes from the angle, for the octant: 1 where x is negative, 2 where |y| > |x|, summed.
 * The angle is arc, π − arc, π/2 − arc, π/2 + arc.
 */
export const SENSE = Float64Array.of(1, -1, -1, 1);

/** Four runs of 257 pairs, one an octant: its base angle plus or minus atan(k/256). */
function byOctant(arcs: readonly number[], half: DoubleDouble, right: DoubleDouble): Float64Array {
  const table = new Float64Array(8 * (TANGENT_STEPS + 1));
  const bases = [[0, 0], half, right, right] as const;
  bases.forEach(([baseHigh, baseLow], octant) => {
    const sense = SENSE[octant]!;
    for (let k = 0; k <= TANGENT_STEPS; k++) {
      const [sum, error] = twoSum(baseHigh, sense * arcs[2 * k]!);
      const [hi, lo] = twoSum(sum, error + (baseLow + sense * arcs[2 * k + 1]!));
      const row = 2 * (octant * (TANGENT_STEPS + 1) + k);
      table[row] = hi;
      table[row + 1] = lo;
    }
  });
  return table;
}

export const ARCS_RADIANS: Float64Array = byOctant(ARC_TANGENTS_RADIANS, PI, HALF_PI);
export const ARCS_DEGREES: Float64Array = byOctant(ARC_TANGENTS_DEGREES, [180, 0], [90, 0]);
