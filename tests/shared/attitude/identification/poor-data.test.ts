import { describe, expect, it } from 'vitest';
import { caseOf, EVERYTHING, identified, judged, recordingOf, type Case } from './support/hunt.ts';
import { STATED } from './support/mistakes.ts';
import type { MotionKind } from './support/motions.ts';
import type { Statement } from './support/statements.ts';
import { statementOf } from './support/verdict.ts';
import { distance } from './support/judge.ts';

const DEG = Math.PI / 180;
const [EULER, , QUATERNION, MATRIX] = STATED;

const said = (change: Partial<Case> & { readonly truth: Statement }) => {
  const each: Case = { seed: 3, stated: { convention: change.truth.convention }, names: [], kind: 'varied', count: 300, rate: 10, sigma: 0.05 * DEG, statedSigma: 0.05 * DEG, withTimes: true, ...change };
  return identified(each, recordingOf(each));
};

describe('identifyAttitudes on data that do not tell', () => {
  it('never names one explanation where another is as good: 150 recordings of every kind, two mistakes each', () => {
    const wrong: string[] = [];
    const certain: string[] = [];
    for (let seed = 1; seed <= 150; seed++) {
      const each = caseOf(seed, EVERYTHING);
      const { verdict, identification: { outcome } } = judged(each);
      if (verdict === 'wrong unique' || verdict === 'none' || verdict === 'ambiguous without the truth') wrong.push(`seed ${seed}, ${each.kind}, ${each.count} samples, ${each.names.join(' and ')}: ${verdict}`);
      if (outcome === 'unique' && ['levelOneHeading', 'singleAxis', 'sixFaces'].includes(each.kind)) certain.push(`seed ${seed}: ${each.kind}`);
    }
    expect(wrong).toEqual([]);
    expect(certain).toEqual([]);
  }, 60_000);

  it('one attitude without symmetry fixes the convention, but nothing that has parameters', () => {
    const { outcome, explanations } = said({ truth: { convention: EULER! }, kind: 'oneAttitude', sigma: 0, statedSigma: 0 });
    expect(outcome).toBe('unique');
    expect(explanations[0]!.edits).toEqual([]);
    const offset = said({ truth: { convention: EULER!, offsets: [{ side: 'reference', axis: [0, 0, 1], angle: 5 * DEG }] }, kind: 'oneAttitude' });
    expect(offset.outcome).toBe('ambiguous');
    expect(offset.unobservable.join('\n')).toMatch(/Only one attitude is in the data/);
  });

  const poor: readonly [MotionKind, RegExp][] = [
    ['levelOneHeading', /Only one attitude is in the data/],
    ['levelAllHeadings', /All motion is about the body's down axis/],
    ['singleAxis', /All motion is about the body's (forward|right|down) axis/],
    ['sixFaces', /Every attitude is right angles away/],
    ['noRoll', /Number 3 of each attitude is zero throughout, within the noise/],
    ['noPitch', /Number 2 of each attitude is zero throughout, within the noise/],
  ];
  it.each(poor)('%s: ambiguous, with the reason', (kind, reason) => {
    const { outcome, unobservable, remaining } = said({ truth: { convention: EULER! }, kind });
    expect(outcome).toBe('ambiguous');
    expect(remaining).toBeGreaterThan(1);
    expect(unobservable.join('\n')).toMatch(reason);
  });

  it('a steady turn: a lag, a mounting offset and a north offset are one and the same, and it says so', () => {
    const { outcome, explanations, unobservable } = said({ truth: { convention: QUATERNION!, lag: 0.4 }, kind: 'steadyTurn' });
    expect(outcome).toBe('ambiguous');
    expect(explanations.some(({ timeLag }) => timeLag !== undefined)).toBe(true);
    expect(explanations.some(({ constantOffset }) => constantOffset?.some(({ side }) => side === 'reference'))).toBe(true);
    expect(explanations.some(({ constantOffset }) => constantOffset?.some(({ side }) => side === 'body'))).toBe(true);
    expect(unobservable.join('\n')).toMatch(/cannot be told apart/);
  });

  it('fewer than six samples: never one explanation with an offset, a lag or a scale', () => {
    for (const count of [1, 2, 3, 4, 5]) {
      const { outcome, explanations } = said({ truth: { convention: MATRIX!, offsets: [{ side: 'reference', axis: [0, 0, 1], angle: 5 * DEG }] }, kind: 'tumble', count });
      expect(outcome).toBe('ambiguous');
      expect(explanations.length).toBeGreaterThan(0);
    }
  });

  it('numbers that are no attitude of the recording: none, with the nearest that was given up', () => {
    const truth = { convention: MATRIX! };
    const each: Case = { seed: 3, stated: truth, truth, names: [], kind: 'varied', count: 100, rate: 10, sigma: 0, statedSigma: 0, withTimes: true };
    const recording = recordingOf(each);
    const other = recordingOf({ ...each, seed: 4 });
    const { outcome, explanations, runnerUp } = identified(each, { ...recording, observed: other.observed });
    expect(outcome).toBe('none');
    expect(explanations).toEqual([]);
    expect(runnerUp!.timesNoise).toBeGreaterThan(100);
  });

  it('proposes an attitude that tells what remains apart, and what each explanation predicts there', () => {
    const { discriminating, explanations } = said({ truth: { convention: QUATERNION! }, kind: 'levelOneHeading', sigma: 0, statedSigma: 0 });
    expect(discriminating.length).toBeGreaterThan(0);
    expect(discriminating.length).toBeLessThanOrEqual(3);
    const [{ separates, reading, attitude }] = discriminating as [typeof discriminating[0]];
    expect(attitude).toHaveLength(9);
    expect(separates.explanations).toBe(explanations.length);
    expect(separates.answers).toBeGreaterThan(1);
    expect(separates.predictions.flatMap((prediction) => prediction.explanations).length).toBe(explanations.length);
    expect(reading).toMatch(/heading|pitch|roll|°/i);
  });
});

describe('identities of the conventions, by what remains open', () => {
  const same = (a: Statement, b: Statement): number => distance(a, b);
  const euler = (change: object): Statement => ({ convention: { ...EULER!, ...change } as Statement['convention'] });
  const quaternion = (change: object): Statement => ({ convention: { ...QUATERNION!, ...change } as Statement['convention'] });
  const matrix = (change: object): Statement => ({ convention: { ...MATRIX!, ...change } as Statement['convention'] });

  // Each pair is one set of numbers, from the formulas of the conventions alone: (Mᵀ)ᵀ = M; q ⊗ p of one product is p ⊗ q of
  // the other; diag(1, −1, −1) conjugates a rotation about y or z into its inverse and leaves one about x.
  it.each<[string, Statement, Statement]>([
    ['column by column is transposed', matrix({ layout: 'column-major' }), matrix({ maps: 'body-to-reference' })],
    ["Hamilton's product in one sense is Shuster's in the other", quaternion({}), quaternion({ product: 'shuster', maps: 'reference-to-body' })],
    ['FLU and NWU are pitch and yaw negated', euler({ reference: 'NWU', body: 'FLU' }), euler({ signs: [-1, -1, 1] })],
    ['extrinsic is intrinsic the other way round', euler({ motion: 'extrinsic', sequence: 'XYZ', order: [3, 2, 1] }), euler({})],
  ])('%s: one explanation with both statements', (_, a, b) => {
    expect(same(a, b)).toBeLessThan(1e-12);
    const { outcome, explanations } = said({ truth: a, stated: { convention: b.convention }, sigma: 0, statedSigma: 0 });
    expect(outcome).toBe('unique');
    expect(explanations[0]!.edits).toEqual([]);
    expect(same(statementOf(explanations[0]!), a)).toBeLessThan(1e-12);
  });

  it('one flipped angle, or three, is no change of axes; two are', () => {
    const relabelled = (signs: readonly number[]): boolean => {
      const { explanations } = said({ truth: euler({ signs }), stated: { convention: EULER! }, sigma: 0, statedSigma: 0 });
      return explanations[0]!.sameNumbersAs.concat(explanations[0]!).some(({ convention }) => 'signs' in convention && convention.signs.every((sign) => sign === 1) && 'sequence' in convention && convention.sequence === 'ZYX' && convention.motion === 'intrinsic' && convention.order.join() === '1,2,3');
    };
    expect([[-1, 1, 1], [1, -1, 1], [1, 1, -1], [-1, -1, -1]].map(relabelled)).toEqual([false, false, false, false]);
    expect([[-1, -1, 1], [-1, 1, -1], [1, -1, -1]].map(relabelled)).toEqual([true, true, true]);
  });

  it('a scalar at the other end is a transpose with both axis sets relabelled: both statements are given', () => {
    const { outcome, explanations } = said({ truth: quaternion({ scalar: 'last' }), stated: { convention: QUATERNION! }, sigma: 0, statedSigma: 0 });
    expect(outcome).toBe('unique');
    expect(explanations[0]!.edits).toEqual(['reads scalar last, stated scalar first']);
    expect(explanations[0]!.sameNumbersAs.some(({ convention }) => convention.representation === 'quaternion' && convention.scalar === 'first')).toBe(true);
  });
});
