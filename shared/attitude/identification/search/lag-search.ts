import type { ReferenceRecording } from '../fit/motion.ts';
import type { Reader } from '../lattice/decoder.ts';
import { goldenMinimum } from './golden-minimum.ts';
import { chordMismatch, numbersAt, squaredChord, variedSamples } from './samples.ts';

/** Most places of the lag that are tried before refining. */
const GRID = 160;
/** Minima refined for one reader. */
const MINIMA = 2;

/**
 * Lags at which the chords between samples agree best, for each reader: chords know nothing of axis sets and constant
 * offsets, so the lag is found before either.
 */
export class LagSearch {
  readonly #recording: ReferenceRecording;
  readonly #numbers: Float64Array;
  readonly #width: number;
  readonly #places: Int32Array;
  readonly #pairs: Int32Array;
  readonly #grid: readonly number[];
  readonly #chordsOnGrid: readonly (Float64Array | null)[];

  constructor(recording: ReferenceRecording, numbers: Float64Array, width: number) {
    this.#recording = recording;
    this.#numbers = numbers;
    this.#width = width;
    // Samples whose lagged times all lie inside the recording, in the middle half of a short one.
    const times = recording.times!;
    const longest = Math.min(recording.longestLag, (times[times.length - 1]! - times[0]!) / 4);
    const inner = [...times.keys()].filter((i) => times[i]! - longest >= times[0]! && times[i]! + longest <= times[times.length - 1]!);
    const matrices = new Float64Array(9 * inner.length);
    inner.forEach((i, k) => matrices.set(recording.matrices.subarray(9 * i, 9 * i + 9), 9 * k));
    const varied = inner.length >= 2 ? variedSamples({ matrices }) : null;
    this.#places = varied ? varied.places.map((place) => inner[place]!) : new Int32Array(0);
    this.#pairs = varied ? varied.pairs : new Int32Array(0);
    this.#grid = Array.from({ length: GRID + 1 }, (_, k) => ((2 * k) / GRID - 1) * longest);
    this.#chordsOnGrid = this.#grid.map((lag) => this.#chordsAt(lag));
  }

  /** Best lags first. */
  lagsFor(reader: Reader): number[] {
    const m = new Float64Array(9 * this.#places.length);
    if (this.#places.length < 2 || !reader.read(numbersAt(this.#numbers, this.#width, this.#places), this.#places.length, 1, m)) return [];
    const cost = (chords: Float64Array | null): number => (chords ? chordMismatch(m, this.#pairs, chords).squares : Infinity);
    const onGrid = this.#chordsOnGrid.map(cost);
    const minima = onGrid.flatMap((value, k) => (value < Infinity && value <= (onGrid[k - 1] ?? Infinity) && value <= (onGrid[k + 1] ?? Infinity) ? [k] : []));
    return minima.sort((i, j) => onGrid[i]! - onGrid[j]!).slice(0, MINIMA).map((k) => {
      const low = this.#grid[Math.max(0, k - 1)]!;
      const high = this.#grid[Math.min(GRID, k + 1)]!;
      return goldenMinimum((lag) => cost(this.#chordsAt(lag)), low, high);
    });
  }

  #chordsAt(lag: number): Float64Array | null {
    const c = new Float64Array(9 * this.#places.length);
    for (let k = 0; k < this.#places.length; k++) {
      if (!this.#recording.matrixAt(this.#recording.times![this.#places[k]!]! - lag, c, 9 * k)) return null;
    }
    return Float64Array.from({ length: this.#pairs.length / 2 }, (_, p) => squaredChord(c, this.#pairs[2 * p]!, this.#pairs[2 * p + 1]!));
  }
}
