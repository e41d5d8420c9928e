import { arcTangentDegrees, arcTangentRadians } from '../arithmetic/arc-tangent.gen.ts';
import { scratch as S } from '../arithmetic/scratch.ts';
import { LENGTH, POINTS, QUATERNION } from '../arithmetic/slots.ts';
import { DEGREES_PER_RADIAN } from '../arithmetic/tables.gen.ts';
import type { AngleUnit } from '../convention.ts';
import { multiply } from '../arithmetic/double-double.ts';
import { axisOfVectorPart, gibbsOfQuaternion, lengthOfVectorPart, mrpOfQuaternion, rotationVectorOfAngle } from './rotation.gen.ts';
import { FINE, NOT_REPRESENTABLE, type Writer } from './status.ts';
import { makeCanonical } from './write-quaternion.ts';

/** Vector parts below this share of the scalar part are scaled before they are squared; their angle is 2 |v|/w to the last bit. */
const TINY = 2 ** -300;
const LIFT = 2 ** 600;

const largestOfVectorPart = (): number => Math.max(Math.abs(S[QUATERNION + 2]!), Math.abs(S[QUATERNION + 4]!), Math.abs(S[QUATERNION + 6]!));

function liftVectorPart(): void {
  for (let i = QUATERNION + 2; i < QUATERNION + 8; i++) S[i]! *= LIFT;
}

/** Three pairs from POINTS on, as numbers. */
function writeThree(slot: number, numbers: Float64Array, at: number): void {
  numbers[at] = S[slot]! + 0;
  numbers[at + 1] = S[slot + 2]! + 0;
  numbers[at + 2] = S[slot + 4]! + 0;
}

/** Rotation vector of QUATERNION (any norm): v · 2 atan2(|v|, w)/|v|, of length in [0, π]. */
export function rotationVectorWriter(unit: AngleUnit, rounded: boolean): Writer {
  const arcTangent = unit === 'deg' ? arcTangentDegrees : arcTangentRadians;
  return (numbers, at) => {
    makeCanonical(rounded);
    const largest = largestOfVectorPart();
    if (largest < TINY * S[QUATERNION]!) {
      writeTinyVector(unit, numbers, at);
      return FINE;
    }
    lengthOfVectorPart();
    arcTangent(POINTS, POINTS);
    rotationVectorOfAngle();
    writeThree(POINTS, numbers, at);
    return FINE;
  };
}

/** 2 v/w, which is the rotation vector to far beyond the last bit. */
function writeTinyVector(unit: AngleUnit, numbers: Float64Array, at: number): void {
  liftVectorPart();
  gibbsOfQuaternion();
  for (let i = 0; i < 3; i++) {
    const [hi, lo] = [2 * S[POINTS + 2 * i]!, 2 * S[POINTS + 2 * i + 1]!];
    numbers[at + i] = (unit === 'deg' ? multiply([hi, lo], DEGREES_PER_RADIAN)[0] : hi) / LIFT + 0;
  }
}

/** Axis and angle of QUATERNION (any norm), the angle in [0, π]; the identity's axis is [1, 0, 0]. */
export function axisAngleWriter(unit: AngleUnit, rounded: boolean): Writer {
  const arcTangent = unit === 'deg' ? arcTangentDegrees : arcTangentRadians;
  return (numbers, at) => {
    makeCanonical(rounded);
    const largest = largestOfVectorPart();
    if (largest === 0) {
      numbers[at] = 1;
      numbers[at + 1] = 0;
      numbers[at + 2] = 0;
      numbers[at + 3] = 0;
      return FINE;
    }
    const tiny = largest < TINY * S[QUATERNION]!;
    if (tiny) liftVectorPart();
    lengthOfVectorPart();
    if (tiny) {
      // The angle is 2 |v|/w; the point is (|v| lifted, w), both far from the ends of the range.
      S[POINTS] = S[LENGTH]! / LIFT;
      S[POINTS + 1] = S[LENGTH + 1]! / LIFT;
    }
    arcTangent(POINTS, POINTS);
    axisOfVectorPart();
    writeThree(POINTS + 4, numbers, at);
    numbers[at + 3] = 2 * S[POINTS]!;
    return FINE;
  };
}

/** Modified Rodrigues parameters of QUATERNION (any norm): v/(|q| + w), of length at most 1. */
export function mrpWriter(rounded: boolean): Writer {
  return (numbers, at) => {
    makeCanonical(rounded);
    mrpOfQuaternion();
    writeThree(POINTS, numbers, at);
    return FINE;
  };
}

/** Gibbs vector of QUATERNION (any norm): v/w. A half turn has none. */
export function gibbsWriter(rounded: boolean): Writer {
  return (numbers, at) => {
    makeCanonical(rounded);
    if (S[QUATERNION] === 0) return NOT_REPRESENTABLE;
    gibbsOfQuaternion();
    writeThree(POINTS, numbers, at);
    return Math.abs(numbers[at]!) < Infinity && Math.abs(numbers[at + 1]!) < Infinity && Math.abs(numbers[at + 2]!) < Infinity ? FINE : NOT_REPRESENTABLE;
  };
}
