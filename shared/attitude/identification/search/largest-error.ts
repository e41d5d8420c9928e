import { multiply } from '../fit/small-matrix.ts';
import type { Motion } from '../fit/motion.ts';
import { TURNS } from '../lattice/turns.ts';
import type { Fit } from './fit.ts';

const BLOCK = 512;

/**
 * Largest error angle of each fit, rad, over the samples. The fits share one reader, one scale and the motion.
 *
 * @param numbers - of the samples that the motion uses.
 */
export function largestErrors(fits: readonly Fit[], numbers: Float64Array, { matrices: reference, derivatives }: Motion): number[] {
  const { reader } = fits[0]!.decoder;
  const count = reference.length / 9;
  const m = new Float64Array(9 * BLOCK);
  const largest = new Float64Array(fits.length);
  const errors = fits.map((fit) => squaredErrorOf(fit, derivatives));
  for (let from = 0; from < count; from += BLOCK) {
    const size = Math.min(BLOCK, count - from);
    reader.read(numbers.subarray(reader.width * from, reader.width * (from + size)), size, 1 / fits[0]!.scale, m);
    errors.forEach((error, f) => {
      let most = largest[f]!;
      for (let i = 0; i < size; i++) most = Math.max(most, error(m, 9 * i, reference, 9 * (from + i)));
      largest[f] = most;
    });
  }
  return Array.from(largest, (square) => 2 * Math.asin(Math.min(1, Math.sqrt(square / 8))));
}

type SquaredError = (m: Float64Array, at: number, c: Float64Array, cAt: number) => number;

/** |M − B C A|², C by its slope where the lag is a little off the motion's. */
function squaredErrorOf({ decoder, bodyTurn, referenceTurn, b, a, lag, place: held }: Fit, derivatives: Float64Array | null): SquaredError {
  const shift = derivatives ? lag - held.lag : 0;
  const place = (k: number): number => (decoder.transposed ? 3 * (k % 3) + Math.floor(k / 3) : k);
  const from = Uint8Array.from({ length: 9 }, (_, k) => place(k));
  if (bodyTurn !== null && referenceTurn !== null && shift === 0) {
    const [body, reference] = [TURNS[bodyTurn]!, TURNS[referenceTurn]!];
    const to = Uint8Array.from({ length: 9 }, (_, k) => 3 * body.column[Math.floor(k / 3)]! + reference.column[k % 3]!);
    const sign = Float64Array.from({ length: 9 }, (_, k) => body.sign[Math.floor(k / 3)]! * reference.sign[k % 3]!);
    return (m, at, c, cAt) => {
      let sum = 0;
      for (let k = 0; k < 9; k++) {
        const difference = m[at + from[k]!]! - sign[k]! * c[cAt + to[k]!]!;
        sum += difference * difference;
      }
      return sum;
    };
  }
  const shifted = new Float64Array(9);
  return (m, at, c, cAt) => {
    for (let k = 0; k < 9; k++) shifted[k] = c[cAt + k]! - (shift === 0 ? 0 : shift * derivatives![cAt + k]!);
    const expected = multiply(multiply(b, shifted), a);
    let sum = 0;
    for (let k = 0; k < 9; k++) sum += (m[at + from[k]!]! - expected[k]!) ** 2;
    return sum;
  };
}
