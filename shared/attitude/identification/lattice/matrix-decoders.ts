import { MAPS, MATRIX_LAYOUTS } from '../../convention.ts';
import type { Decoder, NumbersAre, Reader, Statement } from './decoder.ts';
import { writeRotation } from './rotation-of-quaternion.ts';
import { IDENTITY_TURN } from './turns.ts';

/** More departure from orthogonality than this, after scaling, and nine numbers are no attitude. */
const DEFECT_SLACK = 0.1;

/**
 * Nine numbers as a matrix, row by row, brought to the nearest rotation by Newton and Schulz's iteration
 * M ← M (3I − MᵀM) / 2, so that rounding of single elements is not taken for rotation. Determinant +1 is expected.
 */
function matrixReader(multiple: 0.5 | 1 | 2): Reader {
  return {
    width: 9,
    scalable: false,
    norm: (numbers) => Math.sqrt(squareOf(numbers, 0) / 3),
    read(numbers, count, _factor, m) {
      const scale = Math.sqrt(squareOf(numbers, 0) / 3);
      if (!(scale > 0)) return false;
      for (let i = 0; i < count; i++) {
        for (let k = 0; k < 9; k++) m[9 * i + k] = numbers[9 * i + k]! / scale;
        if (!orthonormalise(m, 9 * i)) return false;
        if (multiple === 0.5) square(m, 9 * i);
        else if (multiple === 2) root(m, 9 * i);
      }
      return true;
    },
  };
}

function squareOf(m: Float64Array, at: number): number {
  let sum = 0;
  for (let k = 0; k < 9; k++) sum += m[at + k]! ** 2;
  return sum;
}

/** In place. False where the matrix is too far from a rotation. */
function orthonormalise(m: Float64Array, at: number): boolean {
  for (let step = 0; ; step++) {
    const a = m[at]!, b = m[at + 1]!, c = m[at + 2]!, d = m[at + 3]!, e = m[at + 4]!, f = m[at + 5]!, g = m[at + 6]!, h = m[at + 7]!, k = m[at + 8]!;
    const xx = a * a + d * d + g * g - 1, yy = b * b + e * e + h * h - 1, zz = c * c + f * f + k * k - 1;
    const xy = a * b + d * e + g * h, xz = a * c + d * f + g * k, yz = b * c + e * f + h * k;
    const defect = Math.max(Math.abs(xx), Math.abs(yy), Math.abs(zz), Math.abs(xy), Math.abs(xz), Math.abs(yz));
    if (!(defect <= DEFECT_SLACK)) return false;
    if (defect < 1e-13 || step === 4) return true;
    for (let row = 0; row < 9; row += 3) {
      const x = m[at + row]!, y = m[at + row + 1]!, z = m[at + row + 2]!;
      m[at + row] = x - 0.5 * (x * xx + y * xy + z * xz);
      m[at + row + 1] = y - 0.5 * (x * xy + y * yy + z * yz);
      m[at + row + 2] = z - 0.5 * (x * xz + y * yz + z * zz);
    }
  }
}

function square(m: Float64Array, at: number): void {
  const n = m.slice(at, at + 9);
  for (let row = 0; row < 3; row++) for (let column = 0; column < 3; column++) {
    m[at + 3 * row + column] = n[3 * row]! * n[column]! + n[3 * row + 1]! * n[3 + column]! + n[3 * row + 2]! * n[6 + column]!;
  }
}

/** The rotation by half the angle, in [0, π/2]: √q ∝ (w + |q|, v), q with w ≥ 0 from the largest of its components. */
function root(m: Float64Array, at: number): void {
  const a = m[at]!, e = m[at + 4]!, k = m[at + 8]!;
  const trace = a + e + k;
  let w: number, x: number, y: number, z: number;
  const p = m[at + 7]! - m[at + 5]!, q = m[at + 2]! - m[at + 6]!, r = m[at + 3]! - m[at + 1]!;
  if (trace > 0) [w, x, y, z] = [1 + trace, p, q, r];
  else if (a >= e && a >= k) [w, x, y, z] = [p, 1 + a - e - k, m[at + 1]! + m[at + 3]!, m[at + 2]! + m[at + 6]!];
  else if (e >= k) [w, x, y, z] = [q, m[at + 1]! + m[at + 3]!, 1 + e - a - k, m[at + 5]! + m[at + 7]!];
  else [w, x, y, z] = [r, m[at + 2]! + m[at + 6]!, m[at + 5]! + m[at + 7]!, 1 + k - a - e];
  const s = w < 0 ? -1 : 1;
  writeRotation(s * w + Math.sqrt(w * w + x * x + y * y + z * z), s * x, s * y, s * z, m, at);
}

function decodersOf(reader: Reader, numbersAre?: NumbersAre): Decoder[] {
  return [false, true].map((transposed) => ({
    reader,
    transposed,
    // As it stands, row by row, a matrix is reference-to-body; either facet turned round transposes it.
    statements: MAPS.flatMap((maps) => MATRIX_LAYOUTS
      .filter((layout) => ((maps === 'body-to-reference') !== (layout === 'column-major')) === transposed)
      .map((layout): Statement => ({ facets: { representation: 'dcm', maps, layout }, ...(numbersAre ? { numbersAre } : {}), left: IDENTITY_TURN, right: IDENTITY_TURN }))),
  }));
}

export const MATRIX_DECODERS: readonly Decoder[] = decodersOf(matrixReader(1));
/** Only between sets of one handedness: half a reflection is nothing. */
export const MATRIX_POWER_DECODERS: readonly Decoder[] = [...decodersOf(matrixReader(0.5), 'half-angle'), ...decodersOf(matrixReader(2), 'double-angle')];
