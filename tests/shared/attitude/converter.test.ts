import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { SEQUENCES, type Convention, type EulerConvention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { AttitudeError } from '#shared/attitude/errors.ts';
import { anyConvention, anyRotation, DCM, EULER_DEG, QUATERNION } from '#tests/support/conventions.ts';

const convert = (from: Convention, to: Convention, ...numbers: number[]) => Array.from(createConverter(from, to).convert(Float64Array.from(numbers)));
const distance = (a: readonly number[], b: readonly number[]) => Math.max(...a.map((value, i) => Math.abs(value - b[i]!)));
/** The attitude behind numbers, as the matrix v_FRD = C v_NED. */
const matrixBehind = (convention: Convention, numbers: readonly number[]) => convert(convention, DCM, ...numbers);

/** Whether the attitude is so near a half turn between these axes that its Gibbs vector does not exist or means little. */
const isHalfTurn = ({ reference, body }: Convention, q: readonly number[]) => convert(QUATERNION, { ...QUATERNION, reference, body }, ...q)[0]! < 1e-7;

describe('convert', () => {
  it('rebuilds the attitude through any convention', () => {
    fc.assert(fc.property(anyConvention, anyRotation, (convention, q) => {
      fc.pre(convention.representation !== 'gibbs' || !isHalfTurn(convention, q));
      const there = convert(QUATERNION, convention, ...q);
      expect(distance(matrixBehind(convention, there), matrixBehind(QUATERNION, q))).toBeLessThan(1e-7);
    }), { numRuns: 2000, seed: 1 });
  });

  it('keeps the ranges that the convention promises', () => {
    fc.assert(fc.property(anyConvention, anyRotation, (convention, q) => {
      fc.pre(convention.representation !== 'gibbs');
      const numbers = convert(QUATERNION, convention, ...q);
      switch (convention.representation) {
        case 'euler': {
          const half = convention.unit === 'deg' ? 180 : Math.PI;
          const listed = (turn: 1 | 2 | 3) => numbers[convention.order.indexOf(turn)]!;
          expect(listed(1)).toBeGreaterThanOrEqual(convention.range === 'positive' ? 0 : -half);
          expect(listed(1)).toBeLessThanOrEqual(convention.range === 'positive' ? 2 * half : half);
          expect(Math.abs(listed(3))).toBeLessThanOrEqual(half);
          const middle = listed(2);
          const symmetric = convention.sequence[0] === convention.sequence[2];
          expect(middle).toBeGreaterThanOrEqual(symmetric ? 0 : -half / 2);
          expect(middle).toBeLessThanOrEqual(symmetric ? half : half / 2);
          return;
        }
        case 'quaternion': return void expect(numbers[convention.scalar === 'first' ? 0 : 3]).toBeGreaterThanOrEqual(0);
        case 'mrp': return void expect(Math.hypot(...numbers)).toBeLessThanOrEqual(1 + 1e-12);
        case 'rotation-vector': return void expect(Math.hypot(...numbers)).toBeLessThanOrEqual((convention.unit === 'deg' ? 180 : Math.PI) * (1 + 1e-12));
        default:
      }
    }), { numRuns: 1000, seed: 2 });
  });

  it('makes the component equations of the contract true', () => {
    // Written out from the definitions: R(q) = (w² − v·v) I + 2 v vᵀ + 2 w [v×], v_ref = R(q) v_body.
    const [w, x, y, z] = [0.5, 0.1, -0.7, 0.5];
    const norm = Math.hypot(w, x, y, z);
    const q = [w, x, y, z].map((component) => component / norm) as [number, number, number, number];
    const r = [
      [q[0] ** 2 + q[1] ** 2 - q[2] ** 2 - q[3] ** 2, 2 * (q[1] * q[2] - q[0] * q[3]), 2 * (q[1] * q[3] + q[0] * q[2])],
      [2 * (q[1] * q[2] + q[0] * q[3]), q[0] ** 2 - q[1] ** 2 + q[2] ** 2 - q[3] ** 2, 2 * (q[2] * q[3] - q[0] * q[1])],
      [2 * (q[1] * q[3] - q[0] * q[2]), 2 * (q[2] * q[3] + q[0] * q[1]), q[0] ** 2 - q[1] ** 2 - q[2] ** 2 + q[3] ** 2],
    ];
    const toReference: Convention = { ...DCM, maps: 'body-to-reference' } as Convention;
    expect(distance(convert(QUATERNION, toReference, ...q), r.flat())).toBeLessThan(1e-15);
    expect(distance(convert(QUATERNION, DCM, ...q), [0, 1, 2].flatMap((i) => r.map((row) => row[i]!)))).toBeLessThan(1e-15);
    const shuster: Convention = { ...QUATERNION, product: 'shuster', maps: 'reference-to-body' };
    expect(convert(QUATERNION, shuster, ...q)).toEqual(convert(QUATERNION, QUATERNION, ...q));
  });

  it('agrees with C = R1(roll) R2(pitch) R3(yaw)', () => {
    const [yaw, pitch, roll] = [0.4, -0.9, 2.2];
    const r1 = (a: number) => [[1, 0, 0], [0, Math.cos(a), Math.sin(a)], [0, -Math.sin(a), Math.cos(a)]];
    const r2 = (a: number) => [[Math.cos(a), 0, -Math.sin(a)], [0, 1, 0], [Math.sin(a), 0, Math.cos(a)]];
    const r3 = (a: number) => [[Math.cos(a), Math.sin(a), 0], [-Math.sin(a), Math.cos(a), 0], [0, 0, 1]];
    const times = (a: number[][], b: number[][]) => a.map((row) => [0, 1, 2].map((j) => row.reduce((sum, value, k) => sum + value * b[k]![j]!, 0)));
    const c = times(times(r1(roll), r2(pitch)), r3(yaw)).flat();
    expect(distance(convert({ ...EULER_DEG, unit: 'rad' } as Convention, DCM, yaw, pitch, roll), c)).toBeLessThan(1e-15);
  });

  it('reads extrinsic motion as the reversed intrinsic one', () => {
    for (const sequence of SEQUENCES) {
      const intrinsic: EulerConvention = { ...(EULER_DEG as EulerConvention), sequence };
      const reversed = [...sequence].reverse().join('') as EulerConvention['sequence'];
      const extrinsic: EulerConvention = { ...intrinsic, sequence: reversed, motion: 'extrinsic' };
      expect(distance(matrixBehind(intrinsic, [10, 20, 30]), matrixBehind(extrinsic, [30, 20, 10])), sequence).toBeLessThan(1e-15);
    }
  });

  it.each([
    ['ENU, whose x points east: 30° NED yaw is 60° ENU yaw', { ...EULER_DEG, reference: 'ENU', body: 'FLU' }, [30, 0, 0], [60, 0, 0]],
    ['NWU/FLU: pitch and yaw negated', { ...EULER_DEG, reference: 'NWU', body: 'FLU' }, [30, 10, 20], [-30, -10, 20]],
    ['heading from 0 to 360', { ...EULER_DEG, range: 'positive' }, [-30, 10, 20], [330, 10, 20]],
    ['roll first', { ...EULER_DEG, order: [3, 2, 1] }, [30, 10, 20], [20, 10, 30]],
    ['pitch down positive', { ...EULER_DEG, signs: [1, -1, 1] }, [30, 10, 20], [30, -10, 20]],
  ])('tells %s', (_what, to, given, expected) => {
    expect(distance(convert(EULER_DEG, to as Convention, ...given), expected)).toBeLessThan(1e-12);
  });

  it('gives exact numbers at multiples of 90°', () => {
    expect(convert(EULER_DEG, DCM, 90, 0, 0)).toEqual([0, 1, 0, -1, 0, 0, 0, 0, 1]);
    expect(convert(EULER_DEG, DCM, 0, 90, 0)).toEqual([0, 0, -1, 0, 1, 0, 1, 0, 0]);
    expect(convert(EULER_DEG, DCM, 180, 0, -90).map((value) => value + 0)).toEqual([-1, 0, 0, 0, 0, -1, 0, -1, 0]);
    expect(convert(DCM, EULER_DEG, 0, 1, 0, -1, 0, 0, 0, 0, 1)).toEqual([90, 0, 0]);
  });

  it('rebuilds the attitude at lock, with the last applied angle 0', () => {
    for (const sequence of SEQUENCES) {
      for (const motion of ['intrinsic', 'extrinsic'] as const) {
        const convention: EulerConvention = { ...(EULER_DEG as EulerConvention), sequence, motion };
        const middles = sequence[0] === sequence[2] ? [0, 180] : [90, -90];
        for (const middle of middles) {
          const converter = createConverter(convention, convention);
          const out = Array.from(converter.convert(Float64Array.of(25, middle, 40)));
          expect(out[2], `${sequence} ${motion} ${middle}`).toBe(0);
          expect(converter.warnings().map(({ code }) => code)).toEqual(['gimbal-lock']);
          expect(distance(matrixBehind(convention, out), matrixBehind(convention, [25, middle, 40]))).toBeLessThan(1e-15);
        }
      }
    }
  });

  it('takes 90 in degrees for exact lock, but not the double nearest to π/2', () => {
    const inRadians: Convention = { ...EULER_DEG, unit: 'rad' } as Convention;
    const degrees = createConverter(EULER_DEG, EULER_DEG);
    degrees.convert(Float64Array.of(0, 90, 0));
    expect(degrees.warnings()[0]?.code).toBe('gimbal-lock');
    const radians = createConverter(inRadians, inRadians);
    radians.convert(Float64Array.of(0, Math.PI / 2, 0));
    expect(radians.warnings()[0]?.code).toBe('severe-gimbal-lock');
  });

  it('says of the well-conditioned combination what stays true near lock', () => {
    for (const [sequence, motion, middle] of [['ZYX', 'intrinsic', 89.9], ['ZYX', 'intrinsic', -89.9], ['XYZ', 'extrinsic', 89.9], ['XYZ', 'intrinsic', 89.9], ['ZXZ', 'intrinsic', 0.1], ['ZXZ', 'intrinsic', 179.9], ['YXZ', 'extrinsic', -89.9]] as const) {
      const convention: EulerConvention = { ...(EULER_DEG as EulerConvention), sequence, motion };
      const combinationAt = (first: number, last: number) => {
        const converter = createConverter(convention, convention);
        converter.convert(Float64Array.of(first, middle, last));
        return converter.warnings()[0]!.worst.wellConditioned!;
      };
      const { combination } = combinationAt(20, 5);
      // Moving both angles along the combination's level line hardly moves the attitude; across it, it does.
      const along = combination === 'first-plus-last' ? [21, 4] : [21, 6];
      const across = combination === 'first-plus-last' ? [21, 6] : [21, 4];
      const moved = ([first, last]: number[]) => distance(matrixBehind(convention, [first!, middle, last!]), matrixBehind(convention, [20, middle, 5]));
      expect(moved(along) * 100, `${sequence} ${motion} ${middle}`).toBeLessThan(moved(across));
      expect(combinationAt(20, 5).angle).toBeCloseTo(combination === 'first-plus-last' ? 25 : 15, 9);
    }
  });

  it('keeps a continuous quaternion on one side, over successive calls too', () => {
    const converter = createConverter(EULER_DEG, { ...QUATERNION, sign: 'continuous' });
    const dots: number[] = [];
    let before: number[] | null = null;
    for (let yaw = 0; yaw < 720; yaw += 7) {
      const q = Array.from(converter.convert(Float64Array.of(yaw, 12, 5)));
      if (before) dots.push(q.reduce((sum, value, i) => sum + value * before![i]!, 0));
      before = q;
    }
    expect(Math.min(...dots)).toBeGreaterThan(0.9);
  });

  it('takes a quaternion for its direction: what leaves has norm 1, also in the convention it came in', () => {
    const rounded = [Math.fround(0.7071068), 0, Math.fround(0.1), Math.fround(0.7)];
    const converter = createConverter(QUATERNION, QUATERNION, { repair: 'nearest' });
    const out = Array.from(converter.convert(Float64Array.from(rounded)));
    expect(converter.warnings()[0]?.code).toBe('renormalised');
    expect(Math.abs(Math.hypot(...out) - 1)).toBeLessThan(2.3e-16);
    expect(convert(QUATERNION, QUATERNION, 0.5, -0.5, 0.5, 0.5)).toEqual([0.5, -0.5, 0.5, 0.5]);
  });

  it('accepts a reflection between sets of different handedness only', () => {
    const mixed: Convention = { ...DCM, body: 'FLD' } as Convention;
    expect(convert(DCM, mixed, 1, 0, 0, 0, 1, 0, 0, 0, 1)).toEqual([1, 0, 0, 0, -1, 0, 0, 0, 1].map((value) => value + 0));
    expect(() => convert(mixed, DCM, 1, 0, 0, 0, 1, 0, 0, 0, 1)).toThrow(AttitudeError);
    expect(convert(mixed, DCM, 1, 0, 0, 0, -1, 0, 0, 0, 1).map((value) => value + 0)).toEqual([1, 0, 0, 0, 1, 0, 0, 0, 1]);
  });

  it('counts indices and faults over successive calls, and names the defect', () => {
    const converter = createConverter(QUATERNION, DCM);
    converter.convert(Float64Array.of(1, 0, 0, 0, 1, 0, 0, 0));
    expect(() => converter.convert(Float64Array.of(1, 0, 0, 0, 0, 2, 0, 0))).toThrow(expect.objectContaining({ code: 'not-a-rotation', faults: [expect.objectContaining({ index: 3, defect: 1 })] }));
    expect(() => createConverter(QUATERNION, DCM).convert(Float64Array.of(1, 0, 0))).toThrow(expect.objectContaining({ code: 'count-mismatch' }));
  });

  it('takes the nearest rotation of a bent matrix when asked to', () => {
    const bent = [1, 0.01, 0, 0, 1, 0, 0, 0, 1];
    expect(() => convert(DCM, DCM, ...bent)).toThrow(expect.objectContaining({ code: 'not-a-rotation' }));
    const converter = createConverter(DCM, DCM, { repair: 'nearest' });
    const out = Array.from(converter.convert(Float64Array.from(bent)));
    // The polar factor of [[1, e], [0, 1]] is the rotation by atan(e/2): Higham 1986.
    const angle = Math.atan(0.005);
    expect(distance(out, [Math.cos(angle), Math.sin(angle), 0, -Math.sin(angle), Math.cos(angle), 0, 0, 0, 1])).toBeLessThan(1e-15);
    expect(converter.warnings()[0]).toMatchObject({ code: 'reorthonormalised', count: 1 });
  });
});
