import type { Convention, DcmConvention } from '../../convention.ts';
import { createConverter } from '../../converter.ts';
import { readingOf } from '../../reading.ts';
import { benchAngles } from '../explain/discriminating.ts';
import { frameRotation, multiply } from '../fit/small-matrix.ts';
import type { DiscriminatingAttitude } from '../identification.ts';
import { expectedNumbers, type RateHypothesis } from './hypotheses.ts';


const DEG = Math.PI / 180;
/** Heading, pitch and bank, degrees, of a turntable with a tilting bed; plain ones first. */
const BENCH: readonly (readonly [number, number, number])[] = [[0, 0, 0], [30, 20, 0], [30, 0, 30], [30, 20, 40], [120, -20, 40], [250, 30, -25]];
const AXES = ['forward', 'right', 'down'];
/** rad/s; a rate table turns so fast at ease. */
const RATE = 10 * DEG;
const PROPOSED = 3;

/** Up to three attitudes to hold, each with a body axis to turn about, that split what remains best. */
export function discriminatingRates(hypotheses: readonly RateHypothesis[], reference: Convention, standard: DcmConvention, sigma: number): DiscriminatingAttitude[] {
  const fromAngles = createConverter(benchAngles(standard.reference), reference, { warnWithinDeg: 0 });
  const tolerance = Math.max(6 * sigma, 0.02 * RATE);
  const candidates = BENCH.flatMap((angles) => AXES.map((_, axis) => {
    const c = multiply(multiply(frameRotation(angles[2] * DEG, 0, 0), frameRotation(0, angles[1] * DEG, 0)), frameRotation(0, 0, angles[0] * DEG));
    const omega = [0, 1, 2].map((k) => (k === axis ? RATE : 0));
    return { angles, axis, predicted: hypotheses.map((hypothesis) => expectedNumbers(hypothesis, { c, omega })) };
  }));
  let parts: readonly number[][] = [hypotheses.map((_, k) => k)];
  const proposed: DiscriminatingAttitude[] = [];
  while (proposed.length < PROPOSED) {
    const split = candidates.map(({ predicted }) => parts.flatMap((part) => grouped(part, predicted, hypotheses, tolerance)));
    const best = split.reduce((least, each, k) => (pairs(each) < pairs(split[least]!) ? k : least), 0);
    if (pairs(split[best]!) >= pairs(parts)) break;
    parts = split[best]!;
    const { angles, axis, predicted } = candidates[best]!;
    const groups = grouped(hypotheses.map((_, k) => k), predicted, hypotheses, tolerance);
    const attitude = [...fromAngles.convert(Float64Array.from(angles))];
    proposed.push({
      attitude, reading: `${readingOf(reference, attitude)} Turn at 10°/s about the body's ${AXES[axis]} axis.`,
      separates: { answers: groups.length, explanations: hypotheses.length, predictions: groups.map((explanations) => ({ numbers: predicted[explanations[0]!] ?? [], explanations })) },
    });
  }
  return proposed;
}

const pairs = (parts: readonly number[][]): number => parts.reduce((sum, part) => sum + part.length * (part.length - 1), 0);

/** Explanations that predict the same, as far as a bench can tell. */
function grouped(part: readonly number[], predicted: readonly (readonly number[] | null)[], hypotheses: readonly RateHypothesis[], tolerance: number): number[][] {
  const groups: number[][] = [];
  for (const k of part) {
    const slack = tolerance * ('degrees' in hypotheses[k]! && hypotheses[k].degrees ? 1 / DEG : 1);
    const group = groups.find(([head]) => alike(predicted[k] ?? null, predicted[head!] ?? null, slack));
    if (group) group.push(k);
    else groups.push([k]);
  }
  return groups;
}

const alike = (a: readonly number[] | null, b: readonly number[] | null, slack: number): boolean =>
  a === null || b === null ? a === b : a.every((number, j) => Math.abs(number - b[j]!) <= slack) || (a.length === 4 && a.every((number, j) => Math.abs(number + b[j]!) <= slack));
