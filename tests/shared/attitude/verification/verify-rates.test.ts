import { describe, expect, it } from 'vitest';
import type { Convention, EulerConvention } from '#shared/attitude/convention.ts';
import { rateErrorSentence } from '#shared/attitude/verification/error-sentence.ts';
import { verifyRates } from '#shared/attitude/verification/verify-rates.ts';

const EULER: EulerConvention = { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' };
const of = (...numbers: number[]) => Float64Array.from(numbers);
const BODY = { rate: 'body', unit: 'deg/s' } as const;
const DEG = Math.PI / 180;

describe('verifyRates', () => {
  it('compares Euler rates with body rates by the angular velocity', () => {
    // A level turn at 9 °/s in a bank of 35°: q = 9 sin 35°, r = 9 cos 35° (common practice).
    const { failed, statistics } = verifyRates(EULER, of(0, 0, 35), { rate: { rate: 'euler', unit: 'deg/s', angles: EULER }, numbers: of(9, 0, 0) }, { rate: BODY, numbers: of(0, 9 * Math.sin(35 * DEG), 9 * Math.cos(35 * DEG)) }, 1e-12);
    expect(failed).toBe(0);
    expect(statistics.max).toBeLessThan(1e-15);
  });

  it('gives the error as an angular velocity next to lock, where Euler rates differ without bound', () => {
    const { sizes } = verifyRates(EULER, of(0, 89.99, 0), { rate: BODY, numbers: of(0, 0, 0) }, { rate: BODY, numbers: of(0, 0, 0.01) }, 1);
    expect(sizes[0]).toBeCloseTo(0.01 * DEG, 15);
  });

  it.each<[string, string, readonly number[], readonly [number, number, number]]>([
    ['FRD', 'NED', [0, 0, 1], [0, 0, 1]], ['FLU', 'NWU', [0, 0, 1], [0, 0, -1]], ['RFU', 'ENU', [1, 0, 0], [0, 1, 0]], ['FRU', 'NEU', [0, 0, 1], [0, 0, 1]],
  ])('tells the axis in forward, right, down from %s', (body, reference, error, axis) => {
    const convention: Convention = { representation: 'dcm', reference, body, maps: 'reference-to-body', layout: 'row-major' };
    const { worst } = verifyRates(convention, of(1, 0, 0, 0, 1, 0, 0, 0, 1), { rate: BODY, numbers: of(1, 2, 3) }, { rate: BODY, numbers: of(1 + error[0]!, 2 + error[1]!, 3 + error[2]!) }, 1);
    worst.axisBody.forEach((component, k) => expect(component).toBeCloseTo(axis[k]!, 12));
  });

  it('refuses lists of different length', () => {
    expect(() => verifyRates(EULER, of(0, 0, 0), { rate: BODY, numbers: of(0, 0, 0) }, { rate: BODY, numbers: of(0, 0, 0, 1, 1, 1) }, 1)).toThrow(expect.objectContaining({ code: 'count-mismatch' }));
  });
});

it('rateErrorSentence says about which axis, and what that does', () => {
  expect(rateErrorSentence(3, 'deg/s', [0, 0, 1])).toBe('3 deg/s about the down axis: beside the expected rate the actual one turns right.');
  expect(rateErrorSentence(0.5, 'rad/s', [0, -1, 0])).toBe('0.5 rad/s about the right axis: beside the expected rate the actual one pitches down.');
  expect(rateErrorSentence(0, 'rad/s', [1, 0, 0])).toBe('The actual rate is the expected one.');
});
