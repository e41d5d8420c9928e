import type { Criteria } from '../fit/criteria.ts';
import { BODY_OFFSET, deviationOf, LAG, placesOf, REFERENCE_OFFSET, SCALE, solve, stepOf, type NormalEquations, type Solution } from '../fit/normal-equations.ts';
import type { Block } from './fit.ts';

const PLACE: Readonly<Record<Block, number>> = { reference: REFERENCE_OFFSET, body: BODY_OFFSET, lag: LAG, scale: SCALE };
export const BLOCKS: readonly Block[] = ['reference', 'body', 'lag', 'scale'];

/** The least logarithm of a scale that is told from the noise, in standard deviations of one sample. */
const LEAST_SCALE = 3;

const without = (blocks: readonly Block[]): Block[] => BLOCKS.filter((block) => !blocks.includes(block));

/** The models about one point: which parameters are needed, and what they would be. */
export class Models {
  readonly #equations: NormalEquations;
  readonly #criteria: Criteria;
  readonly #solved = new Map<string, Solution>();

  constructor(equations: NormalEquations, criteria: Criteria) {
    this.#equations = equations;
    this.#criteria = criteria;
  }

  has(block: Block): boolean {
    return (block !== 'lag' || this.#equations.hasLag) && (block !== 'scale' || this.#equations.hasScale);
  }

  solution(blocks: readonly Block[]): Solution {
    const key = BLOCKS.filter((block) => blocks.includes(block)).join();
    let solution = this.#solved.get(key);
    if (!solution) this.#solved.set(key, solution = solve(this.#equations, placesOf(BLOCKS.filter((block) => blocks.includes(block)).map((block) => PLACE[block]), this.#equations), this.#criteria.variance));
    return solution;
  }

  squaredError(blocks: readonly Block[]): number {
    return Math.max(0, this.#equations.squaredError - this.solution(blocks).explained);
  }

  /** Whether the residual of a model fits the noise. */
  fits(blocks: readonly Block[]): boolean {
    return this.#criteria.fits(this.squaredError(blocks), this.#equations.count);
  }

  /** Whether some parameters beside those of a model have earned their place. */
  earned(blocks: readonly Block[], more: readonly Block[]): boolean {
    const larger = [...blocks, ...more];
    const freed = this.solution(larger).freed.length;
    const k = freed - this.solution(blocks).freed.length;
    // Where angles wrap, noise folds over, and a scale of about the size of the noise unfolds it.
    if (more.includes('scale') && Math.abs(this.step('scale', larger)) < LEAST_SCALE * Math.sqrt(this.#criteria.variance)) return false;
    return this.#criteria.earned(this.squaredError(blocks) - this.squaredError(larger), this.squaredError(larger), this.#equations.count, k, freed);
  }

  /** Fits, and nothing beside it has earned a place: one at a time, or all but a scale together. */
  suffices(blocks: readonly Block[]): boolean {
    if (!this.fits(blocks)) return false;
    const rest = without(blocks).filter((block) => this.has(block));
    return !rest.some((block) => this.earned(blocks, [block])) && !this.earned(blocks, rest.filter((block) => block !== 'scale'));
  }

  /** Standard deviation, worst direction, of a block's parameters with some blocks free. */
  deviation(block: Block, free: readonly Block[]): number {
    const { freed } = this.solution(free);
    const variance = this.#criteria.found(this.squaredError(free), this.#equations.count, freed.length);
    return deviationOf(this.#equations, freed, PLACE[block], block === 'lag' || block === 'scale' ? 1 : 3, variance);
  }

  /** Newton's step for the lag or the logarithm of the scale. */
  step(block: 'lag' | 'scale', blocks: readonly Block[]): number {
    return stepOf(this.#equations, this.solution(blocks).freed, this.#criteria.variance)[PLACE[block]]!;
  }
}
