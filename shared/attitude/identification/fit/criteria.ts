import { chiSquareQuantile, chiSquareTail, nestedTail } from './probability.ts';

/** Standard deviation, rad, below which nothing is decided: rounding of single precision, of tables, of plain doubles. */
export const NOISE_FLOOR = 1e-6;

/** A statement of noise may be this much too low. */
const UNDERSTATED = 1.2;
/** How rare, in standard deviations of a normal variable, a residual must be before a hypothesis is given up. */
const RESIDUAL_RARITY = 5;
/** Chance that a parameter which is not there earns a place. */
const UNEARNED = 1e-7;

/**
 * Decides on residuals.
 *
 * A hypothesis is judged against the noise as stated, never against another hypothesis: some readings shrink the noise
 * (a half angle halves it, degrees read as radians multiply it), others only rearrange it, so that their χ² differ by
 * about 2√N for no reason. Within one hypothesis the models are nested and the fits comparable: a parameter is freed
 * only where the residual without it is worse than chance allows, by the noise as stated and by the noise as found.
 */
export class Criteria {
  /** Variance of a component of the error rotation vector, rad². */
  readonly variance: number;
  readonly #floor: number;

  constructor(sigma: number, extraVariance = 0) {
    this.variance = Math.max(sigma, NOISE_FLOOR) ** 2 + extraVariance;
    this.#floor = NOISE_FLOOR ** 2 + extraVariance;
  }

  withExtra(variance: number): Criteria {
    return variance === 0 ? this : new Criteria(Math.sqrt(this.variance), variance);
  }

  /** Largest Σ |r|² over `count` samples that the stated noise can explain. */
  largest(count: number): number {
    return UNDERSTATED ** 2 * this.variance * chiSquareQuantile(3 * count, RESIDUAL_RARITY);
  }

  fits(squaredError: number, count: number): boolean {
    return squaredError <= this.largest(count);
  }

  /**
   * Whether parameters have earned their place.
   * @param gain - how much Σ |r|² falls by them. @param left - what is left of it with all `freed` of them.
   * @param k - how many parameters are in question. @param freed - how many are free in all.
   */
  earned(gain: number, left: number, count: number, k: number, freed: number): boolean {
    if (k === 0 || gain <= 0) return false;
    if (chiSquareTail(gain / (UNDERSTATED ** 2 * this.variance), k) < UNEARNED) return true;
    const freedom = 3 * count - freed;
    if (freedom <= 0) return false;
    const floor = Math.max(left, freedom * this.#floor);
    return nestedTail(floor, floor + gain, k, freedom) < UNEARNED;
  }

  /** Variance as found, between the floor and what was stated. */
  found(left: number, count: number, freed: number): number {
    const freedom = 3 * count - freed;
    return freedom <= 0 ? this.variance : Math.min(this.variance, Math.max(this.#floor, left / freedom));
  }
}
