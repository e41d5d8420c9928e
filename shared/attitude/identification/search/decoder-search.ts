import { startForBody } from '../fit/both-sides.ts';
import { Criteria } from '../fit/criteria.ts';
import { momentsOf, squaredTurn, transposedMoments, type Moments } from '../fit/moments.ts';
import type { Motion, ReferenceRecording } from '../fit/motion.ts';
import type { Decoder, Reader } from '../lattice/decoder.ts';
import { AT_REST, keyOf, type Fit, type Place } from './fit.ts';
import { fitDecoder, type DecoderFits } from './fit-decoder.ts';
import { largestErrors } from './largest-error.ts';
import { chordMismatch, chordSlack, numbersAt, variedSamples, type VariedSamples } from './samples.ts';
import { shareOffset } from './shared-offsets.ts';

/** The numbers of one recording and the decoders that may have made them. */
export interface Problem {
  readonly numbers: Float64Array;
  readonly width: 3 | 4 | 9;
  readonly decoders: readonly Decoder[];
  readonly recording: ReferenceRecording;
  readonly criteria: Criteria;
  /** Standard deviation of a component, rad. */
  readonly sigma: number;
}

/** Discrete hypothesis that came nearest without fitting. */
export interface Miss {
  readonly decoder: Decoder;
  readonly index: number;
  readonly pair: number;
  readonly squaredError: number;
  readonly count: number;
}

/** Step of the logarithm of the scale over which slopes are taken. */
const SCALE_STEP = 1e-3;
const NEWTON_STEPS = 6;
/** Places followed for one decoder and one choice of free parameters. */
const FOLLOWED = 3;

/** Works on one decoder at a time, keeping what several of them share. */
export class DecoderSearch {
  readonly problem: Problem;
  readonly #motions = new Map<number, { readonly motion: Motion; readonly numbers: Float64Array; readonly varied: VariedSamples; readonly criteria: Criteria }>();
  readonly #moments = new Map<string, Moments | null>();
  readonly #readerIds = new Map<Reader, number>();

  constructor(problem: Problem) {
    this.problem = problem;
  }

  /** The reference without a lag. */
  get motion(): Motion {
    return this.#at(0).motion;
  }

  /** Whether chords between samples, which no axis sets and no offsets change, agree with the reference at this place. */
  alive(decoder: Decoder, place: Place): boolean {
    const { varied, numbers, criteria } = this.#at(place.lag);
    const m = this.#readVaried(decoder.reader, numbers, varied, 1 / place.scale);
    return m !== null && chordMismatch(m, varied.pairs, varied.chords).largest <= chordSlack(Math.sqrt(criteria.variance));
  }

  /** The discrete hypothesis of a decoder that comes nearest on the most varied samples. */
  nearestOnVaried(decoder: Decoder, index: number): Miss | null {
    const { varied, numbers, criteria, motion } = this.#at(0);
    const moments = momentsOf(decoder.reader, numbersAt(numbers, this.problem.width, varied.places), 1, { ...motion, matrices: varied.matrices, derivatives: null });
    if (!moments) return null;
    const result = fitDecoder({ decoder, index, place: AT_REST, motion, moments: decoder.transposed ? transposedMoments(moments) : moments, scaled: null, startForBody: () => varied.matrices.slice(0, 9) }, criteria);
    return result.nearestMiss && { decoder, index, count: moments.count, ...result.nearestMiss };
  }

