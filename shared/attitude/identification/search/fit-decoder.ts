import type { Criteria } from '../fit/criteria.ts';
import { dot9 } from '../fit/best-rotation.ts';
import { fitBothSides } from '../fit/both-sides.ts';
import type { Moments } from '../fit/moments.ts';
import type { Motion } from '../fit/motion.ts';
import { normalEquations, type ScaledMoments } from '../fit/normal-equations.ts';
import { fitBodySide, fitReferenceSide, pairScore, squaredError } from '../fit/scores.ts';
import { frameRotation, multiply } from '../fit/small-matrix.ts';
import type { Decoder } from '../lattice/decoder.ts';
import { inverse, TURN_COUNT, turnMatrix } from '../lattice/turns.ts';
import type { Block, Fit, Place } from './fit.ts';
import { hiddenParameters } from './hidden-parameters.ts';
import { Models } from './models.ts';

/** Root mean square, rad, within which a point is near enough for a lag or a scale to be told from its slope. */
const NEAR = 0.35;

/** Sums over some samples; with those of a scale, or without. */
export interface SampleSums {
  readonly motion: Motion;
  readonly moments: Moments;
  readonly scaled: ScaledMoments | null;
}

/** A decoder at one place, with its sums. */
export interface DecoderAtPlace {
  readonly decoder: Decoder;
  readonly index: number;
  readonly place: Place;
  readonly sums: SampleSums;
  /** Fewer samples with the sums of a scale, where `sums` has none; null where a scale means nothing. */
  readonly scaleSums: () => SampleSums | null;
  /** Start for B where both sides are free. */
  readonly startForBody: () => Float64Array;
}

/** Where a lag or a scale would explain what is left, with the turns about which it would. */
export interface Proposal {
  readonly place: Place;
  readonly bodyTurn: number | null;
  readonly referenceTurn: number | null;
}

/** Whether an explanation with these turns (null: an offset) is wanted at all. */
export type Wanted = (bodyTurn: number | null, referenceTurn: number | null) => boolean;

const TURN_MATRICES = Array.from({ length: TURN_COUNT }, (_, turn) => turnMatrix(turn));
/** A = P_rᵀ. */
const INVERSE_MATRICES = Array.from({ length: TURN_COUNT }, (_, turn) => turnMatrix(inverse(turn)));

/** Everything that explains the data by one decoder at one place: axis sets alone first, then offsets on one side, then on both. */
export class DecoderFitting {
  readonly fits: Fit[] = [];
  readonly proposals: Proposal[] = [];
  /** Least Σ |r|² of a pair of axis sets that did not fit, with the pair. */
  nearestMiss: { readonly squaredError: number; readonly pair: number } | null = null;
  readonly #at: DecoderAtPlace;
  readonly #criteria: Criteria;
  /** Turns with which axis sets alone already fit. */
  readonly #bodies = new Set<number>();
  readonly #references = new Set<number>();
  readonly #nearScore: number;

  constructor(at: DecoderAtPlace, criteria: Criteria) {
    this.#at = at;
    this.#criteria = criteria;
    const { moments } = at.sums;
    this.#nearScore = moments.squares / 2 - Math.max(NEAR * NEAR * moments.count, criteria.largest(moments.count));
  }

  fitAxisSets(wanted: Wanted): void {
    const { moments } = this.#at.sums;
    for (let pair = 0; pair < TURN_COUNT * TURN_COUNT; pair++) {
      const score = pairScore(moments.cross, pair);
      const error = squaredError(moments, score);
      const [b, r] = [Math.floor(pair / TURN_COUNT), pair % TURN_COUNT];
      if (score >= this.#nearScore && wanted(b, r) && this.#consider(b, r, TURN_MATRICES[b]!, INVERSE_MATRICES[r]!)) {
        this.#bodies.add(b);
        this.#references.add(r);
      } else if (!this.nearestMiss || error < this.nearestMiss.squaredError) this.nearestMiss = { squaredError: error, pair };
    }
  }

