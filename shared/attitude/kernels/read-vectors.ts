import { reduceHalfLength } from '../arithmetic/large-angle.ts';
import { scratch as S } from '../arithmetic/scratch.ts';
import { sinCosDegrees, sinCosRadians } from '../arithmetic/sin-cos.gen.ts';
import { ANGLES, LENGTH, QUATERNION, SEED, SINES_COSINES, VECTOR } from '../arithmetic/slots.ts';
import type { AngleUnit } from '../convention.ts';
import { lengthOfVector, quaternionAboutVector, quaternionOfMrp } from './rotation.gen.ts';
import { FINE, REFUSED, type Reader } from './status.ts';

/** Half angles beyond this, in either unit, are reduced from the exact length. */
const MANY_TURNS = 4000;

const isFinite3 = (x: number, y: number, z: number): boolean => Math.abs(x) < Infinity && Math.abs(y) < Infinity && Math.abs(z) < Infinity;

/** Leaves (x, y, z) times a power of two at VECTOR, near size 1 where it is not; returns the power. */
function loadVector(x: number, y: number, z: number): number {
  const largest = Math.max(Math.abs(x), Math.abs(y), Math.abs(z));
  let scale = 1;
  if (largest > 0) {
    while (largest * scale > 2 ** 100) scale *= 2 ** -100;
    while (largest * scale < 2 ** -100) scale *= 2 ** 100;
  }
  S[VECTOR] = x * scale;
  S[VECTOR + 1] = y * scale;
  S[VECTOR + 2] = z * scale;
  return scale;
}

function identity(): void {
  S.fill(0, QUATERNION, QUATERNION + 8);
  S[QUATERNION] = 1;
}

/** Reads three numbers, angle times axis, as QUATERNION of norm 1. */
export function rotationVectorReader(unit: AngleUnit): Reader {
  const sinCos = unit === 'deg' ? sinCosDegrees : sinCosRadians;
  return (numbers, at) => {
    const x = numbers[at]!;
    const y = numbers[at + 1]!;
    const z = numbers[at + 2]!;
    if (!isFinite3(x, y, z)) return REFUSED;
    const half = 0.5 / loadVector(x, y, z);
    lengthOfVector();
    if (S[LENGTH] === 0) {
      identity();
      return FINE;
    }
    S[ANGLES] = S[LENGTH]! * half;
    S[ANGLES + 1] = S[LENGTH + 1]! * half;
    if (!(S[ANGLES]! < MANY_TURNS)) reduceHalfLength(x, y, z, unit, ANGLES);
    sinCos(ANGLES, SINES_COSINES);
    quaternionAboutVector();
    return FINE;
  };
}

/** Reads axis x, y, z (of any length) and angle as QUATERNION of norm 1. */
export function axisAngleReader(unit: AngleUnit): Reader {
  const sinCos = unit === 'deg' ? sinCosDegrees : sinCosRadians;
  return (numbers, at) => {
    const x = numbers[at]!;
    const y = numbers[at + 1]!;
    const z = numbers[at + 2]!;
    const angle = numbers[at + 3]!;
    if (!isFinite3(x, y, z) || !(Math.abs(angle) < Infinity)) return REFUSED;
    loadVector(x, y, z);
    lengthOfVector();
    if (S[LENGTH] === 0) {
      if (angle !== 0) return REFUSED;
      identity();
      return FINE;
    }
    S[ANGLES] = angle * 0.5;
    S[ANGLES + 1] = 0;
    sinCos(ANGLES, SINES_COSINES);
    quaternionAboutVector();
    return FINE;
  };
}

/** Reads modified Rodrigues parameters as QUATERNION, of any norm. */
export const readMrp: Reader = (numbers, at) => {
  const x = numbers[at]!;
  const y = numbers[at + 1]!;
  const z = numbers[at + 2]!;
  if (!isFinite3(x, y, z)) return REFUSED;
  loadHomogeneous(x, y, z);
  quaternionOfMrp();
  return FINE;
};

/** Reads a Gibbs vector as QUATERNION, of any norm. */
export const readGibbs: Reader = (numbers, at) => {
  const x = numbers[at]!;
  const y = numbers[at + 1]!;
  const z = numbers[at + 2]!;
  if (!isFinite3(x, y, z)) return REFUSED;
  loadHomogeneous(x, y, z);
  S.fill(0, QUATERNION, QUATERNION + 8);
  S[QUATERNION] = S[SEED]!;
  S[QUATERNION + 2] = S[VECTOR]!;
  S[QUATERNION + 4] = S[VECTOR + 1]!;
  S[QUATERNION + 6] = S[VECTOR + 2]!;
  return FINE;
};

/** Leaves t (x, y, z) at VECTOR and t at SEED, t being a power of two that brings a large vector near size 1. */
function loadHomogeneous(x: number, y: number, z: number): void {
  const largest = Math.max(Math.abs(x), Math.abs(y), Math.abs(z));
  let t = 1;
  while (largest * t > 2 ** 60) t *= 2 ** -60;
  while (largest * t > 2) t *= 0.5;
  S[SEED] = t;
  S[VECTOR] = x * t;
  S[VECTOR + 1] = y * t;
  S[VECTOR + 2] = z * t;
}
