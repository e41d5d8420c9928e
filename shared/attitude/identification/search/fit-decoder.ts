import type { Criteria } from '../fit/criteria.ts';
import { fitBothSides } from '../fit/both-sides.ts';
import type { Moments } from '../fit/moments.ts';
import type { Motion } from '../fit/motion.ts';
import { normalEquations, type ScaledMoments } from '../fit/normal-equations.ts';
import { fitBodySide, fitReferenceSide, pairScore, squaredError } from '../fit/scores.ts';
import { dot9 } from '../fit/best-rotation.ts';
import type { Decoder } from '../lattice/decoder.ts';
import { inverse, TURN_COUNT, turnMatrix } from '../lattice/turns.ts';
import type { Block, Fit, Place } from './fit.ts';
import { BLOCKS, Models } from './models.ts';

/** Root mean square, rad, within which a point is near enough for a lag or a scale to be told from its slope. */
const NEAR = 0.35;

/** A decoder at one place, with its sums. */
export interface DecoderAtPlace {
  readonly decoder: Decoder;
  readonly index: number;
  readonly place: Place;
  readonly motion: Motion;
  readonly moments: Moments;
  readonly scaled: ScaledMoments | null;
  /** Start for B where both sides are free. */
  readonly startForBody: () => Float64Array;
}

export interface DecoderFits {
  readonly fits: Fit[];
  /** Where a lag or a scale would explain what is left. */
  readonly elsewhere: Place[];
  /** Least Σ |r|² of a pair of axis sets that did not fit, with the pair; null where all fit. */
  readonly nearestMiss: { readonly squaredError: number; readonly pair: number } | null;
}

const TURN_MATRICES = Array.from({ length: TURN_COUNT }, (_, turn) => turnMatrix(turn));
/** A = P_rᵀ. */
const INVERSE_MATRICES = Array.from({ length: TURN_COUNT }, (_, turn) => turnMatrix(inverse(turn)));

/** Everything that explains the data by one decoder at one place: discrete first, then offsets on one side, then on both. */
export function fitDecoder(at: DecoderAtPlace, criteria: Criteria): DecoderFits {
  const { moments, motion, place } = at;
  const { count } = moments;
  const near = moments.squares / 2 - Math.max(NEAR * NEAR * count, criteria.largest(count));
  const gathered = new Gathered(at, criteria);
  let miss: { squaredError: number; pair: number } | null = null;

  for (let pair = 0; pair < TURN_COUNT * TURN_COUNT; pair++) {
    const score = pairScore(moments.cross, pair);
    const error = squaredError(moments, score);
    const fitsAsItIs = score >= near && gathered.consider(Math.floor(pair / TURN_COUNT), pair % TURN_COUNT, null);
    if (!fitsAsItIs && (!miss || error < miss.squaredError)) miss = { squaredError: error, pair };
  }
  for (let turn = 0; turn < TURN_COUNT; turn++) {
    if (!gathered.hasBody(turn)) {
      const side = fitReferenceSide(moments, turn, near);
      if (side) gathered.consider(turn, null, side.rotation);
    }
    if (!gathered.hasReference(turn)) {
      const side = fitBodySide(moments, turn, near);
      if (side) gathered.consider(null, turn, side.rotation);
    }
  }
  if (gathered.fits.length === 0) {
    const both = fitBothSides(moments, motion, at.startForBody());
    if (both.squaredError <= moments.squares / 2 - near) gathered.considerBoth(both.b, both.a);
  }
  return { fits: gathered.fits, elsewhere: gathered.elsewhere, nearestMiss: place.freed.length === 0 ? miss : null };
}

class Gathered {
  readonly fits: Fit[] = [];
  readonly elsewhere: Place[] = [];
  readonly #at: DecoderAtPlace;
  readonly #criteria: Criteria;
  readonly #bodies = new Set<number>();
  readonly #references = new Set<number>();

  constructor(at: DecoderAtPlace, criteria: Criteria) {
    this.#at = at;
    this.#criteria = criteria;
  }

  /** Whether axis sets alone already fit with this turn. */
  hasBody = (turn: number): boolean => this.#bodies.has(turn);
  hasReference = (turn: number): boolean => this.#references.has(turn);

