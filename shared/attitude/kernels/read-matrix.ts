import { scratch as S } from '../arithmetic/scratch.ts';
import { DEFECT, DOUBLES, MATRIX, SEED } from '../arithmetic/slots.ts';
import type { ElementMap } from './frames.ts';
import { nearestRotation } from './nearest-rotation.ts';
import { quickNearestQuaternion } from './quick-rotation.gen.ts';
import { matrixOfQuaternion, nearestQuaternion, normaliseQuaternion } from './rotation.gen.ts';
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

/** Written out, since a loop over nine costs twice as much. */
export function loadMatrix({ elements: { index, sign } }: MatrixReading, numbers: Float64Array, at: number): void {
  S[DOUBLES] = sign[0]! * numbers[at + index[0]!]!;
  S[DOUBLES + 1] = sign[1]! * numbers[at + index[1]!]!;
  S[DOUBLES + 2] = sign[2]! * numbers[at + index[2]!]!;
  S[DOUBLES + 3] = sign[3]! * numbers[at + index[3]!]!;
  S[DOUBLES + 4] = sign[4]! * numbers[at + index[4]!]!;
  S[DOUBLES + 5] = sign[5]! * numbers[at + index[5]!]!;
  S[DOUBLES + 6] = sign[6]! * numbers[at + index[6]!]!;
  S[DOUBLES + 7] = sign[7]! * numbers[at + index[7]!]!;
  S[DOUBLES + 8] = sign[8]! * numbers[at + index[8]!]!;
}

/** FINE for a clean matrix, REPAIRED for one to be replaced by the nearest rotation (the defect at DEFECT), or REFUSED. */
export function judgeMatrix({ determinant, repair }: MatrixReading): number {
  const defect = orthogonalityDefect();
  S[DEFECT] = defect;
  if (defect <= REPORTED_DEFECT) return determinantIsPositive() === determinant > 0 ? FINE : REFUSED;
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

/** DOUBLES, a clean rotation, as QUATERNION of any norm. */
export function quaternionOfCleanMatrix(): void {
  seedQuaternion();
  nearestQuaternion();
}

/** SEED of DOUBLES by Shepperd's choice of pivot (1978, J. Guidance and Control 1(3)). */
function seedQuaternion(): void {
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
}

function seed(w: number, x: number, y: number, z: number): void {
  S[SEED] = w;
  S[SEED + 1] = x;
  S[SEED + 2] = y;
  S[SEED + 3] = z;
}

/** Up to this defect the quick kernel's seed of 26 bits is good enough. */
const QUICK_DEFECT = 1e-13;

/**
 * Reads a matrix as QUATERNION, by the nearest rotation throughout.
 * @param precision - "rounded": of norm 1, and only its nearest doubles; "pairs": of any norm.
 */
export function matrixAsQuaternion(reading: MatrixReading, precision: 'rounded' | 'pairs'): (numbers: Float64Array, at: number) => number {
  return (numbers, at) => {
    loadMatrix(reading, numbers, at);
    const status = judgeMatrix(reading);
    if (status === FINE) {
      seedQuaternion();
      if (precision === 'rounded' && S[DEFECT]! <= QUICK_DEFECT && quickNearestQuaternion()) return FINE;
      nearestQuaternion();
      if (precision === 'rounded') normaliseQuaternion();
    } else if (status === REPAIRED) nearestRotation();
    return status;
  };
}

/** Reads a matrix as MATRIX: a clean one exactly as it is given, another by the nearest rotation. */
export function matrixAsMatrix(reading: MatrixReading): (numbers: Float64Array, at: number) => number {
  return (numbers, at) => {
    loadMatrix(reading, numbers, at);
    copyDoubles();
    const status = judgeMatrix(reading);
    if (status === REPAIRED) {
      // The nearest orthogonal matrix to a reflection M is minus the nearest rotation to −M.
      if (reading.determinant < 0) negate(DOUBLES, 9);
      nearestRotation();
      matrixOfQuaternion();
      if (reading.determinant < 0) negate(MATRIX, 18);
    }
    return status;
  };
}

/** DOUBLES as MATRIX. */
function copyDoubles(): void {
  S[MATRIX] = S[DOUBLES]!;
  S[MATRIX + 1] = 0;
  S[MATRIX + 2] = S[DOUBLES + 1]!;
  S[MATRIX + 3] = 0;
  S[MATRIX + 4] = S[DOUBLES + 2]!;
  S[MATRIX + 5] = 0;
  S[MATRIX + 6] = S[DOUBLES + 3]!;
  S[MATRIX + 7] = 0;
  S[MATRIX + 8] = S[DOUBLES + 4]!;
  S[MATRIX + 9] = 0;
  S[MATRIX + 10] = S[DOUBLES + 5]!;
  S[MATRIX + 11] = 0;
  S[MATRIX + 12] = S[DOUBLES + 6]!;
  S[MATRIX + 13] = 0;
  S[MATRIX + 14] = S[DOUBLES + 7]!;
  S[MATRIX + 15] = 0;
  S[MATRIX + 16] = S[DOUBLES + 8]!;
  S[MATRIX + 17] = 0;
}

function negate(slot: number, count: number): void {
  for (let i = slot; i < slot + count; i++) S[i] = -S[i]!;
}
