import { createConverter } from '../converter.ts';
import type { DcmConvention } from '../convention.ts';

const MATRIX: DcmConvention = { representation: 'dcm', reference: 'NED', body: 'FRD', maps: 'reference-to-body', layout: 'row-major' };

/**
 * The rotation matrix nearest to a matrix in the Frobenius norm: the orthogonal factor of its polar decomposition.
 *
 * @param matrix - nine numbers row by row, with a positive determinant.
 * @returns nine numbers row by row. Accuracy: correctly rounded, as the converter.
 * @throws AttitudeError `not-finite`; `not-a-rotation` for a singular matrix or a reflection.
 */
export function nearestRotation(matrix: Float64Array): Float64Array {
  return createConverter(MATRIX, MATRIX, { repair: 'nearest' }).convert(matrix);
}
