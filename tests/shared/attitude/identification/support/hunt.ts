import { identifyAttitudes } from '#shared/attitude/identification/identify-attitudes.ts';
import type { Identification } from '#shared/attitude/identification/identification.ts';
import { MISTAKES, STATED } from './mistakes.ts';
import { motion, MOTION_KINDS, type MotionKind } from './motions.ts';
import { Noise } from './noise.ts';
import { record, REFERENCE, type Recording } from './recording.ts';
import type { Statement } from './statements.ts';
import { verdictOf, type Verdict } from './verdict.ts';

const DEG = Math.PI / 180;

/** One recording with a truth and what was said of it, all from one seed. */
export interface Case {
  readonly seed: number;
  readonly stated: Statement;
  readonly truth: Statement;
  readonly names: readonly string[];
  readonly kind: MotionKind;
  readonly count: number;
  readonly rate: number;
  /** rad */
  readonly sigma: number;
  readonly statedSigma: number;
  readonly withTimes: boolean;
}

export interface Choices {
  readonly kinds: readonly MotionKind[];
  readonly counts: readonly number[];
  readonly mistakes: number;
  /** By how much the noise may be overstated. */
  readonly overstated: readonly number[];
  readonly sigmas: readonly number[];
}

export const EVERYTHING: Choices = { kinds: MOTION_KINDS, counts: [6, 8, 12, 20, 50, 120, 300, 2000], mistakes: 2, overstated: [1, 1, 2, 5], sigmas: [0, 0.01 * DEG, 0.05 * DEG, 0.2 * DEG] };

/** Two mistakes in a recording that shows them. */
export const VARIED_PAIRS: Choices = { ...EVERYTHING, kinds: ['varied'], counts: [2000], overstated: [1], sigmas: [0, 0.05 * DEG] };

export function caseOf(seed: number, choices: Choices): Case {
  const noise = new Noise(seed);
  const stated: Statement = { convention: noise.pick(STATED) };
  let truth = stated;
  const names: string[] = [];
  for (let tries = 0; names.length < choices.mistakes && tries < 200; tries++) {
    const mistake = noise.pick(MISTAKES);
    const next = names.includes(mistake.name) ? null : mistake.apply(truth);
    if (next) {
      truth = next;
      names.push(mistake.name);
    }
  }
  const sigma = noise.pick(choices.sigmas);
  // Faces are taken one after another, in no time: a lag would mix them.
  const kind = noise.pick(choices.kinds);
  return {
    seed, stated, names, sigma, kind,
    truth: kind === 'sixFaces' ? withoutLag(truth) : truth, count: noise.pick(choices.counts), rate: noise.pick([5, 10, 20, 50]),
    statedSigma: sigma * noise.pick(choices.overstated),
    withTimes: truth.lag !== undefined || noise.uniform() < 0.7,
  };
}

function withoutLag({ lag: _, ...rest }: Statement): Statement {
  return rest;
}

export function recordingOf({ seed, truth, kind, count, rate, sigma }: Case): Recording {
  const noise = new Noise(seed ^ 0x5bd1e995);
  return record(truth, motion(kind, noise, noise.between(0.3, 8) * DEG), count, rate, sigma, noise);
}

export function identified(each: Case, { reference, observed, times }: Recording): Identification {
  return identifyAttitudes({
    reference: { convention: REFERENCE, attitudes: reference },
    observed: { representation: each.stated.convention.representation, numbers: observed, stated: each.stated.convention },
    ...(each.withTimes ? { times } : {}),
    noise: { angle: each.statedSigma / DEG, unit: 'deg' },
  });
}

/**
 * How near an explanation must come to count as the truth. A parameter is only known as well as its effect on the data
 * shows against the stated noise, so the measure is the effect: offsets to six standard deviations of a mean, lags to the
 * larger of 4 ms, a tenth of the sample time and what the motion lets be seen.
 */
export function toleranceFor({ statedSigma, count, rate }: Case, { reference }: Recording): { angle: number; lag: number } {
  const sigma = Math.max(statedSigma, 1e-6);
  let square = 0;
  for (let i = 1; i < count; i++) for (let k = 0; k < 9; k++) square += (reference[9 * i + k]! - reference[9 * i - 9 + k]!) ** 2 / 2;
  const rms = Math.sqrt(square / Math.max(1, count - 1)) * rate;
  return { angle: Math.max(0.02 * DEG, (8 * sigma) / Math.sqrt(count)), lag: Math.max(0.004, 0.1 / rate, (8 * sigma) / (Math.sqrt(count) * Math.max(rms, 1e-9))) };
}

export function judged(each: Case): { readonly verdict: Verdict; readonly identification: Identification; readonly milliseconds: number } {
  const recording = recordingOf(each);
  const started = performance.now();
  const identification = identified(each, recording);
  return { verdict: verdictOf(each.truth, identification, toleranceFor(each, recording), recording.reference), identification, milliseconds: performance.now() - started };
}
