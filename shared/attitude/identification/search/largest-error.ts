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
  const [b0, b1, b2, b3, b4, b5, b6, b7, b8] = b as unknown as Nine;
  const [f0, f1, f2, f3, f4, f5, f6, f7, f8] = from as unknown as Nine;
  // Written out, and without a matrix made for each sample: this runs for every sample of every explanation.
  return (m, at, c, cAt) => {
    const d = derivatives ?? c;
    const c0 = c[cAt]! - shift * d[cAt]!, c1 = c[cAt + 1]! - shift * d[cAt + 1]!, c2 = c[cAt + 2]! - shift * d[cAt + 2]!;
    const c3 = c[cAt + 3]! - shift * d[cAt + 3]!, c4 = c[cAt + 4]! - shift * d[cAt + 4]!, c5 = c[cAt + 5]! - shift * d[cAt + 5]!;
    const c6 = c[cAt + 6]! - shift * d[cAt + 6]!, c7 = c[cAt + 7]! - shift * d[cAt + 7]!, c8 = c[cAt + 8]! - shift * d[cAt + 8]!;
    return row(b0 * c0 + b1 * c3 + b2 * c6, b0 * c1 + b1 * c4 + b2 * c7, b0 * c2 + b1 * c5 + b2 * c8, a, m[at + f0]!, m[at + f1]!, m[at + f2]!)
      + row(b3 * c0 + b4 * c3 + b5 * c6, b3 * c1 + b4 * c4 + b5 * c7, b3 * c2 + b4 * c5 + b5 * c8, a, m[at + f3]!, m[at + f4]!, m[at + f5]!)
      + row(b6 * c0 + b7 * c3 + b8 * c6, b6 * c1 + b7 * c4 + b8 * c7, b6 * c2 + b7 * c5 + b8 * c8, a, m[at + f6]!, m[at + f7]!, m[at + f8]!);
  };
}

type Nine = readonly [number, number, number, number, number, number, number, number, number];

/** |(x, y, z) A − (p, q, r)|². */
function row(x: number, y: number, z: number, a: Float64Array, p: number, q: number, r: number): number {
  const d = x * a[0]! + y * a[3]! + z * a[6]! - p;
  const e = x * a[1]! + y * a[4]! + z * a[7]! - q;
  const f = x * a[2]! + y * a[5]! + z * a[8]! - r;
  return d * d + e * e + f * f;
}
