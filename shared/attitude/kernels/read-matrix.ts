import { scratch as S } from '../arithmetic/scratch.ts';
import { DEFECT, DOUBLES, MATRIX, SEED } from '../arithmetic/slots.ts';
import type { ElementMap } from './frames.ts';
import { nearestRotation } from './nearest-rotation.ts';
import { matrixOfQuaternion, nearestQuaternion } from './rotation.gen.ts';
import { FINE, REFUSED, REFUSED_DEFECT, REPAIRED, REPORTED_DEFECT } from './status.ts';

/**
 * Reads nine numbers as DOUBLES, moved and signed as the map says.
 * @param determinant - the sign that the mapped matrix' determinant must have.
 */
export interface MatrixReading {
  readonly elements: ElementMap;
  readonly determinant: 1 | -1;
  readonly repair: 'none' | 'nearest';
}

/** Determinants are taken of the matrix divided by its largest element; what stays below this is singular to rounding. */
export const SINGULAR = 1e-12;

/** Largest element of |M Mᵀ − I| of DOUBLES, in plain double precision; NaN where an element is. */
export function orthogonalityDefect(): number {
  const a = S[DOUBLES]!;
  const b = S[DOUBLES + 1]!;
  const c = S[DOUBLES + 2]!;
  const d = S[DOUBLES + 3]!;
  const e = S[DOUBLES + 4]!;
  const f = S[DOUBLES + 5]!;
  const g = S[DOUBLES + 6]!;
  const h = S[DOUBLES + 7]!;
  const i = S[DOUBLES + 8]!;
  return Math.max(
    Math.abs(a * a + b * b + c * c - 1), Math.abs(d * d + e * e + f * f - 1), Math.abs(g * g + h * h + i * i - 1),
    Math.abs(a * d + b * e + c * f), Math.abs(a * g + b * h + c * i), Math.abs(d * g + e * h + f * i),
  );
}

/** Determinant of DOUBLES, each element divided by `scale`. */
export function scaledDeterminant(scale: number): number {
  const [a, b, c, d, e, f, g, h, i] = Array.from(S.subarray(DOUBLES, DOUBLES + 9), (element) => element / scale) as [number, number, number, number, number, number, number, number, number];
  return a * (e * i - f * h) - b * (d * i - f * g) + c * (d * h - e * g);
}

/** Plain determinant of a matrix known to be near a rotation or a reflection. */
function determinantIsPositive(): boolean {
  return S[DOUBLES]! * (S[DOUBLES + 4]! * S[DOUBLES + 8]! - S[DOUBLES + 5]! * S[DOUBLES + 7]!)
    - S[DOUBLES + 1]! * (S[DOUBLES + 3]! * S[DOUBLES + 8]! - S[DOUBLES + 5]! * S[DOUBLES + 6]!)
    + S[DOUBLES + 2]! * (S[DOUBLES + 3]! * S[DOUBLES + 7]! - S[DOUBLES + 4]! * S[DOUBLES + 6]!) > 0;
}

export function loadMatrix({ elements: { index, sign } }: MatrixReading, numbers: Float64Array, at: number): void {
  for (let k = 0; k < 9; k++) S[DOUBLES + k] = sign[k]! * numbers[at + index[k]!]!;
}

/** FINE for a clean matrix, REPAIRED for one to be replaced by the nearest rotation (the defect at DEFECT), or REFUSED. */
export function judgeMatrix({ determinant, repair }: MatrixReading): number {
  const defect = orthogonalityDefect();
  if (defect <= REPORTED_DEFECT) return determinantIsPositive() === determinant > 0 ? FINE : REFUSED;
  S[DEFECT] = defect;
  if (!(defect <= REFUSED_DEFECT) && repair === 'none') return REFUSED;
  const largest = largestElement();
  if (!(largest > 0 && largest < Infinity)) return REFUSED;
  const d = scaledDeterminant(largest);
  return Math.abs(d) > SINGULAR && d > 0 === determinant > 0 ? REPAIRED : REFUSED;
}

/** Largest of |DOUBLES|; NaN where one is. */
export function largestElement(): number {
  let largest = 0;
  for (let k = 0; k < 9; k++) largest = Math.max(largest, Math.abs(S[DOUBLES + k]!));
  return largest;
}

/** DOUBLES, a clean rotation, as QUATERNION. Shepperd's pivot (1978, J. Guidance and Control 1(3)) gives the seed. */
export function quaternionOfCleanMatrix(): void {
  const m00 = S[DOUBLES]!;
  const m11 = S[DOUBLES + 4]!;
  const m22 = S[DOUBLES + 8]!;
  const trace = m00 + m11 + m22;
  const dx = S[DOUBLES + 7]! - S[DOUBLES + 5]!;
  const dy = S[DOUBLES + 2]! - S[DOUBLES + 6]!;
  const dz = S[DOUBLES + 3]! - S[DOUBLES + 1]!;
  if (trace >= m00 && trace >= m11 && trace >= m22) seed(1 + trace, dx, dy, dz);
  else if (m00 >= m11 && m00 >= m22) seed(dx, 1 + m00 - m11 - m22, S[DOUBLES + 1]! + S[DOUBLES + 3]!, S[DOUBLES + 2]! + S[DOUBLES + 6]!);
  else if (m11 >= m22) seed(dy, S[DOUBLES + 1]! + S[DOUBLES + 3]!, 1 - m00 + m11 - m22, S[DOUBLES + 5]! + S[DOUBLES + 7]!);
  else seed(dz, S[DOUBLES + 2]! + S[DOUBLES + 6]!, S[DOUBLES + 5]! + S[DOUBLES + 7]!, 1 - m00 - m11 + m22);
  nearestQuaternion();
}

function seed(w: number, x: number, y: number, z: number): void {
  S[SEED] = w;
  S[SEED + 1] = x;
  S[SEED + 2] = y;
  S[SEED + 3] = z;
}

/** Reads a matrix as QUATERNION (of any norm), by the nearest rotation throughout. */
export function matrixAsQuaternion(reading: MatrixReading): (numbers: Float64Array, at: number) => number {
  return (numbers, at) => {
    loadMatrix(reading, numbers, at);
    const status = judgeMatrix(reading);
    if (status === FINE) quaternionOfCleanMatrix();
    else if (status === REPAIRED) nearestRotation();
    return status;
  };
}

/** Reads a matrix as MATRIX: a clean one exactly as it is given, another by the nearest rotation. */
export function matrixAsMatrix(reading: MatrixReading): (numbers: Float64Array, at: number) => number {
  return (numbers, at) => {
    loadMatrix(reading, numbers, at);
    const status = judgeMatrix(reading);
    if (status === REPAIRED) {
      // The nearest orthogonal matrix to a reflection M is minus the nearest rotation to −M.
      if (reading.determinant < 0) negate(DOUBLES, 9);
      nearestRotation();
      matrixOfQuaternion();
      if (reading.determinant < 0) negate(MATRIX, 18);
    } else {
      for (let k = 0; k < 9; k++) {
        S[MATRIX + 2 * k] = S[DOUBLES + k]!;
        S[MATRIX + 2 * k + 1] = 0;
      }
    }
    return status;
  };
}

function negate(slot: number, count: number): void {
  for (let i = slot; i < slot + count; i++) S[i] = -S[i]!;
}
