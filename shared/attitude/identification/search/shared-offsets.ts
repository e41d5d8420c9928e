import { fitBothSides } from '../fit/both-sides.ts';
import { dot9 } from '../fit/best-rotation.ts';
import type { Moments } from '../fit/moments.ts';
import type { Motion } from '../fit/motion.ts';
import { BODY_OFFSET, normalEquations, placesOf, REFERENCE_OFFSET, solve } from '../fit/normal-equations.ts';
import { dominantEigenvector, frameRotation, multiply, rotationVectorOf, transposed } from '../fit/small-matrix.ts';
import { TURN_COUNT, turnMatrix } from '../lattice/turns.ts';
import type { Fit } from './fit.ts';

const TURN_MATRICES = Array.from({ length: TURN_COUNT }, (_, turn) => turnMatrix(turn));
const nearestTurn = (m: Float64Array): Float64Array => TURN_MATRICES.reduce((best, turn) => (dot9(turn, m) > dot9(best, m) ? turn : best));

/**
 * Where the data do not say how two sides share an offset: the same fit with the smallest offsets on both together,
 * reached along the direction that the data know least.
 */
export function shareOffset(fit: Fit, moments: Moments, motion: Motion, variance: number): Fit | null {
  const equations = normalEquations(moments, motion, fit.b, fit.a, null);
  const freed = placesOf([REFERENCE_OFFSET, BODY_OFFSET], equations);
  const weakest = dominantEigenvector(solve(equations, freed, variance).inverse.slice(), 6);
  const reference = rotationVectorOf(multiply(transposed(nearestTurn(fit.a)), fit.a));
  const body = rotationVectorOf(multiply(fit.b, transposed(nearestTurn(fit.b))));
  const here = [...reference, ...body];
  const step = -here.reduce((sum, value, k) => sum + value * weakest[k]!, 0);
  const [x, y, z, p, q, r] = Array.from(weakest, (value) => value * step) as [number, number, number, number, number, number];
  const b = multiply(frameRotation(p, q, r), fit.b);
  const both = fitBothSides(moments, motion, b);
  // Turning A along as well would be undone by the fit of A for this B.
  if (Math.hypot(x, y, z, p, q, r) < 1e-6) return null;
  return { ...fit, bodyTurn: null, referenceTurn: null, b: both.b, a: both.a, squaredError: both.squaredError, freed: ['reference', 'body', ...fit.freed.filter((block) => block === 'lag' || block === 'scale')], inseparable: [['reference', 'body'], ['body', 'reference']] };
}
