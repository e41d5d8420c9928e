import { AttitudeError } from '../errors.ts';
import type { Quaternion } from './quaternion.ts';

/**
 * The quaternion of norm 1 in the same direction. The largest component is divided out first, so that no square over-
 * or underflows: good for any norm.
 * @throws AttitudeError `zero-norm`, `not-finite`.
 */
export function normalise(q: Readonly<Quaternion>): Quaternion {
  const scale = Math.max(Math.abs(q[0]), Math.abs(q[1]), Math.abs(q[2]), Math.abs(q[3]));
  if (scale === 0) throw new AttitudeError('zero-norm', 'A quaternion of norm 0 has no direction.');
  if (!(scale < Infinity)) throw new AttitudeError('not-finite', 'A quaternion has a component that is not finite.');
  const [w, x, y, z] = [q[0] / scale, q[1] / scale, q[2] / scale, q[3] / scale];
  const norm = Math.sqrt(w * w + x * x + y * y + z * z);
  return [w / norm, x / norm, y / norm, z / norm];
}
