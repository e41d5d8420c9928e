import type { Convention } from '#shared/attitude/convention.ts';
import { ExactAttitude, type Matrix } from './attitude.ts';
import { FixedPoint } from './fixed-point.ts';

/** Components off by less than this, absolute, are counted apart: they cancel to near nothing. */
export const CANCELLED = 1e-22;

/** What a run of comparisons of answers with the exact ones came to. */
export class Measure {
  components = 0;
  correctlyRounded = 0;
  /** Over components that are not cancelled, in units of the last place of the exact answer. */
  worstUlp = 0;
  /** Largest error, absolute, of components that are cancelled and not correctly rounded. */
  worstCancelled = 0;
  cancelled = 0;
  worstAngle = 0;
  example: { numbers: readonly number[]; answer: readonly number[]; exact: readonly number[] } | null = null;
  readonly #f: FixedPoint;
  readonly #exact: ExactAttitude;

  constructor(bits: number) {
    this.#f = fixedPointOf(bits);
    this.#exact = new ExactAttitude(this.#f);
  }

  /** Compares one answer by its components, by the angle to the exact attitude (which costs as much again), or both. */
  add(from: Convention, to: Convention, numbers: readonly number[], answer: readonly number[], by: { components: boolean; angle: boolean } = { components: true, angle: false }): void {
    const f = this.#f;
    const exact = by.components ? this.#exact.convert(from, to, numbers) : null;
    if (exact) {
      exact.forEach((value, i) => {
        this.components++;
        const nearest = f.toDouble(value);
        if (nearest === answer[i]) return void this.correctlyRounded++;
        const error = Math.abs(f.toDouble(value - f.of(answer[i]!)));
        if (error < CANCELLED && Math.abs(nearest) < 1e-6) {
          this.cancelled++;
          this.worstCancelled = Math.max(this.worstCancelled, error);
          return;
        }
        const ulps = error / lastPlace(nearest);
        if (ulps > this.worstUlp) {
          this.worstUlp = ulps;
          this.example = { numbers, answer, exact: exact.map((each) => f.toDouble(each)) };
        }
      });
    }
    if (by.angle) this.worstAngle = Math.max(this.worstAngle, this.#angle(this.#exact.rotation(from, to, numbers), this.#exact.meaning(to, answer).matrix));
  }

  /** |A − B| = 2√2 sin(angle/2), Frobenius. */
  #angle(a: Matrix, b: Matrix): number {
    const f = this.#f;
    const square = a.flatMap((row, i) => row.map((entry, j) => f.square(entry - b[i]![j]!))).reduce((sum, entry) => sum + entry, 0n);
    return f.toDouble(f.sqrt(square)) / Math.SQRT2;
  }
}

const known = new Map<number, FixedPoint>();
export function fixedPointOf(bits: number): FixedPoint {
  let f = known.get(bits);
  if (!f) known.set(bits, f = new FixedPoint(bits));
  return f;
}

/** The value of the last bit of a double. */
export function lastPlace(value: number): number {
  const view = new DataView(new ArrayBuffer(8));
  view.setFloat64(0, Math.abs(value));
  const exponent = Math.max(view.getUint16(0) >> 4, 1);
  return exponent > 52 ? 2 ** (exponent - 1075) : 2 ** -1074;
}