  fitOffsets(wanted: Wanted): void {
    const { moments, motion } = this.#at.sums;
    for (let turn = 0; turn < TURN_COUNT; turn++) {
      if (!this.#bodies.has(turn) && wanted(turn, null)) {
        const side = fitReferenceSide(moments, turn, this.#nearScore);
        if (side) this.#consider(turn, null, TURN_MATRICES[turn]!, side.rotation);
      }
      if (!this.#references.has(turn) && wanted(null, turn)) {
        const side = fitBodySide(moments, turn, this.#nearScore);
        if (side) this.#consider(null, turn, side.rotation, INVERSE_MATRICES[turn]!);
      }
    }
    if (this.fits.length > 0 || !wanted(null, null)) return;
    const both = fitBothSides(moments, motion, this.#at.startForBody());
    if (both.squaredError <= moments.squares / 2 - this.#nearScore) this.#consider(null, null, both.b, both.a);
  }

  #consider(bodyTurn: number | null, referenceTurn: number | null, b: Float64Array, a: Float64Array): boolean {
    const { decoder, index, sums, place } = this.#at;
    const models = this.#modelsAt(b, a);
    const freed: Block[] = [...(referenceTurn === null ? ['reference' as const] : []), ...(bodyTurn === null ? ['body' as const] : []), ...place.freed];
    if (!models.suffices(freed)) {
      this.#lookElsewhere(models, freed, bodyTurn, referenceTurn);
      return false;
    }
    const moved = place.freed.length > 0;
    const there = moved ? this.#moved(models, freed) : place;
    if (moved) this.proposals.push({ place: there, bodyTurn, referenceTurn });
    const turnedB = moved && bodyTurn === null ? multiply(frameRotation(...models.offsetStep('body', freed)), b) : b;
    const turnedA = moved && referenceTurn === null ? multiply(a, frameRotation(...models.offsetStep('reference', freed))) : a;
    this.fits.push({
      decoder, index, bodyTurn, referenceTurn, b: turnedB, a: turnedA, place, lag: there.lag, scale: there.scale, freed,
      squaredError: models.squaredError(freed), count: sums.moments.count,
      hidden: hiddenParameters(models, freed, { reference: () => fromNearestTurn(turnedA), body: () => fromNearestTurn(turnedB), lag: () => Math.abs(there.lag), scale: () => Math.abs(Math.log(there.scale)) }),
    });
    return true;
  }

  #modelsAt(b: Float64Array, a: Float64Array): Models {
    const { sums, scaleSums } = this.#at;
    return new Models(normalEquations(sums.moments, sums.motion, b, a, sums.scaled), this.#criteria, () => {
      const fewer = scaleSums();
      return fewer && new Models(normalEquations(fewer.moments, fewer.motion, b, a, fewer.scaled), this.#criteria, () => null);
    });
  }

  /** A lag or a scale beside the model, where it would do. */
  #lookElsewhere(models: Models, freed: readonly Block[], bodyTurn: number | null, referenceTurn: number | null): void {
    const missing = (['lag', 'scale'] as const).filter((block) => !freed.includes(block) && models.has(block));
    for (const more of missing.length === 2 ? [...missing.map((block) => [block]), missing] : missing.map((block) => [block])) {
      if (!models.earned(freed, more)) continue;
      // The slope may reach too far for a straight line, so a quarter of the residual is promise enough.
      const { left, fits } = models.promise(freed, more);
      if (fits || left <= 0.25) this.proposals.push({ place: this.#moved(models, [...freed, ...more]), bodyTurn, referenceTurn });
    }
  }

  /** One step of Newton's for the lag and the scale that are free. */
  #moved(models: Models, blocks: readonly Block[]): Place {
    const { place } = this.#at;
    const free = (['lag', 'scale'] as const).filter((block) => blocks.includes(block));
    return {
      lag: place.lag + (free.includes('lag') ? models.step('lag', blocks) : 0),
      scale: place.scale * (free.includes('scale') && models.has('scale') ? Math.exp(models.step('scale', blocks)) : 1),
      freed: free,
    };
  }
}

/** Angle to the nearest turn, rad. */
function fromNearestTurn(m: Float64Array): number {
  const largest = Math.max(...TURN_MATRICES.map((turn) => dot9(turn, m)));
  return Math.acos(Math.max(-1, Math.min(1, (largest - 1) / 2)));
}
