import { describe, expect, it } from 'vitest';
import { identified, toleranceFor, type Case } from './support/hunt.ts';
import { MISTAKES, STATED } from './support/mistakes.ts';
import { motion } from './support/motions.ts';
import { Noise } from './support/noise.ts';
import { record } from './support/recording.ts';
import { verdictOf } from './support/verdict.ts';

const DEG = Math.PI / 180;

function caseOf(stated: Case['stated'], mistake: (typeof MISTAKES)[number], sigma: number): Case | null {
  const truth = mistake.apply(stated);
  return truth && { seed: 7, stated, truth, names: [mistake.name], kind: 'varied', count: 2000, rate: 20, sigma, statedSigma: sigma, withTimes: true };
}

const withoutMistake = { name: 'no mistake', apply: (statement: Case['stated']) => statement };

/**
 * Each mistake of an interface alone, in a varied recording of 2,000 attitudes: exactly its class of equal statements is
 * named, and nothing else remains. Judged by an independent statement of the conventions in `support/statements.ts`.
 */
describe.each([['without noise', 0], ['with 0.05° of noise', 0.05 * DEG]])('identifyAttitudes, one mistake, %s', (_, sigma) => {
  for (const convention of STATED) {
    const cases = [withoutMistake, ...MISTAKES].flatMap((mistake) => caseOf({ convention }, mistake, sigma) ?? []);
    it(`of ${cases.length} where ${convention.representation}${'sequence' in convention ? ` ${convention.sequence}` : ''} is stated`, () => {
      const wrong = cases.flatMap((each) => {
        const noise = new Noise(11);
        const recording = record(each.truth, motion('varied', noise), each.count, each.rate, sigma, noise);
        const verdict = verdictOf(each.truth, identified(each, recording), toleranceFor(each, recording), recording.reference);
        return verdict === 'right' ? [] : [`${each.names.join()}: ${verdict}`];
      });
      expect(wrong).toEqual([]);
    }, 60_000);
  }
});
