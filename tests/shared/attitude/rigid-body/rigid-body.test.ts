import fc from 'fast-check';
import { add, cross, eigs, multiply } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { inertiaFault, isSymmetricAircraft, principalMoments, type InertiaMatrix } from '#shared/attitude/rigid-body/inertia.ts';
import { newtonEuler } from '#shared/attitude/rigid-body/newton-euler.ts';

const vector = fc.tuple(...[0, 1, 2].map(() => fc.integer({ min: -50, max: 50 }).map((n) => n / 7))) as fc.Arbitrary<[number, number, number]>;

/** Of a few point masses: every inertia matrix that there is can be made so. */
const possible = fc.array(fc.tuple(fc.integer({ min: 1, max: 9 }), vector), { minLength: 4, maxLength: 7 }).map((points): InertiaMatrix => {
  const entry = (i: number, j: number): number => points.reduce((sum, [mass, r]) => sum + mass * ((i === j ? r[0] ** 2 + r[1] ** 2 + r[2] ** 2 : 0) - r[i]! * r[j]!), 0);
  return [0, 1, 2].map((i) => [0, 1, 2].map((j) => entry(i, j))) as unknown as InertiaMatrix;
}).filter((inertia) => principalMoments(inertia)[0] > 0.1);

describe('newtonEuler', () => {
  it('is what mathjs makes of m (v̇ + ω × v) and I ω̇ + ω × I ω', () => {
    fc.assert(fc.property(possible, vector, vector, vector, vector, (inertia, v, w, dv, dw) => {
      const { force, moment } = newtonEuler(3.5, inertia, { velocity: v, angularVelocity: w, velocityDerivative: dv, angularVelocityDerivative: dw });
      const F = multiply(3.5, add(dv, cross(w, v) as number[])) as unknown as number[];
      const I = inertia.map((row) => [...row]);
      const M = add(multiply(I, dw), cross(w, multiply(I, w)) as number[]) as unknown as number[];
      for (let k = 0; k < 3; k++) {
        expect(force[k]).toBeCloseTo(F[k]!, 8);
        expect(Math.abs(moment[k]! - M[k]!)).toBeLessThan(1e-9 * (1 + Math.abs(M[k]!)) * 1e3);
      }
    }));
  });

  it('for a symmetric aircraft is the three scalar equations', () => {
    // Etkin & Reid, Dynamics of Flight, eqs. 4.7,2 and 4.7,16 (from memory):
    // L = A ṗ − E ṙ + q r (C − B) − E p q,  M = B q̇ + r p (A − C) + E (p² − r²),  N = C ṙ − E ṗ + p q (B − A) + E q r.
    const [A, B, C, E] = [12875, 75674, 85552, 1331];
    const [p, q, r, dp, dq, dr] = [0.31, -0.12, 0.07, 0.4, -0.05, 0.02];
    const inertia: InertiaMatrix = [[A, 0, -E], [0, B, 0], [-E, 0, C]];
    const [u, v, w, du, dv, dw, m] = [120, 3, 9, 0.4, -0.2, 1.1, 9300];
    const { force, moment } = newtonEuler(m, inertia, { velocity: [u, v, w], angularVelocity: [p, q, r], velocityDerivative: [du, dv, dw], angularVelocityDerivative: [dp, dq, dr] });
    const expected = [A * dp - E * dr + q * r * (C - B) - E * p * q, B * dq + r * p * (A - C) + E * (p * p - r * r), C * dr - E * dp + p * q * (B - A) + E * q * r];
    expected.forEach((each, k) => expect(moment[k]).toBeCloseTo(each, 6));
    [m * (du + q * w - r * v), m * (dv + r * u - p * w), m * (dw + p * v - q * u)].forEach((each, k) => expect(force[k]).toBeCloseTo(each, 6));
  });

  it('needs no moment for a free top: M = 0 keeps |I ω| and the energy', () => {
    const inertia: InertiaMatrix = [[2, 0, 0], [0, 3, 0], [0, 0, 4]];
    const w = [0.4, 1.1, -0.3] as const;
    const dw = [((3 - 4) * w[1] * w[2]) / 2, ((4 - 2) * w[2] * w[0]) / 3, ((2 - 3) * w[0] * w[1]) / 4] as const;
    const { moment } = newtonEuler(1, inertia, { velocity: [0, 0, 0], angularVelocity: w, velocityDerivative: [0, 0, 0], angularVelocityDerivative: dw });
    for (const component of moment) expect(Math.abs(component)).toBeLessThan(1e-15);
  });
});

describe('inertiaFault', () => {
  it('takes what point masses can make, and a flat plate', () => {
    fc.assert(fc.property(possible, (inertia) => { expect(inertiaFault(inertia)).toBeNull(); }));
    expect(inertiaFault([[1, 0, 0], [0, 1, 0], [0, 0, 2]])).toBeNull();
  });

  it.each<[string, InertiaMatrix, RegExp]>([
    ['not symmetric', [[2, 0.1, 0], [0.2, 3, 0], [0, 0, 4]], /row 0 has 0.1 in its place 1: an inertia matrix is symmetric/],
    ['a moment of zero', [[0, 0, 0], [0, 3, 0], [0, 0, 3]], /principal moment of 0/],
    ['not positive definite by its products', [[2, -2.5, 0], [-2.5, 3, 0], [0, 0, 4]], /all three must be greater than 0/],
    ['a triangle that does not close', [[1, 0, 0], [0, 1, 0], [0, 0, 2.1]], /the largest exceeds the sum of the other two/],
    ['products with the sign forgotten, too large', [[10, 0, 9], [0, 12, 0], [9, 0, 14]], /exceeds the sum|greater than 0/],
  ])('refuses %s', (_, inertia, message) => {
    expect(inertiaFault(inertia)!.message).toMatch(message);
  });

  it('finds principal moments as mathjs does', () => {
    fc.assert(fc.property(possible, (inertia) => {
      const values = (eigs(inertia.map((row) => [...row])).values as number[]).map(Number).sort((a, b) => a - b);
      principalMoments(inertia).forEach((moment, k) => expect(Math.abs(moment - values[k]!)).toBeLessThan(1e-9 * values[2]!));
    }));
  });
});

it('isSymmetricAircraft: Ixy = Iyz = 0, Ixz free', () => {
  expect(isSymmetricAircraft([[2, 0, -0.5], [0, 3, 0], [-0.5, 0, 4]])).toBe(true);
  expect(isSymmetricAircraft([[2, -0.1, 0], [-0.1, 3, 0], [0, 0, 4]])).toBe(false);
  expect(isSymmetricAircraft([[2, 0, 0], [0, 3, -0.1], [0, -0.1, 4]])).toBe(false);
});
