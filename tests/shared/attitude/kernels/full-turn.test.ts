import { expect, it } from 'vitest';
import type { Convention, EulerConvention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';

const VECTOR: Convention = { representation: 'rotation-vector', reference: 'NED', body: 'FRD', maps: 'body-to-reference', unit: 'rad' };
const POSITIVE = { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', order: [1, 2, 3], signs: [1, 1, 1], range: 'positive' } as const;
const headingOf = (turn: number, unit: EulerConvention['unit']): number => createConverter(VECTOR, { ...POSITIVE, unit }).convert(Float64Array.of(0, 0, turn))[0]!;

it.each(['deg', 'rad'] as const)('a heading so little below a full turn that it rounds to it is listed as 0, never as the full turn, in %s', (unit) => {
  for (const turn of [-1e-300, -5e-324, -1e-18]) expect(Object.is(headingOf(turn, unit), 0)).toBe(true);
  const full = unit === 'deg' ? 360 : 2 * Math.PI;
  expect(headingOf(-1e-12, unit)).toBeLessThan(full);
  expect(headingOf(-1e-12, unit)).toBeGreaterThan(0.99 * full);
});
