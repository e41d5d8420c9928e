/**
 * The complete statement that turns numbers into an attitude: a representation and every facet of it.
 *
 * `C` below is the component matrix with v_body = C v_ref. Every facet is defined by the component equation
 * that it makes true; see each type. Nothing has a default: a convention object always carries every facet.
 */

/** Reference axes that are tied to the local level: three letters, x then y then z, or a named frame. */
export type ReferenceAxes = string;
/** Body axes: three letters, x then y then z; one of F/B, one of R/L, one of U/D. */
export type BodyAxes = string;

/** Axes of three successive rotations, in the order applied. */
export const SEQUENCES = ['XYZ', 'YZX', 'ZXY', 'XZY', 'YXZ', 'ZYX', 'XYX', 'XZX', 'YXY', 'YZY', 'ZXZ', 'ZYZ'] as const;
export type Sequence = (typeof SEQUENCES)[number];

export const ORDERS = [[1, 2, 3], [1, 3, 2], [2, 1, 3], [2, 3, 1], [3, 1, 2], [3, 2, 1]] as const;
export type ListingOrder = readonly [1 | 2 | 3, 1 | 2 | 3, 1 | 2 | 3];
export type AngleSigns = readonly [1 | -1, 1 | -1, 1 | -1];

export const ANGLE_UNITS = ['deg', 'rad'] as const;
export type AngleUnit = (typeof ANGLE_UNITS)[number];
export const MAPS = ['body-to-reference', 'reference-to-body'] as const;
export type Maps = (typeof MAPS)[number];
export const MOTIONS = ['intrinsic', 'extrinsic'] as const;
export type Motion = (typeof MOTIONS)[number];
export const ANGLE_RANGES = ['signed', 'positive'] as const;
export const SCALAR_POSITIONS = ['first', 'last'] as const;
export const QUATERNION_PRODUCTS = ['hamilton', 'shuster'] as const;
export const QUATERNION_SIGNS = ['any', 'scalar-non-negative', 'continuous'] as const;
export const MATRIX_LAYOUTS = ['row-major', 'column-major'] as const;
export const MRP_SHADOWS = ['inside', 'any'] as const;

interface BetweenAxes {
  readonly reference: ReferenceAxes;
  readonly body: BodyAxes;
}

/** Three angles; the rotations carry the reference axes onto the body axes. Number listed = sign × angle. */
export interface EulerConvention extends BetweenAxes {
  readonly representation: 'euler';
  readonly sequence: Sequence;
  readonly motion: Motion;
  readonly unit: AngleUnit;
  /** order[i] is the number (1, 2, 3) of the applied rotation whose angle stands i-th in the list. */
  readonly order: ListingOrder;
  /** Aligned with the applied order, not with the list. */
  readonly signs: AngleSigns;
  /** Binds output only: of the listed number of the first applied angle. */
  readonly range: (typeof ANGLE_RANGES)[number];
}

/** Four numbers. Hamilton, body-to-reference: v_ref = R(q) v_body, R(q) = (w² − v·v) I + 2 v vᵀ + 2 w [v×]. */
export interface QuaternionConvention extends BetweenAxes {
  readonly representation: 'quaternion';
  readonly scalar: (typeof SCALAR_POSITIONS)[number];
  readonly product: (typeof QUATERNION_PRODUCTS)[number];
  readonly maps: Maps;
  /** Binds output only. */
  readonly sign: (typeof QUATERNION_SIGNS)[number];
}

/** Nine numbers in layout order. Reference-to-body: v_body = M v_ref. */
export interface DcmConvention extends BetweenAxes {
  readonly representation: 'dcm';
  readonly maps: Maps;
  readonly layout: (typeof MATRIX_LAYOUTS)[number];
}

/** Three numbers: angle times unit axis, of the Hamilton quaternion (cos a/2, n sin a/2) with the same `maps`. */
export interface RotationVectorConvention extends BetweenAxes {
  readonly representation: 'rotation-vector';
  readonly maps: Maps;
  readonly unit: AngleUnit;
}

/** Four numbers: axis x, y, z, then angle. */
export interface AxisAngleConvention extends BetweenAxes {
  readonly representation: 'axis-angle';
  readonly maps: Maps;
  readonly unit: AngleUnit;
}

/** Modified Rodrigues parameters: n tan(a/4). */
export interface MrpConvention extends BetweenAxes {
  readonly representation: 'mrp';
  readonly maps: Maps;
  /** Binds output only; both come out with norm ≤ 1. */
  readonly shadow: (typeof MRP_SHADOWS)[number];
}

/** Gibbs (Rodrigues) vector: n tan(a/2). */
export interface GibbsConvention extends BetweenAxes {
  readonly representation: 'gibbs';
  readonly maps: Maps;
}

export type Convention =
  | EulerConvention
  | QuaternionConvention
  | DcmConvention
  | RotationVectorConvention
  | AxisAngleConvention
  | MrpConvention
  | GibbsConvention;

export const REPRESENTATIONS = ['euler', 'quaternion', 'dcm', 'rotation-vector', 'axis-angle', 'mrp', 'gibbs'] as const satisfies readonly Convention['representation'][];
export type Representation = Convention['representation'];

/** Count of numbers that one attitude takes in each representation. */
export const NUMBERS_PER_ATTITUDE: Readonly<Record<Representation, number>> = {
  euler: 3,
  quaternion: 4,
  dcm: 9,
  'rotation-vector': 3,
  'axis-angle': 4,
  mrp: 3,
  gibbs: 3,
};
