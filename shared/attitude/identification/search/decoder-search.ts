import { startForBody } from '../fit/both-sides.ts';
import { Criteria } from '../fit/criteria.ts';
import { momentsOf, squaredTurn, transposedMoments, type Moments } from '../fit/moments.ts';
import { thinned, type Motion, type ReferenceRecording } from '../fit/motion.ts';
import type { ScaledMoments } from '../fit/normal-equations.ts';
import { pairScore, squaredError } from '../fit/scores.ts';
import type { Decoder, Reader } from '../lattice/decoder.ts';
import { TURN_COUNT } from '../lattice/turns.ts';
import { keyOf, type Fit, type Place } from './fit.ts';
import { DecoderFitting, type Wanted } from './fit-decoder.ts';
import { largestErrors } from './largest-error.ts';
import { chordMismatch, chordSlack, numbersAt, POOL, variedSamples, type VariedSamples } from './samples.ts';
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

/** So many samples are enough to tell a scale. */
const FEWER = 4096;

/** Which samples sums are over: all; an even selection of those at hand; or one taken before anything else, of as many or for a glance. */
type Which = 'all' | 'few' | 'coarse' | 'glance';
const AT_MOST = { all: Infinity, few: Infinity, coarse: FEWER, glance: POOL } as const;

/** The samples that one lag leaves, with what is made of them. */
interface Samples {
  readonly motion: Motion;
  readonly numbers: Float64Array;
  /** An even selection, where there are many. */
  readonly fewer: { readonly motion: Motion; readonly numbers: Float64Array } | null;
  readonly varied: VariedSamples;
  readonly criteria: Criteria;
}

