import { compose } from './compose.ts';
import { inverse } from './inverse.ts';
import type { Quaternion } from './quaternion.ts';

/**
 * The attitude of one body relative to another, both known in the same reference axes: what turns components in the
 * second body's axes into components in the first's.
 *
 * @param first - q with v_ref = R(q) v_first, norm 1. @param second - q with v_ref = R(q) v_second, norm 1.
 * @returns q with v_first = R(q) v_second. Accuracy: plain double precision.
 */
export const relative = (first: Readonly<Quaternion>, second: Readonly<Quaternion>): Quaternion => compose(inverse(first), second);
