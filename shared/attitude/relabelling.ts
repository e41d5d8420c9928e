import { betweenBodies, betweenReferences, bodyPermutation, handedness, referencePermutation } from './axes.ts';
import type { Convention } from './convention.ts';
import { compose, frameOf, inverse, type Relabelling } from './kernels/frames.ts';

/** det of the component matrix between a convention's two sets: −1 where they differ in handedness. */
export const determinantOf = ({ reference, body }: Convention): 1 | -1 =>
  (handedness(referencePermutation(reference)) * handedness(bodyPermutation(body))) as 1 | -1;

/**
 * From the axes that `from` is computed in to those of `to`: axis sets and canonical frames together.
 * @throws AttitudeError `unrelated-frames`, `invalid-convention`.
 */
export function relabellingBetween(from: Convention, to: Convention): Relabelling {
  const into = frameOf(to);
  const outOf = inverse(frameOf(from));
  return {
    left: compose(into, compose(betweenReferences(from.reference, to.reference), outOf)),
    right: compose(into, compose(betweenBodies(from.body, to.body), outOf)),
  };
}
