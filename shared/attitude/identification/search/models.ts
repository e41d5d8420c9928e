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
  readonly #ofScale: () => Models | null;
  readonly #solved = new Map<number, Solution>();
  #scaleModels: Models | null | undefined;

  /** @param ofScale - models of fewer samples that know of a scale, where these equations do not. */
  constructor(equations: NormalEquations, criteria: Criteria, ofScale: () => Models | null) {
    this.#equations = equations;
    this.#criteria = criteria;
    this.#ofScale = ofScale;
  }

  has(block: Block): boolean {
    if (block === 'scale') return this.#knowing(['scale']) !== null;
    return block !== 'lag' || this.#equations.hasLag;
  }

  solution(blocks: readonly Block[]): Solution {
    let key = 0;
    for (const block of blocks) key |= 1 << BLOCKS.indexOf(block);
    let solution = this.#solved.get(key);
    if (!solution) {
      const places = BLOCKS.filter((_, k) => key & (1 << k)).map((block) => PLACE[block]);
      this.#solved.set(key, solution = solve(this.#equations, placesOf(places, this.#equations), this.#criteria.variance));
    }
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
    const knowing = this.#knowing(more);
    if (knowing !== this) return knowing?.earned(blocks, more) ?? false;
    const larger = [...blocks, ...more];
    // Where angles wrap, noise folds over, and a scale of about the size of the noise unfolds it.
    if (more.includes('scale') && Math.abs(this.step('scale', larger)) < LEAST_SCALE * Math.sqrt(this.#criteria.variance)) return false;
    const freed = this.solution(larger).freed.length;
    const k = freed - this.solution(blocks).freed.length;
    return this.#criteria.earned(this.squaredError(blocks) - this.squaredError(larger), this.squaredError(larger), this.#equations.count, k, freed);
  }

  /** Fits, and nothing beside it has earned a place: all but a scale together, or one at a time. */
  suffices(blocks: readonly Block[]): boolean {
    if (!this.fits(blocks)) return false;
    const rest = without(blocks).filter((block) => this.has(block));
    return !this.earned(blocks, rest.filter((block) => block !== 'scale')) && !rest.some((block) => this.earned(blocks, [block]));
  }

  /** How much of a model's residual is left with more parameters, and whether that fits. */
  promise(blocks: readonly Block[], more: readonly Block[]): { readonly left: number; readonly fits: boolean } {
    const knowing = this.#knowing(more) ?? this;
    const larger = [...blocks, ...more];
    return { left: knowing.squaredError(larger) / knowing.squaredError(blocks), fits: knowing.fits(larger) };
  }

  /** Standard deviation, worst direction, of a block's parameters with some blocks free. */
  deviation(block: Block, free: readonly Block[]): number {
    const knowing = this.#knowing(free);
    if (knowing && knowing !== this) return knowing.deviation(block, free);
    const { freed } = this.solution(free);
    const variance = this.#criteria.found(this.squaredError(free), this.#equations.count, freed.length);
    return deviationOf(this.#equations, freed, PLACE[block], block === 'lag' || block === 'scale' ? 1 : 3, variance);
  }

  /** Newton's step for the lag or the logarithm of the scale. */
  step(block: 'lag' | 'scale', blocks: readonly Block[]): number {
    const knowing = this.#knowing(blocks) ?? this;
    return knowing.#steps(blocks)[PLACE[block]]!;
  }

  /** Newton's step for the offset of a side. */
  offsetStep(block: 'reference' | 'body', blocks: readonly Block[]): readonly [number, number, number] {
    const steps = this.#steps(blocks);
    const from = PLACE[block];
    return [steps[from]!, steps[from + 1]!, steps[from + 2]!];
  }

  #steps(blocks: readonly Block[]): Float64Array {
    return stepOf(this.#equations, this.solution(blocks).freed, this.#criteria.variance);
  }

  /** These models, or those of fewer samples where a scale is in question. */
  #knowing(blocks: readonly Block[]): Models | null {
    if (!blocks.includes('scale') || this.#equations.hasScale) return this;
    return (this.#scaleModels ??= this.#ofScale());
  }
}
