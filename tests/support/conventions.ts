import fc from 'fast-check';
import { BODY_SETS, LOCAL_LEVEL_SETS } from '#shared/attitude/axes.ts';
import {
  ANGLE_RANGES, ANGLE_UNITS, MAPS, MATRIX_LAYOUTS, MOTIONS, MRP_SHADOWS, ORDERS, QUATERNION_PRODUCTS, QUATERNION_SIGNS, SCALAR_POSITIONS, SEQUENCES,
  type Convention, type QuaternionConvention,
} from '#shared/attitude/convention.ts';
import { determinantOf } from '#shared/attitude/relabelling.ts';

export const QUATERNION: QuaternionConvention = { representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'any' };
export const DCM: Convention = { representation: 'dcm', reference: 'NED', body: 'FRD', maps: 'reference-to-body', layout: 'row-major' };
export const EULER_DEG: Convention = { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' };

const one = <T>(values: readonly T[]) => fc.constantFrom(...values);
const sign = one([1, -1] as const);
const maps = one(MAPS);
const unit = one(ANGLE_UNITS);

/** Facets of any representation, without axes. */
const facets = fc.oneof(
  fc.record({ representation: fc.constant('euler' as const), sequence: one(SEQUENCES), motion: one(MOTIONS), unit, order: one(ORDERS), signs: fc.tuple(sign, sign, sign), range: one(ANGLE_RANGES) }),
  fc.record({ representation: fc.constant('quaternion' as const), scalar: one(SCALAR_POSITIONS), product: one(QUATERNION_PRODUCTS), maps, sign: one(QUATERNION_SIGNS) }),
  fc.record({ representation: fc.constant('dcm' as const), maps, layout: one(MATRIX_LAYOUTS) }),
  fc.record({ representation: fc.constant('rotation-vector' as const), maps, unit }),
  fc.record({ representation: fc.constant('axis-angle' as const), maps, unit }),
  fc.record({ representation: fc.constant('mrp' as const), maps, shadow: one(MRP_SHADOWS) }),
  fc.record({ representation: fc.constant('gibbs' as const), maps }),
);

/** Any convention between two local-level sets of the same handedness, left-handed ones included. */
export const anyConvention: fc.Arbitrary<Convention> = fc.tuple(facets, one(LOCAL_LEVEL_SETS), one(BODY_SETS))
  .map(([rest, reference, body]) => ({ ...rest, reference, body }) as Convention)
  .filter((convention) => determinantOf(convention) === 1);

const component = fc.integer({ min: -1_000_000, max: 1_000_000 });

/** A unit quaternion: uniformly distributed (points of a ball), but for the edges that fast-check tries first. */
export const anyRotation: fc.Arbitrary<[number, number, number, number]> = fc.tuple(component, component, component, component)
  .filter((q) => Math.hypot(...q) > 1000 && Math.hypot(...q) <= 1_000_000)
  .map((q) => q.map((each) => each / Math.hypot(...q)) as [number, number, number, number]);
