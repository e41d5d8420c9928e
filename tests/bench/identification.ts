/**
 * Times the identification of conventions: `npm run bench:identification`, and after the core in `npm run bench`.
 *
 * Rows are kinds of motion and counts of attitudes; the figures are milliseconds a call, the least and the median of the
 * rounds, with one mistake in the numbers and without times; then with times and a lag of 40 ms. Reading JSON is not counted.
 * Then what a verification of 1e5 attitudes costs against two conversions of them.
 */
import { createConverter } from '#shared/attitude/converter.ts';
import { verifyAttitudes } from '#shared/attitude/verification/verify-attitudes.ts';
import { identified, type Case } from '../shared/attitude/identification/support/hunt.ts';
import { STATED } from '../shared/attitude/identification/support/mistakes.ts';
import { motion, type MotionKind } from '../shared/attitude/identification/support/motions.ts';
import { Noise } from '../shared/attitude/identification/support/noise.ts';
import { record } from '../shared/attitude/identification/support/recording.ts';
import type { Statement } from '../shared/attitude/identification/support/statements.ts';

const DEG = Math.PI / 180;
const KINDS: readonly MotionKind[] = ['varied', 'flight', 'tumble', 'small', 'slantedAxis', 'singleAxis', 'steadyTurn', 'levelAllHeadings', 'sixFaces', 'oneAttitude', 'noRoll'];

function timed(work: () => void, rounds: number): { least: number; median: number } {
  const times = Array.from({ length: rounds }, () => {
    const started = performance.now();
    work();
    return performance.now() - started;
  }).sort((a, b) => a - b);
  return { least: times[0]!, median: times[rounds >> 1]! };
}

function caseOf(stated: Statement, kind: MotionKind, count: number, lag: number): Case {
  const { convention } = stated;
  const truth = convention.representation === 'euler' ? { ...convention, signs: [1, -1, 1] as const } : convention.representation === 'quaternion' ? { ...convention, scalar: 'last' as const } : convention;
  return { seed: 1, stated, truth: { convention: truth, ...(lag ? { lag } : {}) } as Statement, names: [], kind, count, rate: 50, sigma: 0.02 * DEG, statedSigma: 0.02 * DEG, withTimes: lag !== 0 };
}

// Once through everything, so that no row pays for compilation.
for (const kind of KINDS) for (const convention of STATED.slice(0, 4)) identified(caseOf({ convention }, kind, 500, 0), record({ convention }, motion(kind, new Noise(1)), 500, 50, 0.02 * DEG, new Noise(2)));

console.log('ms a call: least (median)   1,000 without times   1,000 with a lag   100,000 without times   100,000 with a lag');
for (const kind of KINDS) {
  for (const [name, convention] of [['euler', STATED[0]!], ['quaternion', STATED[2]!], ['dcm', STATED[3]!]] as const) {
    const cells = [[1000, 0], [1000, 0.04], [100_000, 0], [100_000, 0.04]].map(([count, lag]) => {
      if (lag !== 0 && kind === 'sixFaces') return '-'.padStart(18);
      const each = caseOf({ convention }, kind, count!, lag!);
      const recording = record(each.truth, motion(kind, new Noise(3)), count!, 50, each.sigma, new Noise(4));
      const { least, median } = timed(() => void identified(each, recording), count === 1000 ? 7 : 3);
      return `${least.toFixed(0)} (${median.toFixed(0)})`.padStart(18);
    });
    console.log(`${kind.padEnd(18)}${name.padEnd(12)}${cells.join('')}`);
  }
}

const noise = new Noise(5);
const angles = Float64Array.from({ length: 300_000 }, (_, k) => (k % 3 === 1 ? noise.between(-89, 89) : noise.between(-179, 179)));
const [euler, , quaternion] = STATED as [typeof STATED[0] & object, unknown, typeof STATED[0] & object];
const q = createConverter(euler, quaternion).convert(angles);
const conversions = timed(() => { createConverter(euler, quaternion).convert(angles); createConverter(quaternion, quaternion).convert(q); }, 7);
const verification = timed(() => void verifyAttitudes({ convention: euler, numbers: angles }, { convention: quaternion, numbers: q }, 1e-6), 7);
console.log(`verify of 100,000: ${verification.least.toFixed(0)} ms; the two conversions in it ${conversions.least.toFixed(0)} ms`);