  fitAt(decoder: Decoder, index: number, place: Place): DecoderFits {
    const { motion, numbers, varied, criteria } = this.#at(place.lag);
    const none: DecoderFits = { fits: [], elsewhere: [], nearestMiss: null };
    if (motion.samples.length === 0) return none;
    const moments = this.#momentsAt(decoder, place.lag, place.scale);
    if (!moments) return none;
    let scaled = null;
    if (decoder.reader.scalable) {
      const up = this.#momentsAt(decoder, place.lag, place.scale * Math.exp(SCALE_STEP));
      const down = this.#momentsAt(decoder, place.lag, place.scale * Math.exp(-SCALE_STEP));
      if (up && down) scaled = { step: SCALE_STEP, up, down, squaredTurn: squaredTurn(decoder.reader, numbers, 1 / place.scale, moments.count, SCALE_STEP) };
    }
    return fitDecoder({
      decoder, index, place, motion, moments, scaled,
      startForBody: () => startForBody(this.#readVaried(decoder.reader, numbers, varied, 1 / place.scale)!, varied.matrices, varied.pairs, decoder.transposed),
    }, criteria);
  }

  /** Fits with a lag or a scale free, by Newton's steps from each place. */
  follow(decoder: Decoder, index: number, places: readonly Place[]): Fit[] {
    const settled = new Map<string, Fit>();
    const kinds = new Map<string, Place[]>();
    for (const place of places) kinds.set(place.freed.join(), [...(kinds.get(place.freed.join()) ?? []), place]);
    for (const starts of kinds.values()) {
      for (const start of this.#distinct(starts).slice(0, FOLLOWED)) {
        for (const fit of this.#settle(decoder, index, start)) settled.set(keyOf(fit), fit);
      }
    }
    return [...settled.values()];
  }

  /** Largest error angle of each fit, rad. */
  largestErrors(fits: readonly Fit[]): Map<Fit, number> {
    const groups = new Map<string, Fit[]>();
    for (const fit of fits) {
      const key = `${this.#idOf(fit.decoder.reader)}/${fit.lag}/${fit.scale}`;
      groups.set(key, [...(groups.get(key) ?? []), fit]);
    }
    const errors = new Map<Fit, number>();
    for (const group of groups.values()) {
      const { motion, numbers } = this.#at(group[0]!.lag);
      largestErrors(group, numbers, motion.matrices).forEach((error, k) => errors.set(group[k]!, error));
    }
    return errors;
  }

  /** The same fit with its offset shared between both sides in the fewest words, where the data do not say which side it is on. */
  shared(fit: Fit, costOf: (fit: Fit) => number): Fit {
    const { motion, criteria } = this.#at(fit.lag);
    return shareOffset(fit, this.#momentsAt(fit.decoder, fit.lag, fit.scale)!, motion, criteria.variance, costOf);
  }

  #idOf(reader: Reader): number {
    let id = this.#readerIds.get(reader);
    if (id === undefined) this.#readerIds.set(reader, id = this.#readerIds.size);
    return id;
  }

  #settle(decoder: Decoder, index: number, start: Place): Fit[] {
    let place = start;
    let fits: Fit[] = [];
    for (let step = 0; step < NEWTON_STEPS; step++) {
      if (!this.#sensible(place)) return [];
      const result = this.fitAt(decoder, index, place);
      fits = result.fits;
      const next = this.#distinct(result.elsewhere.filter(({ freed }) => freed.join() === place.freed.join()))[0];
      if (!next || this.#same(next, place)) break;
      place = next;
    }
    return fits;
  }

  #sensible({ lag, scale }: Place): boolean {
    return Math.abs(lag) <= this.problem.recording.longestLag && scale > 1e-6 && scale < 1e6;
  }

  #same(a: Place, b: Place): boolean {
    const { motion } = this.#at(0);
    const rate = Math.sqrt(motion.sumSquareRate / Math.max(1, motion.samples.length));
    const fine = 1e-3 * Math.sqrt(this.problem.criteria.variance);
    return Math.abs(a.lag - b.lag) * rate <= fine && Math.abs(Math.log(a.scale / b.scale)) <= fine;
  }

  #distinct(places: readonly Place[]): Place[] {
    const kept: Place[] = [];
    for (const place of places) if (!kept.some((other) => this.#same(place, other))) kept.push(place);
    return kept;
  }

  #at(lag: number) {
    let at = this.#motions.get(lag);
    if (!at) {
      const { recording, numbers, width, sigma, criteria } = this.problem;
      const motion = recording.at(lag);
      const all = motion.samples.length === recording.count;
      at = {
        motion,
        numbers: all ? numbers : numbersAt(numbers, width, motion.samples),
        varied: variedSamples(motion),
        criteria: motion.interpolationVariance === 0 ? criteria : new Criteria(sigma, motion.interpolationVariance),
      };
      this.#motions.set(lag, at);
    }
    return at;
  }

  #momentsAt(decoder: Decoder, lag: number, scale: number): Moments | null {
    const plain = this.#shared(decoder.reader, lag, scale, false);
    return decoder.transposed && plain ? this.#shared(decoder.reader, lag, scale, true) : plain;
  }

  #shared(reader: Reader, lag: number, scale: number, transposed: boolean): Moments | null {
    const key = `${this.#idOf(reader)}/${lag}/${scale}/${transposed}`;
    let moments = this.#moments.get(key);
    if (moments === undefined) {
      const { motion, numbers } = this.#at(lag);
      moments = transposed ? transposedMoments(this.#shared(reader, lag, scale, false)!) : momentsOf(reader, numbers, 1 / scale, motion);
      this.#moments.set(key, moments);
    }
    return moments;
  }

  #readVaried(reader: Reader, numbers: Float64Array, varied: VariedSamples, factor: number): Float64Array | null {
    const m = new Float64Array(9 * varied.places.length);
    return reader.read(numbersAt(numbers, this.problem.width, varied.places), varied.places.length, factor, m) ? m : null;
  }
}