  /** @param rotation - the fitted side's, where one turn is null. */
  consider(bodyTurn: number | null, referenceTurn: number | null, rotation: Float64Array | null): boolean {
    const b = bodyTurn === null ? rotation! : TURN_MATRICES[bodyTurn]!;
    const a = referenceTurn === null ? rotation! : INVERSE_MATRICES[referenceTurn]!;
    const sides: Block[] = bodyTurn === null ? ['body'] : referenceTurn === null ? ['reference'] : [];
    if (!this.#take(bodyTurn, referenceTurn, b, a, sides)) return false;
    if (bodyTurn !== null && referenceTurn !== null) {
      this.#bodies.add(bodyTurn);
      this.#references.add(referenceTurn);
    }
    return true;
  }

  considerBoth(b: Float64Array, a: Float64Array): void {
    this.#take(null, null, b, a, ['reference', 'body']);
  }

  #take(bodyTurn: number | null, referenceTurn: number | null, b: Float64Array, a: Float64Array, sides: readonly Block[]): boolean {
    const { decoder, index, moments, motion, place, scaled } = this.#at;
    const models = new Models(normalEquations(moments, motion, b, a, scaled), this.#criteria);
    const freed: Block[] = [...sides, ...place.freed];
    if (!models.suffices(freed)) {
      this.#lookElsewhere(models, freed);
      return false;
    }
    this.#refine(models, freed);
    this.fits.push({
      decoder, index, bodyTurn, referenceTurn, b, a, lag: place.lag, scale: place.scale, freed,
      squaredError: models.squaredError(freed), count: moments.count,
      hidden: once(() => ({ inseparable: inseparable(models, freed, a, b, place), unseen: unseen(models, freed) })),
    });
    return true;
  }

  /** A lag or a scale beside the model, where it would do. */
  #lookElsewhere(models: Models, freed: readonly Block[]): void {
    const missing = (['lag', 'scale'] as const).filter((block) => !freed.includes(block) && models.has(block));
    for (const more of missing.length === 2 ? [...missing.map((block) => [block]), missing] : missing.map((block) => [block])) {
      const larger = [...freed, ...more];
      if (!models.earned(freed, more)) continue;
      // The slope may reach too far for a straight line, so a quarter of the residual is promise enough.
      if (!models.fits(larger) && models.squaredError(larger) > 0.25 * models.squaredError(freed)) continue;
      this.#propose(models, larger);
    }
  }

  /** A step of Newton's for the lag and scale that are free at this place. */
  #refine(models: Models, freed: readonly Block[]): void {
    if (this.#at.place.freed.length > 0) this.#propose(models, freed);
  }

  #propose(models: Models, blocks: readonly Block[]): void {
    const { place } = this.#at;
    const free = (['lag', 'scale'] as const).filter((block) => blocks.includes(block));
    this.elsewhere.push({
      lag: place.lag + (free.includes('lag') ? models.step('lag', blocks) : 0),
      scale: place.scale * (free.includes('scale') ? Math.exp(models.step('scale', blocks)) : 1),
      freed: free,
    });
  }
}

function once<T>(reckon: () => T): () => T {
  let value: T | undefined;
  return () => (value ??= reckon());
}

/**
 * Which fitted parameters another could take over. With the other one free too, the fitted one is known no better than
 * to half its size: the data do not say which of the two it is, or how they share it.
 */
function inseparable(models: Models, freed: readonly Block[], a: Float64Array, b: Float64Array, place: Place): [Block, Block][] {
  const size: Record<Block, () => number> = {
    reference: () => fromNearestTurn(a),
    body: () => fromNearestTurn(b),
    lag: () => Math.abs(place.lag),
    scale: () => Math.abs(Math.log(place.scale)),
  };
  return freed.flatMap((block) => BLOCKS.flatMap((other): [Block, Block][] => {
    if (other === block || !models.has(other)) return [];
    const alone = models.deviation(block, freed.filter((each) => each !== other));
    const together = models.deviation(block, [...new Set([...freed, other])]);
    return together > 3 * alone && together > 0.5 * size[block]() ? [[block, other]] : [];
  }));
}

/** A parameter known no better than this with all the others free has not been seen: rad, rad, s, ln. */
const SEEN: Readonly<Record<Block, number>> = { reference: 0.02, body: 0.02, lag: 0.02, scale: 0.02 };

const unseen = (models: Models, freed: readonly Block[]): Block[] => {
  const all = BLOCKS.filter((block) => models.has(block));
  return all.filter((block) => !freed.includes(block) && models.deviation(block, all) > SEEN[block]);
};

/** Angle to the nearest turn, rad. */
function fromNearestTurn(m: Float64Array): number {
  const largest = Math.max(...TURN_MATRICES.map((turn) => dot9(turn, m)));
  return Math.acos(Math.max(-1, Math.min(1, (largest - 1) / 2)));
}
