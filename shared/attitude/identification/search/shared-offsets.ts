import { fitReferenceGiven, squaredError } from '../fit/scores.ts';
import { dot9 } from '../fit/best-rotation.ts';
import type { Moments } from '../fit/moments.ts';
import type { Motion } from '../fit/motion.ts';
import { BODY_OFFSET, inverseInformation, normalEquations, placesOf, REFERENCE_OFFSET } from '../fit/normal-equations.ts';
import { dominantEigenvector, frameRotation, multiply, transposed } from '../fit/small-matrix.ts';
import type { Fit } from './fit.ts';
import { goldenMinimum } from './golden-minimum.ts';

const STEPS = 72;

/**
 * Where the data do not say how two sides share an offset, the sharing that takes the fewest and smallest words. All
 * that fits lies on one curve: B turned about a fixed axis, with the A that fits each B. The axis is the body part of
 * the direction that the data know least.
 *
 * @param costOf - of a fit in words.
 */
export function shareOffset(fit: Fit, moments: Moments, motion: Motion, variance: number, costOf: (fit: Fit) => number): Fit {
  const equations = normalEquations(moments, motion, fit.b, fit.a, null);
  const weakest = dominantEigenvector(inverseInformation(equations, placesOf([REFERENCE_OFFSET, BODY_OFFSET], equations), variance), 6).subarray(3);
  const length = Math.hypot(...weakest);
  const along = (angle: number): Fit => {
    const turn = angle / (length || 1);
    const b = multiply(frameRotation(weakest[0]! * turn, weakest[1]! * turn, weakest[2]! * turn), fit.b);
    const a = fitReferenceGiven(moments, b);
    return {
      ...fit, b, a, bodyTurn: null, referenceTurn: null,
      squaredError: squaredError(moments, scoreOf(moments, b, a)),
      freed: ['reference', 'body', ...fit.freed.filter((block) => block === 'lag' || block === 'scale')],
      hidden: () => ({ inseparable: [['reference', 'body'], ['body', 'reference']], unseen: [] }),
    };
  };
  const step = (2 * Math.PI) / STEPS;
  const costs = Array.from({ length: STEPS }, (_, k) => costOf(along(k * step)));
  const best = costs.reduce((least, cost, k) => (cost < costs[least]! ? k : least), 0);
  return along(goldenMinimum((angle) => costOf(along(angle)), (best - 1) * step, (best + 1) * step));
}

/** Σ tr(Mᵀ B C A). */
function scoreOf({ cross }: Moments, b: Float64Array, a: Float64Array): number {
  const row = new Float64Array(9);
  const at = transposed(a);
  let score = 0;
  for (let k = 0; k < 3; k++) for (let m = 0; m < 3; m++) {
    for (let l = 0; l < 3; l++) for (let n = 0; n < 3; n++) row[3 * l + n] = cross[9 * (3 * k + l) + 3 * m + n]!;
    score += b[3 * k + m]! * dot9(row, at);
  }
  return score;
}
