import type { Convention, DcmConvention, EulerConvention } from '../../convention.ts';
import { createConverter } from '../../converter.ts';
import { readingOf } from '../../reading.ts';
import { frameRotation, multiply } from '../fit/small-matrix.ts';
import type { DiscriminatingAttitude } from '../identification.ts';
import { Predictor } from './predicted-numbers.ts';
import type { Choice } from './statement-choice.ts';

/** The convention of the angles below: whole degrees come out as exact as the reference's convention allows. */
export const benchAngles = (reference: string): EulerConvention => ({ representation: 'euler', reference, body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', order: [1, 2, 3], signs: [1, 1, 1], unit: 'deg', range: 'signed' });

/** Heading, pitch and bank, degrees, that a tilting table on a surveyed bench reaches; plain ones first. */
const BENCH: readonly (readonly [number, number, number])[] = [
  [0, 0, 0], [30, 0, 0], [60, 0, 0], [120, 0, 0], [200, 0, 0], [0, 20, 0], [0, 0, 20], [0, -30, 0], [0, 0, -30],
  [30, 20, 0], [30, 0, 20], [0, 20, 30], [0, 30, -20], [120, -20, 0], [250, 0, 40],
  [30, 10, 20], [60, 20, -30], [120, -20, 40], [200, 15, 35], [250, 30, -25], [300, -35, 15], [340, 25, 50],
];
const PROPOSED = 3;
/** Numbers closer than this, rad or what corresponds to it, are one answer on a bench. */
const BENCH_ACCURACY = 0.01;
const DEG = Math.PI / 180;

/**
 * Up to three attitudes to put the box in, each chosen for how many pairs of explanations it tells apart that the ones
 * before it did not; the plainer of two that do as well.
 *
 * @param sigma - noise of one reading, rad.
 */
export function discriminatingAttitudes(choices: readonly { readonly choice: Choice; readonly scale: number }[], reference: Convention, standard: DcmConvention, sigma: number): DiscriminatingAttitude[] {
  if (choices.length < 2) return [];
  const predictors = choices.map(({ choice, scale }) => new Predictor(choice, scale, standard));
  const tolerances = choices.map(({ choice: { convention } }) => Math.max(6 * sigma, BENCH_ACCURACY) * ('unit' in convention && convention.unit === 'deg' ? 1 / DEG : 1));
  const periods = choices.map(({ choice: { convention } }) => (convention.representation !== 'euler' ? Infinity : convention.unit === 'deg' ? 360 : 2 * Math.PI));
  const evenSign = choices.map(({ choice: { convention, statement } }) => convention.representation === 'quaternion' && !statement.numbersAre);
  const candidates = BENCH.map((angles) => {
    const c = multiply(multiply(frameRotation(angles[2] * DEG, 0, 0), frameRotation(0, angles[1] * DEG, 0)), frameRotation(0, 0, angles[0] * DEG));
    return { angles, groups: grouped(predictors.map((predictor) => predictor.listed(c)), tolerances, periods, evenSign) };
  });

  const fromAngles = createConverter(benchAngles(standard.reference), reference, { warnWithinDeg: 0 });
  let parts: readonly number[][] = [choices.map((_, k) => k)];
  const proposed: DiscriminatingAttitude[] = [];
  while (proposed.length < PROPOSED) {
    const gains = candidates.map(({ groups }) => pairs(parts) - pairs(refined(parts, groups.of)));
    const best = gains.reduce((most, gain, k) => (gain > gains[most]! ? k : most), 0);
    if (gains[best]! <= 0) break;
    const { angles, groups } = candidates[best]!;
    parts = refined(parts, groups.of);
    const attitude = [...fromAngles.convert(Float64Array.from(angles))];
    const predictions = groups.numbers.map((numbers, group) => ({ numbers, explanations: groups.of.flatMap((each, k) => (each === group ? [k] : [])) }));
    proposed.push({ attitude, reading: readingOf(reference, attitude), separates: { answers: predictions.length, explanations: choices.length, predictions: predictions.sort((x, y) => x.explanations[0]! - y.explanations[0]!) } });
  }
  return proposed;
}

interface Groups {
  /** Group of each explanation. */
  readonly of: readonly number[];
  readonly numbers: readonly (readonly number[])[];
}

/** Explanations by what they predict; one that predicts nothing here goes with the first. */
function grouped(predicted: readonly (readonly number[] | null)[], tolerances: readonly number[], periods: readonly number[], evenSign: readonly boolean[]): Groups {
  const heads: number[] = [];
  const of = predicted.map((numbers, k) => {
    if (!numbers) return 0;
    const group = heads.findIndex((head) => alike(numbers, predicted[head]!, Math.max(tolerances[k]!, tolerances[head]!), Math.min(periods[k]!, periods[head]!), evenSign[k]! && evenSign[head]!));
    return group >= 0 ? group : heads.push(k) - 1;
  });
  return { of, numbers: heads.map((head) => predicted[head]!) };
}

function alike(a: readonly number[], b: readonly number[], tolerance: number, period: number, evenSign: boolean): boolean {
  const near = (sign: number): boolean => a.every((x, k) => {
    const difference = Math.abs(x - sign * b[k]!);
    return difference <= tolerance || Math.abs(difference - period) <= tolerance;
  });
  return near(1) || (evenSign && near(-1));
}

const pairs = (parts: readonly number[][]): number => parts.reduce((sum, part) => sum + (part.length * (part.length - 1)) / 2, 0);

function refined(parts: readonly number[][], groupOf: readonly number[]): number[][] {
  return parts.flatMap((part) => {
    const split = new Map<number, number[]>();
    for (const k of part) split.set(groupOf[k]!, [...(split.get(groupOf[k]!) ?? []), k]);
    return [...split.values()];
  });
}
