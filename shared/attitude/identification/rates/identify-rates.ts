import { isNamedFrame } from '../../axes.ts';
import type { AngleUnit, Convention, DcmConvention } from '../../convention.ts';
import { createConverter } from '../../converter.ts';
import { AttitudeError } from '../../errors.ts';
import { type RateUnit } from '../../rates/rate.ts';
import { refuseOutOfRange } from '../../refuse-out-of-range.ts';
import { discriminatingRates } from './discriminating-rates.ts';
import { errorAt } from './error-at.ts';
import type { RateHypothesis } from './hypotheses.ts';
import { measuredRates } from './measured-rates.ts';
import type { RateExplanation, RateIdentification, RateStatement } from './rate-identification.ts';
import { sampleAt, searchRates, type RateFit, type RateProblem } from './rate-search.ts';
import { statementsOf, type RateChoice } from './rate-statements.ts';
import { signatureOf } from './signature.ts';
import { unobservableRates } from './unobservable-rates.ts';

export interface RateIdentificationInput {
  /** Attitudes that are trusted, flat, as their convention lists them; their times, s, increasing. */
  readonly reference: { readonly convention: Convention; readonly attitudes: Float64Array };
  readonly times: Float64Array;
  /** The numbers of a box, flat: 3, 4 or 9 a sample, with what it is said to list. */
  readonly observed: { readonly rates: Float64Array; readonly stated: RateStatement };
  /** Standard deviation of a component: of the reference attitudes' error, and of the observed angular velocity. 0 means exact. */
  readonly noise: { readonly angle: number; readonly unit: AngleUnit; readonly rate: number; readonly rateUnit: RateUnit };
}

const DEG = Math.PI / 180;
const LISTED = 100;
const EQUIVALENTS = 12;

/** Hypotheses that are the same numbers, with their ways to be stated, fewest edits first. */
export interface RateClass {
  readonly fit: RateFit;
  readonly choices: readonly [RateChoice, ...RateChoice[]];
}

/**
 * Finds every kind of rate that the numbers of a box may be: the angular velocity in any body or reference axes, rates of
 * any Euler angles in any listing order and signs, in degrees or radians a second; derivatives of a quaternion or a matrix
 * of any convention. The rates they are compared with are those of the reference attitudes, by their times.
 *
 * Offsets, lags and scales of rates are not looked for.
 *
 * @throws AttitudeError `count-mismatch`, `not-finite`, `out-of-range`, and as createConverter does for the reference.
 */
export function identifyRates({ reference, times, observed, noise }: RateIdentificationInput): RateIdentification {
  const { convention } = reference;
  const standard: DcmConvention = { representation: 'dcm', reference: isNamedFrame(convention.reference) ? convention.reference : 'NED', body: 'FRD', maps: 'reference-to-body', layout: 'row-major' };
  const matrices = createConverter(convention, standard).convert(reference.attitudes);
  const count = matrices.length / 9;
  const { width, numbers } = numbersOf(observed.rates, count);
  const measured = measuredRates(matrices, times);
  const used = new Float64Array(width * measured.samples.length);
  measured.samples.forEach((sample, k) => used.set(numbers.subarray(width * sample, width * (sample + 1)), width * k));
  const problem: RateProblem = {
    measured, observed: used, width,
    sigma: noise.rate * (noise.rateUnit === 'deg/s' ? DEG : 1),
    attitudeSigma: noise.angle * (noise.unit === 'deg' ? DEG : 1),
  };
  const classes = classesOf(searchRates(problem), observed.stated);
  const listed = classes.slice(0, LISTED);
  return {
    outcome: classes.length === 0 ? 'none' : classes.length === 1 ? 'unique' : 'ambiguous',
    explanations: listed.map((each) => explanationOf(each, problem, noise.rateUnit)),
    remaining: classes.length,
    unobservable: unobservableRates(classes, measured, problem.sigma),
    discriminating: classes.length < 2 ? [] : discriminatingRates(listed.map(({ fit }) => fit.hypothesis), convention, standard, problem.sigma),
  };
}

function numbersOf(numbers: Float64Array, count: number): { readonly width: 3 | 4 | 9; readonly numbers: Float64Array } {
  const width = numbers.length / count;
  if (count === 0 || (width !== 3 && width !== 4 && width !== 9)) throw new AttitudeError('count-mismatch', `${numbers.length} numbers are not 3, 4 or 9 for each of ${count} attitudes.`);
  refuseOutOfRange(numbers, width, 'Observed rate');
  return { width, numbers };
}

/** Fits of the same numbers together, fewest edits first. */
function classesOf(fits: readonly RateFit[], stated: RateStatement): RateClass[] {
  const bySignature = new Map<string, RateFit[]>();
  for (const fit of fits) {
    const signature = signatureOf(fit.hypothesis);
    const same = bySignature.get(signature);
    if (same) same.push(fit);
    else bySignature.set(signature, [fit]);
  }
  return [...bySignature.values()].flatMap((same): RateClass[] => {
    const [first, ...rest] = same.flatMap(({ hypothesis }) => statementsOf(hypothesis, stated)).sort((a, b) => a.cost - b.cost);
    return first ? [{ fit: same[0]!, choices: [first, ...rest] }] : [];
  }).sort((a, b) => a.choices[0].cost - b.choices[0].cost);
}

function explanationOf({ fit, choices: [best, ...others] }: RateClass, problem: RateProblem, unit: RateUnit): RateExplanation {
  const perUnit = unit === 'deg/s' ? DEG : 1;
  return {
    ...best.statement, edits: best.edits,
    residual: { rms: Math.sqrt(fit.squaredError / fit.count) / perUnit, max: largestError(fit.hypothesis, problem) / perUnit, unit },
    sameNumbersAs: others.slice(0, EQUIVALENTS).map(({ statement }) => statement),
  };
}

/** Of |r| as an angular velocity. */
function largestError(hypothesis: RateHypothesis, { measured, observed, width }: RateProblem): number {
  let largest = 0;
  for (let k = 0; k < measured.samples.length; k++) largest = Math.max(largest, errorAt(hypothesis, sampleAt(measured, k), observed.subarray(width * k, width * (k + 1))));
  return largest;
}
