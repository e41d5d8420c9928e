import type { Criteria } from '../fit/criteria.ts';
import { BODY_OFFSET, LAG, PARAMETERS, placesOf, REFERENCE_OFFSET, SCALE, solve, type NormalEquations, type Solution } from '../fit/normal-equations.ts';
import type { Block } from './fit.ts';

const PLACE: Readonly<Record<Block, number>> = { reference: REFERENCE_OFFSET, body: BODY_OFFSET, lag: LAG, scale: SCALE };
export const BLOCKS: readonly Block[] = ['reference', 'body', 'lag', 'scale'];

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
    return this.#criteria.earned(this.squaredError(blocks) - this.squaredError(larger), this.squaredError(larger), this.#equations.count, k, freed);
  }

  /** Fits, and nothing beside it has earned a place: one at a time, or all together. */
  suffices(blocks: readonly Block[]): boolean {
    if (!this.fits(blocks)) return false;
    const rest = without(blocks).filter((block) => this.has(block));
    return !rest.some((block) => this.earned(blocks, [block])) && !this.earned(blocks, rest);
  }

  /** Largest standard deviation of a block's parameters with some blocks free. */
  deviation(block: Block, free: readonly Block[]): number {
    const { inverse, freed } = this.solution(free);
    const variance = this.#criteria.found(this.squaredError(free), this.#equations.count, freed.length);
    const from = PLACE[block];
    let largest = 0;
    freed.forEach((place, i) => {
      if (place >= from && place < from + (block === 'lag' || block === 'scale' ? 1 : 3)) largest = Math.max(largest, inverse[freed.length * i + i]!);
    });
    return Math.sqrt(largest * variance);
  }

  parameter(block: 'lag' | 'scale', blocks: readonly Block[]): number {
    return this.solution(blocks).parameters[PLACE[block]]!;
  }

  offset(block: 'reference' | 'body', blocks: readonly Block[]): readonly [number, number, number] {
    const { parameters } = this.solution(blocks);
    const from = PLACE[block];
    return [parameters[from]!, parameters[from + 1]!, parameters[from + 2]!];
  }

  static readonly parameterCount = PARAMETERS;
}
