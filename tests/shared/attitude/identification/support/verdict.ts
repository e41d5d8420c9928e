import type { Explanation, Identification } from '#shared/attitude/identification/identification.ts';
import { distance } from './judge.ts';
import type { Statement } from './statements.ts';

const DEG = Math.PI / 180;

export const statementOf = ({ convention, numbersAre, constantOffset, timeLag, scale }: Explanation): Statement => ({
  convention,
  ...(numbersAre ? { numbersAre } : {}),
  ...(constantOffset ? { offsets: constantOffset.map(({ side, axis, angle, unit }) => ({ side, axis, angle: unit === 'deg' ? angle * DEG : angle })) } : {}),
  ...(timeLag ? { lag: timeLag.seconds } : {}),
  ...(scale ? { scale } : {}),
});

export interface Tolerance {
  /** rad */
  readonly angle: number;
  /** s */
  readonly lag: number;
}

const discrete = ({ convention, numbersAre, scale }: Statement): Statement => ({ convention, ...(numbersAre ? { numbersAre } : {}), ...(scale ? { scale } : {}) });
const sameConvention = (truth: Statement, claimed: Statement): boolean => distance(discrete(truth), discrete(claimed)) < 1e-6;

/**
 * Whether an explanation is the truth: the same numbers for every attitude; or the same convention with the same kinds of
 * parameters, which the attitudes of the recording cannot tell from the true ones, though others might.
 */
export function isTruth(truth: Statement, explanation: Explanation, tolerance: Tolerance, reference: Float64Array): boolean {
  const claimed = statementOf(explanation);
  if (Math.abs((truth.lag ?? 0) - (claimed.lag ?? 0)) > tolerance.lag) return false;
  if (distance(truth, claimed) <= tolerance.angle) return true;
  return sidesOf(truth) === sidesOf(claimed) && sameConvention(truth, claimed) && distance(truth, claimed, attitudesOf(reference)) <= tolerance.angle;
}

const sidesOf = ({ offsets = [] }: Statement): string => offsets.map(({ side }) => side).sort().join();

/** At most fifty of the recording's attitudes. */
function attitudesOf(reference: Float64Array): number[][][] {
  const count = reference.length / 9;
  const stride = Math.max(1, Math.floor(count / 50));
  return Array.from({ length: Math.ceil(count / stride) }, (_, k) => [0, 3, 6].map((row) => [...reference.subarray(9 * k * stride + row, 9 * k * stride + row + 3)]));
}

/** The same convention, with an offset or a lag that the data let be shared otherwise than it was. */
const isTruthInPart = (truth: Statement, explanation: Explanation): boolean => {
  const claimed = statementOf(explanation);
  const parameters = ({ offsets, lag }: Statement): boolean => (offsets?.length ?? 0) > 0 || lag !== undefined;
  return parameters(truth) && parameters(claimed) && sameConvention(truth, claimed);
};

export type Verdict = 'right' | 'ambiguous with the truth' | 'ambiguous, the list cut short' | 'ambiguous without the truth' | 'none' | 'wrong unique';

/** Where the data do not tell parameters apart, an ambiguous answer holds the truth if it holds its convention with any. */
export function verdictOf(truth: Statement, { outcome, explanations, remaining }: Identification, tolerance: Tolerance, reference: Float64Array): Verdict {
  if (outcome === 'none') return 'none';
  const there = explanations.some((explanation) => isTruth(truth, explanation, tolerance, reference));
  if (outcome === 'unique') return there ? 'right' : 'wrong unique';
  if (there || explanations.some((explanation) => isTruthInPart(truth, explanation))) return 'ambiguous with the truth';
  return remaining > explanations.length ? 'ambiguous, the list cut short' : 'ambiguous without the truth';
}
