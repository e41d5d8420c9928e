import { AttitudeError } from '../../errors.ts';
import { lagrange } from '../fit/interpolation.ts';
import { bodyRate } from '../fit/motion.ts';

/** What a recording of attitudes says of its own rates. */
export interface MeasuredRates {
  /** Which samples have a rate: those with enough neighbours, in no gap. */
  readonly samples: Int32Array;
  /** C, nine a used sample, in standard axes. */
  readonly matrices: Float64Array;
  /** ω of the body relative to the reference, rad/s, three a used sample, in standard body axes. */
  readonly bodyRates: Float64Array;
  /** Variance a component, (rad/s)², of what the finite step leaves out. */
  readonly stepVariance: number;
  /** Variance of a rate for one of the attitude's noise, 1/s². */
  readonly noiseGain: number;
}

/** A stencil this many times as long as the median step allows lies across a gap. */
const GAP = 1.6;
export const FEWEST = 5;

/**
 * Angular velocity from attitudes and their times: the derivative of the polynomial through neighbouring samples, of the
 * sixth order (of the second where there are fewer than thirteen samples). What the finite step leaves out is measured
 * against the same at twice the step: it falls by 2⁶ (2²).
 *
 * @param matrices - C, v_body = C v_ref, nine a sample. @param times - s, increasing.
 * @throws AttitudeError `count-mismatch` for fewer than five samples, or where no five lie together.
 */
export function measuredRates(matrices: Float64Array, times: Float64Array): MeasuredRates {
  const count = times.length;
  if (count < FEWEST) throw new AttitudeError('count-mismatch', `${count} attitudes are too few to tell rates from; ${FEWEST} are the least.`);
  const reach = count >= 13 ? 3 : 1;
  const falls = 2 ** (2 * reach);
  const step = medianStep(times);
  const samples: number[] = [];
  const rates: number[] = [];
  let [squares, compared, gain] = [0, 0, 0];
  const [omega, coarse] = [new Float64Array(3), new Float64Array(3)];
  for (let i = reach; i + reach < count; i++) {
    if (times[i + reach]! - times[i - reach]! > GAP * 2 * reach * step) continue;
    gain += rateAt(matrices, times, i, reach, 1, omega);
    samples.push(i);
    rates.push(omega[0]!, omega[1]!, omega[2]!);
    if (i < 2 * reach || i + 2 * reach >= count || times[i + 2 * reach]! - times[i - 2 * reach]! > GAP * 4 * reach * step) continue;
    rateAt(matrices, times, i, reach, 2, coarse);
    for (let k = 0; k < 3; k++) squares += (coarse[k]! - omega[k]!) ** 2;
    compared++;
  }
  if (samples.length === 0) throw new AttitudeError('count-mismatch', 'No five attitudes lie together in time: there is no rate to compare with.');
  const used = Int32Array.from(samples);
  const c = new Float64Array(9 * used.length);
  used.forEach((sample, k) => c.set(matrices.subarray(9 * sample, 9 * sample + 9), 9 * k));
  return {
    samples: used, matrices: c, bodyRates: Float64Array.from(rates), noiseGain: gain / used.length,
    // Twice what is measured, since the step may leave out more than its leading term.
    stepVariance: compared === 0 ? 0 : (4 * squares) / (3 * compared * (falls - 1) ** 2),
  };
}

const nodes = new Float64Array(7);
const weights = { value: new Float64Array(7), derivative: new Float64Array(7) };
const derivative = new Float64Array(9);

/** Writes ω at sample i from its neighbours up to `reach` strides away; returns Σ w² of the weights. */
function rateAt(matrices: Float64Array, times: Float64Array, i: number, reach: number, stride: number, omega: Float64Array): number {
  const size = 2 * reach + 1;
  for (let n = 0; n < size; n++) nodes[n] = times[i + (n - reach) * stride]! - times[i]!;
  lagrange(nodes, size, 0, weights);
  let gain = 0;
  derivative.fill(0);
  for (let n = 0; n < size; n++) {
    const w = weights.derivative[n]!;
    gain += w * w;
    const at = 9 * (i + (n - reach) * stride);
    for (let k = 0; k < 9; k++) derivative[k]! += w * matrices[at + k]!;
  }
  bodyRate(matrices.subarray(9 * i, 9 * i + 9), derivative, 0, omega);
  return gain;
}

function medianStep(times: Float64Array): number {
  const steps = new Float64Array(times.length - 1);
  for (let i = 0; i < steps.length; i++) steps[i] = times[i + 1]! - times[i]!;
  steps.sort();
  return steps[steps.length >> 1]!;
}
