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

export type Verdict = 'right' | 'ambiguous with the truth' | 'ambiguous without the truth' | 'none' | 'wrong unique';

export function verdictOf(truth: Statement, { outcome, explanations }: Identification, tolerance: Tolerance): Verdict {
  if (outcome === 'none') return 'none';
  const there = explanations.some((explanation) => isTruth(truth, explanation, tolerance));
  if (outcome === 'unique') return there ? 'right' : 'wrong unique';
  return there ? 'ambiguous with the truth' : 'ambiguous without the truth';
}
