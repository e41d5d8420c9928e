import { scratch } from '../arithmetic/scratch.ts';
import { sinCosDegrees, sinCosRadians } from '../arithmetic/sin-cos.gen.ts';
import { ANGLES, SINES_COSINES } from '../arithmetic/slots.ts';
import type { EulerConvention } from '../convention.ts';

type Vector = readonly [number, number, number];

/** The axes that the three angles turn about, as unit vectors in body axes, at one attitude. */
export interface TurningAxes {
  readonly first: Vector;
  readonly middle: Vector;
  readonly last: Vector;
  /** |cos| of the middle angle, |sin| where first = third axis; 0 at exact lock. */
  readonly cosine: number;
}

/**
 * Axes about which intrinsic angles turn, in the body axes: ω_body = θ̇1 u1 + θ̇2 u2 + θ̇3 u3.
 * For 3-2-1 this is p = φ̇ − ψ̇ sin θ, q = θ̇ cos φ + ψ̇ cos θ sin φ, r = ψ̇ cos θ cos φ − θ̇ sin φ.
 * u1 is a row of the attitude's matrix and u3 a body axis; u2 needs the last angle alone.
 * Source: Diebel 2006, Representing Attitude, sect. 5.2 (from memory), for every sequence.
 *
 * @param c - C between the angles' own axes, v_body = C v_ref.
 * @param intrinsic - sequence letters of the intrinsic order, as axis numbers.
 * @param lastAngle - of the last intrinsic rotation, in `unit`.
 */
export function turningAxes(c: Float64Array, [a, b, k]: Vector, middleAngle: number, lastAngle: number, unit: 'deg' | 'rad'): TurningAxes {
  const first: Vector = [c[a]!, c[3 + a]!, c[6 + a]!];
  const [s, cos] = sinCos(lastAngle, unit);
  // R_k(θ3)ᵀ e_b: e_b turned back about the last axis.
  const other = 3 - b - k;
  const cyclic = (b - k + 3) % 3 === 1 ? 1 : -1;
  const middle: [number, number, number] = [0, 0, 0];
  middle[b] = cos;
  middle[other] = -cyclic * s;
  const last: [number, number, number] = [0, 0, 0];
  last[k] = 1;
  const [sine, cosine] = sinCos(middleAngle, unit);
  return { first, middle, last, cosine: Math.abs(a === k ? sine : cosine) };
}

export const intrinsicAxes = ({ sequence, motion }: EulerConvention): [number, number, number] => {
  const axes = [...sequence].map((letter) => 'XYZ'.indexOf(letter)) as [number, number, number];
  return motion === 'extrinsic' ? [axes[2], axes[1], axes[0]] : axes;
};

/** ω_body of the rates of the three intrinsic angles. Exists at lock too. */
export function bodyOfAngleRates({ first, middle, last }: TurningAxes, [d1, d2, d3]: Vector): [number, number, number] {
  return [0, 1, 2].map((i) => d1 * first[i]! + d2 * middle[i]! + d3 * last[i]!) as [number, number, number];
}

/**
 * Rates of the three intrinsic angles of ω_body. NaN for the first and last at lock, where they do not exist; the
 * middle one always does.
 */
export function angleRatesOfBody({ first, middle, last, cosine }: TurningAxes, omega: Vector): [number, number, number] {
  const middleRate = dot(omega, middle);
  if (cosine === 0) return [NaN, middleRate, NaN];
  // Perpendicular to both others' plane: only the first axis has a part along it, and that part is ±cosine.
  const across: Vector = [middle[1] * last[2] - middle[2] * last[1], middle[2] * last[0] - middle[0] * last[2], middle[0] * last[1] - middle[1] * last[0]];
  const firstRate = dot(omega, across) / dot(first, across);
  return [firstRate, middleRate, dot(omega, last) - firstRate * dot(first, last)];
}

const dot = (u: Vector, v: Vector): number => u[0] * v[0] + u[1] * v[1] + u[2] * v[2];

/** Sine and cosine by the core's own functions, so that every engine gives the same bits. */
function sinCos(angle: number, unit: 'deg' | 'rad'): readonly [number, number] {
  scratch[ANGLES] = angle;
  scratch[ANGLES + 1] = 0;
  if (unit === 'deg') sinCosDegrees(ANGLES, SINES_COSINES);
  else sinCosRadians(ANGLES, SINES_COSINES);
  return [scratch[SINES_COSINES]!, scratch[SINES_COSINES + 2]!];
}
