import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { compose } from '#shared/attitude/rotations/compose.ts';
import { errorSentence } from '#shared/attitude/verification/error-sentence.ts';
import { statisticsOf } from '#shared/attitude/verification/statistics.ts';
import { verifyAttitudes } from '#shared/attitude/verification/verify-attitudes.ts';
import { anyConvention, anyRotation, DCM, EULER_DEG, QUATERNION } from '#tests/support/conventions.ts';

const stated = (convention: Convention, ...numbers: number[]) => ({ convention, numbers: Float64Array.from(numbers) });

describe('verifyAttitudes', () => {
  it('finds no error between the same attitudes in any two conventions', () => {
    fc.assert(fc.property(anyConvention, anyConvention, fc.array(anyRotation, { minLength: 1, maxLength: 5 }), (a, b, attitudes) => {
      const q = Float64Array.from(attitudes.flat());
      fc.pre(a.representation !== 'gibbs' && b.representation !== 'gibbs');
      const [inA, inB] = [a, b].map((convention) => ({ convention, numbers: createConverter(QUATERNION, convention).convert(q) })) as [{ convention: Convention; numbers: Float64Array }, { convention: Convention; numbers: Float64Array }];
      const { failed, worst } = verifyAttitudes(inA, inB, 1e-14);
      expect([failed, worst.angle < 1e-14]).toEqual([0, true]);
    }), { numRuns: 300, seed: 21 });
  });

  it('finds an injected rotation, its axis in FRD, and where it is', () => {
    const half = (2 * Math.PI) / 180 / 2;
    const attitudes = [[10, 5, 3], [80, -40, 60], [200, 20, -120]].map((angles) => Array.from(createConverter(EULER_DEG, QUATERNION).convert(Float64Array.from(angles))) as [number, number, number, number]);
    const turned = attitudes.map((q, i) => (i === 1 ? compose(q, [Math.cos(half), 0, Math.sin(half), 0]) : q));
    const enu: Convention = { ...QUATERNION, reference: 'ENU', body: 'FLU', scalar: 'last' };
    const actual = createConverter(QUATERNION, enu).convert(Float64Array.from(turned.flat()));
    const { count, failed, worst, angles } = verifyAttitudes(stated(QUATERNION, ...attitudes.flat()), { convention: enu, numbers: actual }, 0.01);
    expect([count, failed, worst.index]).toEqual([3, 1, 1]);
    expect(worst.angle).toBeCloseTo(2 * half, 14);
    expect(worst.axisBody[1]).toBeCloseTo(1, 12);
    expect(Math.max(angles[0]!, angles[2]!)).toBeLessThan(1e-15);
    expect(errorSentence((worst.angle * 180) / Math.PI, 'deg', worst.axisBody)).toBe('2 deg about the right axis: the actual attitude is pitched up from the expected one.');
  });

  it('fails what is beyond the tolerance by however little, and nothing within it', () => {
    const verdicts = [0.099, 0.101].map((pitch) => verifyAttitudes(stated(EULER_DEG, 10, 0, 0), stated(EULER_DEG, 10, pitch, 0), (0.1 * Math.PI) / 180).failed);
    expect(verdicts).toEqual([0, 1]);
  });

  it('does not take a difference of angles for an error: near the vertical 90° of yaw against 90° of roll is none', () => {
    expect(verifyAttitudes(stated(EULER_DEG, 90, 90, 0), stated(EULER_DEG, 0, 90, -90), 1e-12).failed).toBe(0);
  });

  it('refuses lists of different length, and attitudes that are none', () => {
    expect(() => verifyAttitudes(stated(EULER_DEG, 1, 2, 3), stated(DCM), 1)).toThrow(expect.objectContaining({ code: 'count-mismatch' }));
    expect(() => verifyAttitudes(stated(EULER_DEG, 1, 2, 3), stated(QUATERNION, 3, 0, 0, 0), 1)).toThrow(expect.objectContaining({ code: 'not-a-rotation' }));
    expect(() => verifyAttitudes(stated({ ...QUATERNION, reference: 'ECEF' }, 1, 0, 0, 0), stated(QUATERNION, 1, 0, 0, 0), 1)).toThrow(expect.objectContaining({ code: 'unrelated-frames' }));
  });
});

describe('statisticsOf', () => {
  it('takes percentiles by nearest rank', () => {
    const { rms, median, p95, max } = statisticsOf(Float64Array.from({ length: 20 }, (_, i) => 20 - i));
    expect([median, p95, max]).toEqual([10, 19, 20]);
    expect(rms).toBeCloseTo(Math.sqrt((20 * 21 * 41) / 6 / 20), 12);
    // Of seven values the median is the fourth (rank ⌈3.5⌉) and the 95th percentile the seventh (⌈6.65⌉).
    expect(statisticsOf(Float64Array.of(7, 1, 6, 2, 5, 3, 4))).toMatchObject({ median: 4, p95: 7 });
    expect(statisticsOf(Float64Array.of(3))).toEqual({ rms: 3, median: 3, p95: 3, max: 3 });
  });
});
