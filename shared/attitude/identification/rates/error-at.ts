import { expectedNumbers, partsAlong, type RateHypothesis, type RateSample } from './hypotheses.ts';

const DEG = Math.PI / 180;

/** |r| of one sample as an angular velocity, rad/s: a quaternion's derivative is half of it, a matrix' √2 times. */
export function errorAt(hypothesis: RateHypothesis, sample: RateSample, observed: ArrayLike<number>): number {
  if (hypothesis.kind === 'euler') return eulerErrorAt(hypothesis, sample, observed);
  const expected = expectedNumbers(hypothesis, sample)!;
  const apart = (sign: number): number => Math.hypot(...expected.map((number, j) => observed[j]! - sign * number));
  switch (hypothesis.kind) {
    case 'quaternion': return 2 * Math.min(apart(1), apart(-1));
    case 'dcm': return Math.SQRT1_2 * apart(1);
    default: return (hypothesis.degrees ? DEG : 1) * apart(1);
  }
}

/** Of the angular velocity that the listed rates make; see the search. */
function eulerErrorAt({ of: { lines, listed, signs }, degrees }: Extract<RateHypothesis, { kind: 'euler' }>, sample: RateSample, observed: ArrayLike<number>): number {
  const along = new Float64Array(4);
  if (!partsAlong(sample, lines, along)) return 0;
  const rates = [0, 0, 0];
  listed.forEach((part, place) => { rates[part] = signs[place]! * observed[place]! * (degrees ? DEG : 1); });
  const [first, nodes, last] = rates as [number, number, number];
  const { omega } = sample;
  const square = omega[0]! ** 2 + omega[1]! ** 2 + omega[2]! ** 2
    + first ** 2 + nodes ** 2 + last ** 2 + 2 * first * last * along[3]!
    - 2 * (first * along[0]! + nodes * along[1]! + last * along[2]!);
  return Math.sqrt(Math.max(0, square));
}
