import { arcTangentRadians } from '../arithmetic/arc-tangent.gen.ts';
import { scratch } from '../arithmetic/scratch.ts';
import { POINTS } from '../arithmetic/slots.ts';
import type { Quaternion } from './quaternion.ts';
import { relative } from './relative.ts';

export interface ErrorRotation {
  /** Geodesic distance of the two attitudes, rad, in [0, π]. */
  readonly angle: number;
  /** Unit axis in body axes, about which the rotation by `angle` carries the expected attitude into the actual one; [1, 0, 0] where the angle is 0. */
  readonly axis: readonly [number, number, number];
}

/**
 * The rotation between two attitudes: its angle is the error that matters, never a difference of angles.
 *
 * @param expected - q with v_ref = R(q) v_body, norm 1. @param actual - likewise.
 * Accuracy: 2.5e-16 rad, from the norms and products of plain double precision; by 2 atan2(|v|, |w|), so small angles
 * and angles near π are as good as any.
 */
export function errorRotation(expected: Readonly<Quaternion>, actual: Readonly<Quaternion>): ErrorRotation {
  const [w, x, y, z] = relative(expected, actual);
  const sine = Math.sqrt(x * x + y * y + z * z);
  if (sine === 0) return { angle: 0, axis: [1, 0, 0] };
  const sense = w < 0 ? -1 : 1;
  scratch[POINTS] = sine;
  scratch[POINTS + 1] = 0;
  scratch[POINTS + 2] = Math.abs(w);
  scratch[POINTS + 3] = 0;
  arcTangentRadians(POINTS, POINTS);
  return { angle: 2 * scratch[POINTS]!, axis: [(sense * x) / sine, (sense * y) / sine, (sense * z) / sine] };
}
