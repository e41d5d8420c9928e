import { frameRotation } from '../fit/small-matrix.ts';
import { expectedNumbers, type RateHypothesis, type RateSample } from './hypotheses.ts';

/** Attitudes and rates without symmetry: hypotheses that agree on all of them agree everywhere. */
const GENERIC: readonly RateSample[] = [
  { c: frameRotation(0.31, -0.72, 0.54), omega: [0.37, -0.61, 0.83] },
  { c: frameRotation(-1.13, 0.47, 0.92), omega: [-0.71, 0.29, 0.53] },
  { c: frameRotation(0.83, 1.21, -0.37), omega: [0.59, 0.97, -0.41] },
];

/** The same text for hypotheses that are the same numbers, derivatives of quaternions up to their sign. */
export function signatureOf(hypothesis: RateHypothesis): string {
  return GENERIC.map((sample) => {
    const numbers = expectedNumbers(hypothesis, sample)!;
    const sense = hypothesis.kind === 'quaternion' ? Math.sign(numbers.find((number) => Math.abs(number) > 1e-6)!) : 1;
    return numbers.map((number) => (sense * number).toFixed(6)).join();
  }).join(';');
}
