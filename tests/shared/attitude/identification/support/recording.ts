import { frameRotation, multiply, type Matrix } from './matrices.ts';
import type { Motion } from './motions.ts';
import type { Noise } from './noise.ts';
import { listed, type Statement } from './statements.ts';

export interface Recording {
  readonly times: Float64Array;
  /** Reference-to-body, row by row, NED and FRD. */
  readonly reference: Float64Array;
  readonly observed: Float64Array;
}

export const REFERENCE = { representation: 'dcm', reference: 'NED', body: 'FRD', maps: 'reference-to-body', layout: 'row-major' } as const;

/** @param sigma - rad, of each component of the error rotation vector. */
export function record(truth: Statement, motion: Motion, count: number, rate: number, sigma: number, noise: Noise): Recording {
  const times = Float64Array.from({ length: count }, (_, i) => i / rate);
  const reference = new Float64Array(9 * count);
  const rows: number[][] = [];
  times.forEach((t, i) => {
    reference.set(motion(t).flat(), 9 * i);
    const c: Matrix = motion(t - (truth.lag ?? 0));
    const error = [noise.normal(), noise.normal(), noise.normal()].map((component) => component * sigma);
    rows.push(listed(truth, sigma > 0 ? multiply(frameRotation(error, Math.hypot(...error)), c) : c));
  });
  return { times, reference, observed: Float64Array.from(rows.flat()) };
}
