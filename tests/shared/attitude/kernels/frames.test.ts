import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BODY_SETS, bodyPermutation, handedness, LOCAL_LEVEL_SETS, referencePermutation, type SignedPermutation } from '#shared/attitude/axes.ts';
import { SEQUENCES } from '#shared/attitude/convention.ts';
import { scratch } from '#shared/attitude/arithmetic/scratch.ts';
import { QUATERNION } from '#shared/attitude/arithmetic/slots.ts';
import { canonicalSequence, componentMap, compose, elementMap, inverse } from '#shared/attitude/kernels/frames.ts';
import { relabelQuaternion } from '#shared/attitude/kernels/relabel.ts';
import { EULER_DEG } from '#tests/support/conventions.ts';

const matrix = ({ column, sign }: SignedPermutation): number[][] => column.map((c, row) => [0, 1, 2].map((j) => (j === c ? sign[row]! : 0)));
const times = (a: number[][], b: number[][]): number[][] => a.map((row) => [0, 1, 2].map((j) => row.reduce((sum, entry, k) => sum + entry * b[k]![j]!, 0)));
const transpose = (m: number[][]): number[][] => [0, 1, 2].map((i) => m.map((row) => row[i]!));
const plain = (m: number[][]): number[][] => m.map((row) => row.map((entry) => entry + 0));
/** R(q) of the component definition, for any norm. */
const rotation = ([w, x, y, z]: readonly number[]): number[][] => {
  const n = w! * w! + x! * x! + y! * y! + z! * z!;
  return [
    [w! * w! + x! * x! - y! * y! - z! * z!, 2 * (x! * y! - w! * z!), 2 * (x! * z! + w! * y!)],
    [2 * (x! * y! + w! * z!), w! * w! - x! * x! + y! * y! - z! * z!, 2 * (y! * z! - w! * x!)],
    [2 * (x! * z! - w! * y!), 2 * (y! * z! + w! * x!), w! * w! - x! * x! - y! * y! + z! * z!],
  ].map((row) => row.map((entry) => entry / n));
};

const anyPermutation = fc.oneof(fc.constantFrom(...LOCAL_LEVEL_SETS).map(referencePermutation), fc.constantFrom(...BODY_SETS).map(bodyPermutation));

describe('signed permutations', () => {
  it('compose and invert as matrices do', () => {
    fc.assert(fc.property(anyPermutation, anyPermutation, (a, b) => {
      expect(plain(matrix(compose(a, b)))).toEqual(plain(times(matrix(a), matrix(b))));
      expect(plain(matrix(inverse(a)))).toEqual(plain(transpose(matrix(a))));
    }), { seed: 1 });
  });
});

describe('elementMap', () => {
  it('is left R rightᵀ, with either listing transposed', () => {
    const r = [[1, 2, 3], [4, 5, 6], [7, 8, 9]];
    fc.assert(fc.property(anyPermutation, anyPermutation, fc.boolean(), fc.boolean(), (left, right, fromTransposed, toTransposed) => {
      const { index, sign } = elementMap({ left, right }, fromTransposed, toTransposed);
      const listed = (fromTransposed ? transpose(r) : r).flat();
      const wanted = times(times(matrix(left), r), transpose(matrix(right)));
      expect(Array.from(index, (place, k) => sign[k]! * listed[place]!)).toEqual((toTransposed ? transpose(wanted) : wanted).flat());
    }), { seed: 2 });
  });
});

describe('componentMap', () => {
  it('carries a quaternion as left R rightᵀ carries its matrix, whatever the handedness', () => {
    fc.assert(fc.property(anyPermutation, anyPermutation, fc.boolean(), fc.boolean(), fc.tuple(...[1, 2, 3, 4].map(() => fc.integer({ min: -50, max: 50 })) as [fc.Arbitrary<number>, fc.Arbitrary<number>, fc.Arbitrary<number>, fc.Arbitrary<number>]), (left, right, conjugateFrom, conjugateTo, q) => {
      fc.pre(handedness(left) === handedness(right) && q.some((component) => component !== 0));
      q.forEach((component, i) => scratch.set([component, 0], QUATERNION + 2 * i));
      const map = componentMap({ left, right }, conjugateFrom, conjugateTo);
      relabelQuaternion(map);
      const got = [0, 1, 2, 3].map((i) => scratch[QUATERNION + 2 * i]!);
      const turned = (m: number[][], conjugated: boolean) => (conjugated ? transpose(m) : m);
      const wanted = times(times(matrix(left), turned(rotation(q), conjugateFrom)), transpose(matrix(right)));
      turned(rotation(got), conjugateTo).flat().forEach((element, k) => expect(element).toBeCloseTo(wanted.flat()[k]!, 12));
      expect(got.reduce((sum, c) => sum + c * c, 0)).toBe(map.terms * q.reduce((sum, c) => sum + c * c, 0));
    }), { numRuns: 2000, seed: 3 });
  });
});

describe('canonicalSequence', () => {
  it.each(SEQUENCES.flatMap((sequence) => (['intrinsic', 'extrinsic'] as const).map((motion) => [sequence, motion] as const)))('carries %s %s to Rx Ry Rz or Rx Ry Rx', (sequence, motion) => {
    const { symmetric, frame, lastSense, placeOfApplied } = canonicalSequence({ ...(EULER_DEG as Extract<typeof EULER_DEG, { representation: 'euler' }>), sequence, motion });
    expect(handedness(frame)).toBe(1);
    const about = (axis: number, angle: number) => {
      const q = [Math.cos(angle / 2), 0, 0, 0];
      q[axis + 1] = Math.sin(angle / 2);
      return rotation(q);
    };
    const applied = [0.3, -0.8, 1.1];
    const order = motion === 'intrinsic' ? [0, 1, 2] : [2, 1, 0];
    const given = order.map((turn) => about('XYZ'.indexOf(sequence[turn]!), applied[turn]!)).reduce(times);
    const angles = [0, 1, 2].map((place) => applied[placeOfApplied.indexOf(place)]! * (place === 2 ? lastSense : 1));
    const canonical = [about(0, angles[0]!), about(1, angles[1]!), about(symmetric ? 0 : 2, angles[2]!)].reduce(times);
    times(times(matrix(frame), given), transpose(matrix(frame))).flat().forEach((element, k) => expect(element).toBeCloseTo(canonical.flat()[k]!, 14));
  });
});
