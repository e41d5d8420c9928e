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

export const isTruth = (truth: Statement, explanation: Explanation, tolerance: Tolerance): boolean =>
  distance(truth, statementOf(explanation)) <= tolerance.angle && Math.abs((truth.lag ?? 0) - (explanation.timeLag?.seconds ?? 0)) <= tolerance.lag;

const discrete = ({ convention, numbersAre }: Statement): Statement => ({ convention, ...(numbersAre ? { numbersAre } : {}) });

/** The same convention, with an offset or a lag that the data let be shared otherwise than it was. */
const isTruthInPart = (truth: Statement, explanation: Explanation): boolean => {
  const claimed = statementOf(explanation);
  const parameters = ({ offsets, lag }: Statement): boolean => (offsets?.length ?? 0) > 0 || lag !== undefined;
  return parameters(truth) && parameters(claimed) && distance(discrete(truth), discrete(claimed)) < 1e-6;
};

export type Verdict = 'right' | 'ambiguous with the truth' | 'ambiguous without the truth' | 'none' | 'wrong unique';

/** Where the data do not tell parameters apart, an ambiguous answer holds the truth if it holds its convention with any. */
export function verdictOf(truth: Statement, { outcome, explanations }: Identification, tolerance: Tolerance): Verdict {
  if (outcome === 'none') return 'none';
  const there = explanations.some((explanation) => isTruth(truth, explanation, tolerance));
  if (outcome === 'unique') return there ? 'right' : 'wrong unique';
  return there || explanations.some((explanation) => isTruthInPart(truth, explanation)) ? 'ambiguous with the truth' : 'ambiguous without the truth';
}
