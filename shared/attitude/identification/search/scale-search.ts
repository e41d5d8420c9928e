import type { Motion } from '../fit/motion.ts';
import type { Reader } from '../lattice/decoder.ts';
import { goldenMinimum } from './golden-minimum.ts';
import { chordMismatch, numbersAt, variedSamples, type VariedSamples } from './samples.ts';

/** Scales near which an error of a few per cent, up to a fifth, is looked for. */
const CENTRES = [1, 0.5, 2];
const SPREAD = 0.22;
const STEPS = 16;
/**
 * Scales that come from units and from numbers sent as integers (common practice): gradians, thousandths, minutes and
 * seconds of arc, half and whole turns, sixteen bits a turn, tenths, hundredths.
 */
const KNOWN = [10 / 9, 1000, 60, 3600, 1 / 180, 1 / 360, 65536 / 360, 10, 100];

/** Scales of the numbers at which the chords between samples agree best, for each reader that a scale means anything to. */
export class ScaleSearch {
  readonly #numbers: Float64Array;
  readonly #varied: VariedSamples;

  constructor(motion: Motion, numbers: Float64Array, width: number) {
    this.#varied = variedSamples(motion);
    this.#numbers = numbersAt(numbers, width, this.#varied.places);
  }

  /** Best scales first. */
  scalesFor(reader: Reader): number[] {
    if (!reader.scalable) return [];
    const { places, pairs, chords } = this.#varied;
    const m = new Float64Array(9 * places.length);
    const cost = (logarithm: number): number => (reader.read(this.#numbers, places.length, Math.exp(-logarithm), m) ? chordMismatch(m, pairs, chords).squares : Infinity);
    const step = SPREAD / STEPS;
    const around = [
      ...CENTRES.flatMap((centre) => Array.from({ length: 2 * STEPS + 1 }, (_, k) => Math.log(centre) + (k - STEPS) * step)),
      ...KNOWN.map(Math.log),
    ];
    const costs = around.map(cost);
    const best = [...around.keys()].filter((k) => costs[k]! < Infinity).sort((i, j) => costs[i]! - costs[j]!).slice(0, 2);
    return best.map((k) => Math.exp(goldenMinimum(cost, around[k]! - step, around[k]! + step)));
  }
}
