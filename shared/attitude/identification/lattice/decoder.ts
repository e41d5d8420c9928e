import type { DcmConvention, AxisAngleConvention, EulerConvention, GibbsConvention, MrpConvention, QuaternionConvention, RotationVectorConvention } from '../../convention.ts';

/** What a box may have listed instead of what its representation says: the numbers of half or twice the rotation, or only the vector part of the quaternion. */
export type NumbersAre = 'half-angle' | 'double-angle' | 'vector-part';

type WithoutAxes<T> = Omit<T, 'reference' | 'body'>;

/** Every facet but the axis sets. */
export type Facets =
  | WithoutAxes<EulerConvention>
  | WithoutAxes<QuaternionConvention>
  | WithoutAxes<DcmConvention>
  | WithoutAxes<RotationVectorConvention>
  | WithoutAxes<AxisAngleConvention>
  | WithoutAxes<MrpConvention>
  | WithoutAxes<GibbsConvention>;

/**
 * One way to say what a decoder does. The component matrix by these facets is Q_b M Q_rᵀ for every attitude, with M the
 * decoder's and Q_b, Q_r the turns `left` and `right`: so the same numbers are meant by these facets with axis sets
 * relabelled by the two turns.
 */
export interface Statement {
  readonly facets: Facets;
  readonly numbersAre?: NumbersAre;
  readonly left: number;
  readonly right: number;
}

/**
 * Reads numbers as matrices, nine a sample, row by row. Plain double arithmetic and the engine's own sine: nothing here
 * is decided more finely than the noise floor of 1e-6 rad.
 */
export interface Reader {
  readonly width: 3 | 4 | 9;
  /** Whether numbers times a factor are still an attitude, another one: what makes a scale of the numbers observable. */
  readonly scalable: boolean;
  /** Where a common factor changes no attitude: the factor, from the first sample. */
  norm?(numbers: Float64Array): number;
  /**
   * @param factor - what every number (of axis-angle: the angle) is multiplied by first.
   * @returns false where the numbers cannot be read this way (a vector part longer than 1, an axis that is no unit vector).
   */
  read(numbers: Float64Array, count: number, factor: number, matrices: Float64Array): boolean;
}

/** A reader, or its transpose, with everything it may be called. */
export interface Decoder {
  readonly reader: Reader;
  readonly transposed: boolean;
  readonly statements: readonly Statement[];
}
