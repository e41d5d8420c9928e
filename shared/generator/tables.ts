import { arcTangent, divide, fromDouble, leadingBits, multiply, ONE, PI, sine, toDouble, toPair } from './fixed-point.ts';

/** Steps of the sine table to a right angle: 15/128° each, an exact double that divides 30°, 45° and 90°. */
export const STEPS_PER_RIGHT_ANGLE = 768;
/** Steps of the arctangent table from 0 to 1. */
export const TANGENT_STEPS = 256;

const STEP = PI / BigInt(2 * STEPS_PER_RIGHT_ANGLE);
const DEGREES = (radians: bigint): bigint => divide(radians * 180n, PI);

const list = (numbers: readonly number[], perLine: number): string => {
  const lines: string[] = [];
  for (let i = 0; i < numbers.length; i += perLine) lines.push(`  ${numbers.slice(i, i + perLine).join(', ')},`);
  return `[\n${lines.join('\n')}\n]`;
};

const pair = (x: bigint): string => `[${toPair(x).join(', ')}]`;

/** The source text of shared/attitude/arithmetic/tables.gen.ts. */
export function tablesSource(): string {
  const sines: number[] = [];
  for (let j = 0; j <= STEPS_PER_RIGHT_ANGLE; j++) {
    // The series' last units would otherwise blur the values that are doubles.
    const exact = j === 0 ? 0n : j * 3 === STEPS_PER_RIGHT_ANGLE ? ONE / 2n : j === STEPS_PER_RIGHT_ANGLE ? ONE : sine(STEP * BigInt(j));
    sines.push(...toPair(exact));
  }
  const arcsRadians: number[] = [];
  const arcsDegrees: number[] = [];
  for (let k = 0; k <= TANGENT_STEPS; k++) {
    const arc = k === TANGENT_STEPS ? PI / 4n : arcTangent((ONE * BigInt(k)) / BigInt(TANGENT_STEPS));
    arcsRadians.push(...toPair(arc));
    arcsDegrees.push(...toPair(k === TANGENT_STEPS ? 45n * ONE : DEGREES(arc)));
  }

  const first = leadingBits(STEP, 30);
  const second = leadingBits(STEP - fromDouble(first), 30);
  const third = leadingBits(STEP - fromDouble(first) - fromDouble(second), 30);
  const fourth = toDouble(STEP - fromDouble(first) - fromDouble(second) - fromDouble(third));

  return `// Written by shared/generator/write.ts; see shared/generator/tables.ts for the derivation. Do not edit.

/** Steps of the sine table to a right angle: 15/128° each. */
export const STEPS_PER_RIGHT_ANGLE = ${STEPS_PER_RIGHT_ANGLE};
/** Steps of the arctangent table from tangent 0 to 1. */
export const TANGENT_STEPS = ${TANGENT_STEPS};

/** π/1536, one step, in three parts of 30 bits and a rest: k times each part is exact for |k| < 2^23. */
export const STEP_PARTS = [${[first, second, third, fourth].join(', ')}] as const;

/** Double-double constants: the nearest double and the nearest double to the rest. */
export const HALF_PI = ${pair(PI / 2n)} as const;
export const PI = ${pair(PI)} as const;
export const TWO_PI = ${pair(2n * PI)} as const;
export const RADIANS_PER_DEGREE = ${pair(PI / 180n)} as const;
export const DEGREES_PER_RADIAN = ${pair(divide(180n * ONE, PI))} as const;

/** sin(j π/1536), j = 0 … 768, as pairs hi, lo. */
export const SINES: readonly number[] = ${list(sines, 4)};

/** atan(k/256) in radians, k = 0 … 256, as pairs hi, lo. */
export const ARC_TANGENTS_RADIANS: readonly number[] = ${list(arcsRadians, 4)};

/** atan(k/256) in degrees, k = 0 … 256, as pairs hi, lo. */
export const ARC_TANGENTS_DEGREES: readonly number[] = ${list(arcsDegrees, 4)};
`;
}

/** π/180 and 180/π as pairs, for the kernels that have them as literals. */
export const RADIANS_PER_DEGREE = toPair(PI / 180n);
export const DEGREES_PER_RADIAN = toPair(divide(180n * ONE, PI));
export const ROOT_HALF = toPair(multiply(sine(PI / 4n), ONE));
