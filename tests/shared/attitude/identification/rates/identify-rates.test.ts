import { describe, expect, it } from 'vitest';
import type { Convention, EulerConvention } from '#shared/attitude/convention.ts';
import { ORDERS, SEQUENCES } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { identifyRates } from '#shared/attitude/identification/rates/identify-rates.ts';
import type { RateStatement } from '#shared/attitude/identification/rates/rate-identification.ts';
import { createRateConverter } from '#shared/attitude/rates/rate-converter.ts';
import type { Rate } from '#shared/attitude/rates/rate.ts';
import { motion, type MotionKind } from '../support/motions.ts';
import { Noise } from '../support/noise.ts';
import { REFERENCE } from '../support/recording.ts';

const DEG = Math.PI / 180;
const QUATERNION: Convention = { representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'any' };
const ANGLES: EulerConvention = { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' };
const BODY: RateStatement = { attitude: ANGLES, rate: { rate: 'body', unit: 'deg/s' } };
const EULER: RateStatement = { attitude: ANGLES, rate: { rate: 'euler', unit: 'deg/s', angles: ANGLES } };

/** A recording with the rates of a truth: by the rate converter, from body rates that the motion has by construction. */
function recorded(truth: RateStatement, { kind = 'varied', count = 400, rate = 50, sigma = 0, seed = 5 }: { kind?: MotionKind; count?: number; rate?: number; sigma?: number; seed?: number } = {}) {
  const noise = new Noise(seed);
  const at = motion(kind, noise);
  const times = Float64Array.from({ length: count }, (_, i) => i / rate);
  const reference = Float64Array.from([...times].flatMap((t) => at(t).flat()));
  // The motion's own rate, by a central difference over 2 µs: exact to 1e-9 rad/s.
  const h = 1e-6;
  const body = Float64Array.from([...times].flatMap((t) => {
    const [before, after, c] = [at(t - h), at(t + h), at(t)];
    const derivative = c.map((row, i) => row.map((_, j) => (after[i]![j]! - before[i]![j]!) / (2 * h)));
    const product = (i: number, j: number) => [0, 1, 2].reduce((sum, k) => sum + c[i]![k]! * derivative[j]![k]!, 0);
    return [(product(2, 1) - product(1, 2)) / 2, (product(0, 2) - product(2, 0)) / 2, (product(1, 0) - product(0, 1)) / 2].map((component) => component + sigma * noise.normal());
  }));
  const standard: Convention = { ...truth.attitude };
  const attitudes = createConverter(REFERENCE, standard).convert(reference);
  // ω in FRD is what the converter takes where the attitude is stated in FRD; other sets see it in their own axes.
  const inOwn = createRateConverter(REFERENCE, { rate: 'body', unit: 'rad/s' }, { rate: 'reference', unit: 'rad/s' }).convert(reference, body).rates;
  const asBody = relabelled(inOwn, truth.attitude);
  const rates = createRateConverter(standard, { rate: 'reference', unit: 'rad/s' }, truth.rate).convert(attitudes, asBody).rates;
  return { times, reference, rates };
}

/** ω in NED, put into the reference set of a convention; an axial vector. */
function relabelled(rates: Float64Array, { reference }: Convention): Float64Array {
  const letters: Record<string, readonly [number, number]> = { N: [0, 1], S: [0, -1], E: [1, 1], W: [1, -1], D: [2, 1], U: [2, -1] };
  const rows = [...reference].map((letter) => letters[letter]!);
  const [x, y, z] = rows.map(([axis, sign]) => [0, 1, 2].map((k) => (k === axis ? sign : 0))) as [number[], number[], number[]];
  const determinant = x[0]! * (y[1]! * z[2]! - y[2]! * z[1]!) - x[1]! * (y[0]! * z[2]! - y[2]! * z[0]!) + x[2]! * (y[0]! * z[1]! - y[1]! * z[0]!);
  return rates.map((_, at) => { const [axis, sign] = rows[at % 3]!; return determinant * sign * rates[at - (at % 3) + axis]!; });
}

const identified = (recording: ReturnType<typeof recorded>, stated: RateStatement, noise = 0) => identifyRates({
  reference: { convention: REFERENCE, attitudes: recording.reference }, times: recording.times, observed: { rates: recording.rates, stated },
  noise: { angle: 0, unit: 'deg', rate: noise, rateUnit: 'rad/s' },
});

const euler = (change: Partial<EulerConvention>): RateStatement => ({ attitude: ANGLES, rate: { rate: 'euler', unit: 'deg/s', angles: { ...ANGLES, ...change } } });
const withAxes = (reference: string, body: string, rate: Rate = { rate: 'body', unit: 'deg/s' }): RateStatement => ({ attitude: { ...ANGLES, reference, body }, rate });

const SINGLE: readonly [string, RateStatement, RateStatement][] = [
  ['nothing wrong with body rates', BODY, BODY],
  ['nothing wrong with Euler rates', EULER, EULER],
  ['Euler rates sent as body rates', EULER, BODY],
  ['body rates sent as Euler rates', BODY, EULER],
  ['rates in reference axes sent as body rates', { ...BODY, rate: { rate: 'reference', unit: 'deg/s' } }, BODY],
  ['body rates sent as rates in reference axes', BODY, { ...BODY, rate: { rate: 'reference', unit: 'deg/s' } }],
  ['radians for degrees', { ...BODY, rate: { rate: 'body', unit: 'rad/s' } }, BODY],
  ['degrees for radians', BODY, { ...BODY, rate: { rate: 'body', unit: 'rad/s' } }],
  ['body axes forward, left, up', withAxes('NWU', 'FLU'), BODY],
  ['reference axes east, north, up', withAxes('ENU', 'FRD', { rate: 'reference', unit: 'deg/s' }), withAxes('NED', 'FRD', { rate: 'reference', unit: 'deg/s' })],
  ...SEQUENCES.filter((sequence) => sequence !== 'ZYX').map((sequence): [string, RateStatement, RateStatement] => [`rates of ${sequence}`, euler({ sequence }), EULER]),
  ...ORDERS.slice(1).map((order): [string, RateStatement, RateStatement] => [`listed ${order.join('-')}`, euler({ order }), EULER]),
  ...([[-1, 1, 1], [1, -1, 1], [1, 1, -1], [-1, -1, 1], [-1, -1, -1]] as const).map((signs): [string, RateStatement, RateStatement] => [`signs ${signs.join(', ')}`, euler({ signs }), EULER]),
  ['extrinsic angles', euler({ motion: 'extrinsic' }), EULER],
  ['a derivative with its scalar last', { attitude: { ...QUATERNION, scalar: 'last' } as Convention, rate: { rate: 'quaternion' } }, { attitude: QUATERNION, rate: { rate: 'quaternion' } }],
  ['the derivative of the conjugate', { attitude: { ...QUATERNION, maps: 'reference-to-body' } as Convention, rate: { rate: 'quaternion' } }, { attitude: QUATERNION, rate: { rate: 'quaternion' } }],
  ['the derivative of the transpose', { attitude: { ...REFERENCE, maps: 'body-to-reference' }, rate: { rate: 'dcm' } }, { attitude: REFERENCE, rate: { rate: 'dcm' } }],
];

describe('identifyRates', () => {
  it.each(SINGLE)('%s: that and nothing else, without noise and with 0.05°/s', (_, truth, stated) => {
    for (const sigma of [0, 0.05 * DEG]) {
      const recording = recorded(truth, { sigma, ...(sigma > 0 ? { count: 2000 } : {}) });
      const { outcome, remaining, explanations: [first] } = identified(recording, stated, sigma);
      expect([outcome, remaining]).toEqual(['unique', 1]);
      // Judged by the numbers that the explanation predicts, not by its wording.
      const claimed = recorded({ attitude: first!.attitude, rate: first!.rate }, { count: 40 });
      const meant = recorded(truth, { count: 40 });
      const same = (sign: number, i: number, width: number) => [...claimed.rates.subarray(i * width, (i + 1) * width)].every((number, j) => Math.abs(number - sign * meant.rates[i * width + j]!) < 1e-7 * (1 + Math.abs(number)));
      const width = meant.rates.length / 40;
      for (let i = 0; i < 40; i++) expect(same(1, i, width) || (width === 4 && same(-1, i, width))).toBe(true);
      expect(first!.edits.length === 0).toBe(JSON.stringify(truth) === JSON.stringify(stated));
    }
  });

  it('names the confusion of Euler and body rates in plain words', () => {
    expect(identified(recorded(EULER), BODY).explanations[0]!.edits).toEqual(['reads rates of Euler angles, stated the angular velocity in body axes']);
    expect(identified(recorded(BODY), EULER).explanations[0]!.edits).toEqual(['reads the angular velocity in body axes, stated rates of Euler angles']);
  });

  it('level flight does not tell Euler rates from body rates: it says so, and how to', () => {
    const { outcome, explanations, unobservable, discriminating } = identified(recorded(BODY, { kind: 'levelAllHeadings' }), BODY);
    expect(outcome).toBe('ambiguous');
    expect(new Set(explanations.map(({ rate }) => rate.rate))).toEqual(new Set(['body', 'reference', 'euler']));
    expect(unobservable.join(' ')).toMatch(/about the body's down axis/);
    expect(unobservable.join(' ')).toMatch(/do not tell rates of Euler angles/);
    expect(discriminating.length).toBeGreaterThan(0);
    expect(discriminating[0]!.reading).toMatch(/Turn at 10°\/s about the body's/);
    expect(discriminating[0]!.separates.answers).toBeGreaterThan(1);
  });

  it('nothing turned: every convention fits, and it says so', () => {
    const { outcome, unobservable } = identified(recorded(BODY, { kind: 'oneAttitude' }), BODY);
    expect(outcome).toBe('ambiguous');
    expect(unobservable).toContain('Nothing turned: every rate is zero in any convention.');
  });

  it('rates that are none of the recording: none', () => {
    const recording = recorded(BODY);
    expect(identified({ ...recording, rates: recorded(BODY, { seed: 6 }).rates }, BODY).outcome).toBe('none');
  });

  it('never one answer that is wrong, over motions that show little, noise right or overstated', () => {
    const kinds: readonly MotionKind[] = ['small', 'singleAxis', 'slantedAxis', 'levelAllHeadings', 'steadyTurn', 'noRoll', 'noPitch', 'flight', 'tumble'];
    const truths = SINGLE.slice(0, 10).map(([, truth]) => truth);
    const wrong: string[] = [];
    for (const kind of kinds) for (const truth of truths) for (const [count, sigma, overstated] of [[20, 0, 1], [100, 0.02 * DEG, 1], [400, 0.02 * DEG, 4]] as const) {
      const recording = recorded(truth, { kind, count, sigma, rate: 20 });
      const { outcome, explanations } = identified(recording, BODY, sigma * overstated);
      const says = (explanation: RateStatement): boolean => {
        const claimed = recorded({ attitude: explanation.attitude, rate: explanation.rate }, { count: 12 }).rates;
        const meant = recorded(truth, { count: 12 }).rates;
        return claimed.every((number, j) => Math.abs(number - meant[j]!) < 1e-7 * (1 + Math.abs(number)));
      };
      if (outcome === 'none' || (explanations.length < 100 && !explanations.some(says))) wrong.push(`${kind}, ${count} samples, ${JSON.stringify(truth.rate)}: ${outcome}`);
    }
    expect(wrong).toEqual([]);
  }, 60_000);

  it('refuses too few attitudes, and numbers that are not finite, by index', () => {
    const recording = recorded(BODY, { count: 4 });
    expect(() => identified(recording, BODY)).toThrow(/4 attitudes are too few/);
    const bad = recorded(BODY, { count: 20 });
    bad.rates[7] = Infinity;
    expect(() => identified(bad, BODY)).toThrow(/Observed rate 2/);
  });
});
