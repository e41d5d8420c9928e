import { lagrange, lastNotAfter, STENCIL } from './interpolation.ts';

/** The reference, at the times of the samples less a lag, with sums that every hypothesis shares. */
export interface Motion {
  readonly lag: number;
  /** Which samples are used: those whose lagged time lies within the recording and in no gap of it. */
  readonly samples: Int32Array;
  /** C, nine a used sample, v_body = C v_ref in standard axes. */
  readonly matrices: Float64Array;
  /** dC/dt, or null where there are no times. */
  readonly derivatives: Float64Array | null;
  readonly sumMatrix: Float64Array;
  /** Σ ω in body axes and in reference axes, rad/s, and Σ |ω|². */
  readonly sumBodyRate: Float64Array;
  readonly sumReferenceRate: Float64Array;
  readonly sumSquareRate: number;
  /** Variance a component, rad², that interpolating adds. */
  readonly interpolationVariance: number;
}

/** Interpolation worse than this part of the steps themselves, and the attitudes jump. */
const JUMP = 0.02;
/** Samples that it takes to measure a quintic. */
const ENOUGH = 11;
/** A step longer than this many median ones is a gap: nothing is interpolated across it. */
const GAP = 3.5;

/** A recording's reference attitudes, and what they were between the samples. */
export class ReferenceRecording {
  readonly count: number;
  readonly matrices: Float64Array;
  times: Float64Array | null;
  /** Median step, s. */
  readonly step: number;
  readonly #middleVariance: number;
  readonly #nodes = new Float64Array(STENCIL);
  /** Nodes less the time that the weights are for, and how many. */
  readonly #places = new Float64Array(STENCIL);
  #weighed = 0;
  readonly #weights = { value: new Float64Array(STENCIL), derivative: new Float64Array(STENCIL) };