/** Works on one decoder at a time, keeping what several of them share. */
export class DecoderSearch {
  readonly problem: Problem;
  readonly #samples = new Map<string, Samples>();
  readonly #turns = new Map<string, number>();
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
    const { varied, numbers, criteria } = this.#at(place.lag, place.lag === 0 ? 'all' : 'glance');
    const m = this.#readVaried(decoder.reader, numbers, varied, 1 / place.scale);
    return m !== null && chordMismatch(m, varied.pairs, varied.chords).largest <= chordSlack(Math.sqrt(criteria.variance));
  }

  /** The discrete hypothesis of a decoder that comes nearest on the most varied samples. */
  nearestOnVaried(decoder: Decoder, index: number): Miss | null {
    const { varied, numbers, motion } = this.#at(0);
    const moments = momentsOf(decoder.reader, numbersAt(numbers, this.problem.width, varied.places), 1, { ...motion, matrices: varied.matrices, derivatives: null });
    if (!moments) return null;
    const own = decoder.transposed ? transposedMoments(moments) : moments;
    let best = 0;
    let most = -Infinity;
    for (let pair = 0; pair < TURN_COUNT * TURN_COUNT; pair++) {
      const score = pairScore(own.cross, pair);
      if (score > most) [best, most] = [pair, score];
    }
    return { decoder, index, pair: best, squaredError: squaredError(own, most), count: own.count };
  }

  /** A decoder with its sums at one place; null where it cannot be. */
  fitting(decoder: Decoder, index: number, place: Place, which: 'all' | 'coarse' = 'all'): DecoderFitting | null {
    const { motion, numbers, varied, criteria, fewer } = this.#at(place.lag, which);
    if (motion.samples.length === 0) return null;
    const moments = this.#momentsAt(decoder, place, which);
    if (!moments) return null;
    const { scalable } = decoder.reader;
    const withScale = scalable && (fewer === null || place.freed.includes('scale'));
    return new DecoderFitting({
      decoder, index, place,
      sums: { motion, moments, scaled: withScale ? this.#scaledAt(decoder, place, which) : null },
      scaleSums: () => {
        const scaled = scalable && fewer ? this.#scaledAt(decoder, place, 'few') : null;
        return scaled && { motion: fewer!.motion, moments: this.#momentsAt(decoder, place, 'few')!, scaled };
      },
      startForBody: () => startForBody(this.#readVaried(decoder.reader, numbers, varied, 1 / place.scale)!, varied.matrices, varied.pairs, decoder.transposed),
    }, criteria);
  }

  /** Fits with a lag or a scale free, by Newton's steps from each place. */
  follow(decoder: Decoder, index: number, places: readonly Place[], wanted: Wanted): Fit[] {
    const settled = new Map<string, Fit>();
    const kinds = new Map<string, Place[]>();
    for (const place of places) kinds.set(place.freed.join(), [...(kinds.get(place.freed.join()) ?? []), place]);
    for (const starts of kinds.values()) {
      for (const start of this.#distinct(starts).slice(0, FOLLOWED)) {
        for (const fit of this.#settle(decoder, index, start, wanted)) settled.set(keyOf(fit), fit);
      }
    }
    return [...settled.values()];
  }

  /** Largest error angle of each fit, rad. */
  largestErrors(fits: readonly Fit[]): Map<Fit, number> {
    const groups = new Map<string, Fit[]>();
    for (const fit of fits) {
      const key = `${this.#idOf(fit.decoder.reader)}/${fit.place.lag}/${fit.scale}`;
      groups.set(key, [...(groups.get(key) ?? []), fit]);
    }
    const errors = new Map<Fit, number>();
    for (const group of groups.values()) {
      const { motion, numbers } = this.#at(group[0]!.place.lag);
      largestErrors(group, numbers, motion).forEach((error, k) => errors.set(group[k]!, error));
    }
    return errors;
  }

  /** The same fit with its offset shared between both sides in the fewest words, where the data do not say which side it is on. */
  shared(fit: Fit, costOf: (fit: Fit) => number): Fit {
    const { motion, criteria } = this.#at(fit.place.lag);
    return shareOffset(fit, this.#momentsAt(fit.decoder, fit.place, 'all')!, motion, criteria.variance, costOf);
  }

  #idOf(reader: Reader): number {
    let id = this.#readerIds.get(reader);
    if (id === undefined) this.#readerIds.set(reader, id = this.#readerIds.size);
    return id;
  }

  /** Newton's steps on an even selection where there are many samples, then once more on all. */
  #settle(decoder: Decoder, index: number, start: Place, wanted: Wanted): Fit[] {
    const many = this.problem.recording.count > FEWER;
    let place = this.#snapped(start);
    let fits: readonly Fit[] = [];
    for (let step = 0; step < NEWTON_STEPS; step++) {
      const next = this.#stepped(decoder, index, place, wanted, many ? 'coarse' : 'all');
      if (!next) return [];
      fits = next.fits;
      if (!next.place || this.#same(next.place, place)) break;
      place = this.#snapped(next.place);
    }
    return many && fits.length > 0 ? [...(this.#stepped(decoder, index, place, wanted, 'all')?.fits ?? [])] : [...fits];
  }

  /** Fits at one place, and where to go on; null outside all sense. */
  #stepped(decoder: Decoder, index: number, place: Place, wanted: Wanted, which: 'all' | 'coarse'): { readonly fits: readonly Fit[]; readonly place: Place | undefined } | null {
    const fitting = this.#sensible(place) ? this.fitting(decoder, index, place, which) : null;
    if (!fitting) return null;
    fitting.fitAxisSets(wanted);
    fitting.fitOffsets(wanted);
    return { fits: fitting.fits, place: fitting.proposals.map((proposal) => proposal.place).find(({ freed }) => freed.join() === place.freed.join()) };
  }

  /**
   * Lags are held at whole steps, short enough that what is beyond the slope is a small part of the noise: decoders that
   * ask for nearly the same lag then share one motion.
   */
  #snapped(place: Place): Place {
    const step = this.#reach / this.#rate;
    return { ...place, lag: Number.isFinite(step) ? Math.round(place.lag / step) * step : 0 };
  }

  /** Turn, rad, over which a rotation is a straight line to a twentieth of the noise. */
  get #reach(): number {
    return Math.sqrt(0.04 * Math.sqrt(this.problem.criteria.variance));
  }

  /** Root mean square rate, rad/s. */
  get #rate(): number {
    const { motion } = this.#at(0);
    return Math.sqrt(motion.sumSquareRate / Math.max(1, motion.samples.length));
  }

  #sensible({ lag, scale }: Place): boolean {
    return Math.abs(lag) <= this.problem.recording.longestLag && scale > 1e-6 && scale < 1e6;
  }

  #same(a: Place, b: Place): boolean {
    return Math.abs(a.lag - b.lag) * this.#rate <= this.#reach && Math.abs(Math.log(a.scale / b.scale)) <= this.#reach;
  }

  #distinct(places: readonly Place[]): Place[] {
    const kept: Place[] = [];
    for (const place of places) if (!kept.some((other) => this.#same(place, other))) kept.push(place);
    return kept;
  }

  #at(lag: number, which: Which = 'all'): Samples {
    const stride = Math.max(1, Math.ceil(this.problem.recording.count / AT_MOST[which]));
    const key = `${lag}/${stride}`;
    let at = this.#samples.get(key);
    if (!at) {
      const { recording, numbers, width, sigma, criteria } = this.problem;
      const motion = recording.at(lag, stride);
      const used = motion.samples.length === recording.count ? numbers : numbersAt(numbers, width, motion.samples);
      at = {
        motion, numbers: used,
        fewer: motion.samples.length > FEWER ? this.#thinned(motion, used) : null,
        varied: variedSamples(motion),
        criteria: motion.interpolationVariance === 0 ? criteria : new Criteria(sigma, motion.interpolationVariance),
      };
      this.#samples.set(key, at);
    }
    return at;
  }

  #thinned(motion: Motion, numbers: Float64Array) {
    const stride = Math.ceil(motion.samples.length / FEWER);
    const places = Int32Array.from({ length: Math.ceil(motion.samples.length / stride) }, (_, k) => k * stride);
    return { motion: thinned(motion, places), numbers: numbersAt(numbers, this.problem.width, places) };
  }

  #scaledAt(decoder: Decoder, place: Place, which: Which): ScaledMoments | null {
    const { motion, numbers } = this.#chosen(place.lag, which);
    const up = this.#momentsAt(decoder, { ...place, scale: place.scale * Math.exp(SCALE_STEP) }, which);
    const down = this.#momentsAt(decoder, { ...place, scale: place.scale * Math.exp(-SCALE_STEP) }, which);
    if (!up || !down) return null;
    const key = `${this.#idOf(decoder.reader)}/${place.lag}/${place.scale}/${which}`;
    let turn = this.#turns.get(key);
    if (turn === undefined) this.#turns.set(key, turn = squaredTurn(decoder.reader, numbers, 1 / place.scale, motion.samples.length, SCALE_STEP));
    return { step: SCALE_STEP, up, down, squaredTurn: turn };
  }

  #momentsAt({ reader, transposed }: Decoder, { lag, scale }: Place, which: Which): Moments | null {
    const plain = this.#shared(reader, lag, scale, which, false);
    return transposed && plain ? this.#shared(reader, lag, scale, which, true) : plain;
  }

  #shared(reader: Reader, lag: number, scale: number, which: Which, transposed: boolean): Moments | null {
    const key = `${this.#idOf(reader)}/${lag}/${scale}/${which}/${transposed}`;
    let moments = this.#moments.get(key);
    if (moments === undefined) {
      const { motion, numbers } = this.#chosen(lag, which);
      moments = transposed ? transposedMoments(this.#shared(reader, lag, scale, which, false)!) : momentsOf(reader, numbers, 1 / scale, motion);
      this.#moments.set(key, moments);
    }
    return moments;
  }

  #chosen(lag: number, which: Which): { readonly motion: Motion; readonly numbers: Float64Array } {
    const at = this.#at(lag, which);
    return which === 'few' ? at.fewer! : at;
  }

  #readVaried(reader: Reader, numbers: Float64Array, varied: VariedSamples, factor: number): Float64Array | null {
    const m = new Float64Array(9 * varied.places.length);
    return reader.read(numbersAt(numbers, this.problem.width, varied.places), varied.places.length, factor, m) ? m : null;
  }
}