  /** @param times - s, or null; times that do not increase are taken for none. */
  constructor(matrices: Float64Array, times: Float64Array | null) {
    this.count = matrices.length / 9;
    this.matrices = matrices;
    this.times = times && this.count >= 2 && increasing(times) ? times : null;
    this.step = this.times ? medianStep(this.times) : 0;
    this.#middleVariance = this.times ? this.#measureInterpolation() : 0;
    // Attitudes that jump from sample to sample have no rate, and nothing lies between them.
    if (this.times && this.count >= ENOUGH && this.#middleVariance > JUMP ** 2 * this.#stepVariance()) this.times = null;
  }

  /** Longest lag that is considered, s, either way: two seconds, or half of a short recording. */
  get longestLag(): number {
    return this.times ? Math.min(2, (this.times[this.count - 1]! - this.times[0]!) / 2) : 0;
  }

  /** @param stride - takes every so-manieth sample only. */
  at(lag: number, stride = 1): Motion {
    const usable: number[] = [];
    const most = 9 * Math.ceil(this.count / stride);
    const matrices = new Float64Array(most);
    const derivatives = this.times ? new Float64Array(most) : null;
    let weight = 0;
    for (let i = 0; i < this.count; i += stride) {
      const to = 9 * usable.length;
      if (derivatives) {
        const fraction = this.#sample(this.times![i]! - lag, lag === 0, matrices, derivatives, to);
        if (fraction < 0) continue;
        weight += (4 * fraction * (1 - fraction)) ** 2;
      }
      if (lag === 0) for (let k = 0; k < 9; k++) matrices[to + k] = this.matrices[9 * i + k]!;
      usable.push(i);
    }
    return withSums(lag, Int32Array.from(usable), matrices.subarray(0, 9 * usable.length), derivatives?.subarray(0, 9 * usable.length) ?? null,
      lag === 0 || usable.length === 0 ? 0 : (this.#middleVariance * weight) / usable.length);
  }

  /** One matrix between the samples, for searches on a few of them; false outside the recording or in a gap. */
  matrixAt(t: number, into: Float64Array, at: number): boolean {
    return this.#sample(t, false, into, null, at) >= 0;
  }

  /** Writes C and dC/dt at t; returns where t lies within its step, 0 to 1, or −1 where it cannot be told. */
  #sample(t: number, onSample: boolean, matrices: Float64Array, derivatives: Float64Array | null, at: number): number {
    const times = this.times!;
    const last = this.count - 1;
    const slack = 1e-6 * this.step;
    if (t < times[0]! - slack || t > times[last]! + slack) return -1;
    const j = Math.max(0, Math.min(last - 1, lastNotAfter(times, t)));
    const nodes = Math.min(STENCIL, this.count);
    const from = Math.max(0, Math.min(this.count - nodes, j - 1));
    for (let k = 0; k < nodes; k++) this.#nodes[k] = times[from + k]!;
    const gap = this.#nodes[nodes - 1]! - this.#nodes[0]! > GAP * (nodes - 1) * this.step;
    if (gap && !onSample) return -1;
    const { value, derivative } = this.#weights;
    this.#weigh(nodes, t);
    const all = this.matrices;
    for (let k = 0; k < 9; k++) {
      let v = 0, d = 0;
      for (let n = 0, c = 9 * from + k; n < nodes; n++, c += 9) {
        v += value[n]! * all[c]!;
        d += derivative[n]! * all[c]!;
      }
      matrices[at + k] = v;
      // In a gap the rate is unknown; the sample then says nothing of a lag.
      if (derivatives) derivatives[at + k] = gap ? 0 : d;
    }
    return Math.max(0, Math.min(1, (t - times[j]!) / (times[j + 1]! - times[j]!)));
  }

  /** Weights for the nodes as they stand; those of the last time where the nodes lie about t as they did then. */
  #weigh(nodes: number, t: number): void {
    const slack = 1e-9 * this.step;
    let same = this.#weighed === nodes;
    for (let k = 0; same && k < nodes; k++) same = Math.abs(this.#nodes[k]! - t - this.#places[k]!) <= slack;
    if (same) return;
    for (let k = 0; k < nodes; k++) this.#places[k] = this.#nodes[k]! - t;
    lagrange(this.#nodes, nodes, t, this.#weights);
    this.#weighed = nodes;
  }

  /**
   * Variance a component in the middle of a step: each sample is interpolated from those one, three and five steps away,
   * at twice the spacing, and a quintic's error falls by 2⁶; doubled for safety. What the reference carries of noise adds to it.
   */
  #measureInterpolation(): number {
    if (this.count >= ENOUGH) return this.#measured([-5, -3, -1, 1, 3, 5], 64);
    // Too few to skip samples: what the neighbours on either side predict, a good deal too large.
    return this.count >= 3 ? this.#measured([-1, 1], 4) : JUMP * this.#stepVariance();
  }

  #measured(offsets: readonly number[], falls: number): number {
    const reach = offsets[offsets.length - 1]!;
    const stride = Math.max(1, Math.floor(this.count / 400));
    let sum = 0;
    let measured = 0;
    for (let i = reach; i + reach < this.count; i += stride) {
      offsets.forEach((offset, n) => { this.#nodes[n] = this.times![i + offset]!; });
      if (this.#nodes[offsets.length - 1]! - this.#nodes[0]! > GAP * 2 * reach * this.step) continue;
      this.#weigh(offsets.length, this.times![i]!);
      for (let k = 0; k < 9; k++) {
        const predicted = offsets.reduce((total, offset, n) => total + this.#weights.value[n]! * this.matrices[9 * (i + offset) + k]!, 0);
        sum += (predicted - this.matrices[9 * i + k]!) ** 2;
      }
      measured++;
    }
    return measured === 0 ? 0 : (4 * sum) / (2 * 3 * measured * falls * falls);
  }

  /** Mean square of a component of the rotation from sample to sample. */
  #stepVariance(): number {
    let sum = 0;
    for (let k = 9; k < this.matrices.length; k++) sum += (this.matrices[k]! - this.matrices[k - 9]!) ** 2;
    return sum / (2 * 3 * Math.max(1, this.count - 1));
  }
}

function increasing(times: Float64Array): boolean {
  for (let i = 1; i < times.length; i++) if (!(times[i]! > times[i - 1]!)) return false;
  return true;
}

function medianStep(times: Float64Array): number {
  const steps = new Float64Array(times.length - 1);
  for (let i = 0; i < steps.length; i++) steps[i] = times[i + 1]! - times[i]!;
  steps.sort();
  return steps[steps.length >> 1]!;
}

function withSums(lag: number, samples: Int32Array, matrices: Float64Array, derivatives: Float64Array | null, interpolationVariance: number): Motion {
  const sumMatrix = new Float64Array(9);
  const sumBodyRate = new Float64Array(3);
  const sumReferenceRate = new Float64Array(3);
  let sumSquareRate = 0;
  const c = new Float64Array(9);
  const omega = new Float64Array(3);
  for (let i = 0; i < samples.length; i++) {
    for (let k = 0; k < 9; k++) sumMatrix[k]! += c[k] = matrices[9 * i + k]!;
    if (!derivatives) continue;
    bodyRate(c, derivatives, 9 * i, omega);
    const [x, y, z] = omega as unknown as [number, number, number];
    // Ċ = −[ω×] C exactly: what interpolation adds beside a rotation would pass for a lag.
    for (let k = 0; k < 3; k++) {
      derivatives[9 * i + k] = z * c[3 + k]! - y * c[6 + k]!;
      derivatives[9 * i + 3 + k] = x * c[6 + k]! - z * c[k]!;
      derivatives[9 * i + 6 + k] = y * c[k]! - x * c[3 + k]!;
    }
    for (let k = 0; k < 3; k++) {
      sumBodyRate[k]! += omega[k]!;
      sumReferenceRate[k]! += c[k]! * x + c[3 + k]! * y + c[6 + k]! * z;
    }
    sumSquareRate += x * x + y * y + z * z;
  }
  return { lag, samples, matrices, derivatives, sumMatrix, sumBodyRate, sumReferenceRate, sumSquareRate, interpolationVariance };
}

/** The motion at some of its samples only. */
export function thinned({ lag, samples, matrices, derivatives, interpolationVariance }: Motion, places: Int32Array): Motion {
  const pick = (from: Float64Array): Float64Array => {
    const to = new Float64Array(9 * places.length);
    places.forEach((place, k) => to.set(from.subarray(9 * place, 9 * place + 9), 9 * k));
    return to;
  };
  return withSums(lag, places.map((place) => samples[place]!), pick(matrices), derivatives && pick(derivatives), interpolationVariance);
}

/** ω = vee(C Ċᵀ), by its antisymmetric part: [ω×] = C Ċᵀ. */
export function bodyRate(c: ArrayLike<number>, derivatives: Float64Array, at: number, omega: Float64Array): void {
  omega[0] = (product(c, 6, derivatives, at + 3) - product(c, 3, derivatives, at + 6)) / 2;
  omega[1] = (product(c, 0, derivatives, at + 6) - product(c, 6, derivatives, at)) / 2;
  omega[2] = (product(c, 3, derivatives, at) - product(c, 0, derivatives, at + 3)) / 2;
}

const product = (c: ArrayLike<number>, i: number, d: Float64Array, j: number): number => c[i]! * d[j]! + c[i + 1]! * d[j + 1]! + c[i + 2]! * d[j + 2]!;
