import type { Convention } from './convention.ts';
import type { AttitudeErrorCode } from './errors.ts';
import { matrixOfAngles, quaternionOfAngles, turnsOf } from './geometry/euler.ts';
import { determinant, nearestOrthogonal, orthogonalityDefect, transpose, type Matrix } from './geometry/matrix.ts';
import { conjugate, normalise, type Quaternion } from './geometry/quaternion.ts';
import { sinCos } from './geometry/trigonometry.ts';
import { determinantOf } from './relabelling.ts';

/** Defects up to here are rounding and are said nothing of; from here on they are repaired and reported. */
export const REPORTED_DEFECT = 1e-12;
/** Defects beyond this are refused unless repair is asked for. */
export const REFUSED_DEFECT = 1e-6;

/** What one attitude's numbers decode to, between the convention's own axes: v_ref = R v_body. */
export interface Decoded {
  /** Whichever the numbers state directly; the other is derived where it is needed. */
  readonly quaternion?: Quaternion;
  readonly matrix?: Matrix;
  /** Repaired norm or orthogonality defect above the reporting limit. */
  readonly defect?: number;
}

export interface Refusal {
  readonly code: AttitudeErrorCode;
  readonly message: string;
  readonly component?: number;
  readonly defect?: number;
}

export type Decoder = (numbers: Float64Array, offset: number) => Decoded | Refusal;

export const isRefusal = (result: Decoded | Refusal): result is Refusal => 'code' in result;

/** The reader of a convention's numbers. `repair` "nearest" takes the nearest rotation however far off the numbers are. */
export function decoderOf(convention: Convention, repair: 'none' | 'nearest'): Decoder {
  const decode = plainDecoderOf(convention, repair);
  return (numbers, offset) => {
    const width = decode.width;
    for (let i = 0; i < width; i++) {
      if (!Number.isFinite(numbers[offset + i])) return { code: 'not-finite', component: i, message: `number ${i} is ${numbers[offset + i]}; every number must be finite` };
    }
    return decode(numbers, offset);
  };
}

function plainDecoderOf(convention: Convention, repair: 'none' | 'nearest'): Decoder & { width: number } {
  switch (convention.representation) {
    case 'euler': {
      const extrinsic = convention.motion === 'extrinsic';
      const turns = turnsOf(extrinsic ? [...convention.sequence].reverse().join('') as typeof convention.sequence : convention.sequence);
      const { order, signs, unit } = convention;
      return Object.assign((n: Float64Array, at: number): Decoded => {
        const applied: [number, number, number] = [0, 0, 0];
        for (let i = 0; i < 3; i++) applied[order[i]! - 1] = n[at + i]! * signs[order[i]! - 1]!;
        const intrinsic: [number, number, number] = extrinsic ? [applied[2], applied[1], applied[0]] : applied;
        return { quaternion: quaternionOfAngles(turns, intrinsic, unit), matrix: matrixOfAngles(turns, intrinsic, unit) };
      }, { width: 3 });
    }
    case 'quaternion': {
      const scalar = convention.scalar === 'first' ? 0 : 3;
      const vector = convention.scalar === 'first' ? 1 : 0;
      const conjugated = (convention.product === 'hamilton') !== (convention.maps === 'body-to-reference');
      return Object.assign((n: Float64Array, at: number): Decoded | Refusal => {
        const given: Quaternion = [n[at + scalar]!, n[at + vector]!, n[at + vector + 1]!, n[at + vector + 2]!];
        if (given.every((component) => component === 0)) return { code: 'zero-norm', message: 'is zero: a quaternion of norm 0 has no direction', defect: 1 };
        const defect = Math.abs(Math.hypot(...given) - 1);
        if (defect > REFUSED_DEFECT && repair === 'none') {
          return { code: 'not-a-rotation', defect, message: `has norm ${Math.hypot(...given)}, off 1 by ${defect.toPrecision(3)}; more than ${REFUSED_DEFECT} is refused unless options.repair is "nearest"` };
        }
        const unit = normalise(given);
        return { quaternion: conjugated ? conjugate(unit) : unit, ...(defect > REPORTED_DEFECT ? { defect } : {}) };
      }, { width: 4 });
    }
    case 'dcm': {
      const sign = determinantOf(convention);
      const transposed = (convention.maps === 'reference-to-body') !== (convention.layout === 'column-major');
      return Object.assign((n: Float64Array, at: number): Decoded | Refusal => {
        const given = Array.from(n.subarray(at, at + 9)) as Matrix;
        const scale = Math.max(...given.map(Math.abs));
        const d = scale === 0 ? 0 : determinant(given.map((element) => element / scale) as Matrix);
        if (!(Math.abs(d) > 1e-12)) return { code: 'not-a-rotation', message: 'is singular: its determinant is 0 to rounding', defect: 1 };
        const defect = orthogonalityDefect(given);
        if (Math.sign(d) !== sign) {
          return { code: 'not-a-rotation', defect, message: `has a determinant of about ${determinant(given).toPrecision(6)}; between ${convention.reference} and ${convention.body} it must be ${sign}: this is a reflection` };
        }
        if (defect > REFUSED_DEFECT && repair === 'none') {
          return { code: 'not-a-rotation', defect, message: `is not orthogonal by ${defect.toPrecision(3)} (largest element of M Mᵀ − I); more than ${REFUSED_DEFECT} is refused unless options.repair is "nearest"` };
        }
        const matrix = defect > REPORTED_DEFECT ? nearestOrthogonal(given) : given;
        return { matrix: transposed ? transpose(matrix) : matrix, ...(defect > REPORTED_DEFECT ? { defect } : {}) };
      }, { width: 9 });
    }
    case 'rotation-vector': {
      const { unit, maps } = convention;
      return Object.assign((n: Float64Array, at: number): Decoded => {
        const angle = Math.hypot(n[at]!, n[at + 1]!, n[at + 2]!);
        return { quaternion: sensed(maps, aboutAxis(n, at, angle, angle, unit)) };
      }, { width: 3 });
    }
    case 'axis-angle': {
      const { unit, maps } = convention;
      return Object.assign((n: Float64Array, at: number): Decoded | Refusal => {
        const length = Math.hypot(n[at]!, n[at + 1]!, n[at + 2]!);
        if (length === 0 && n[at + 3] !== 0) return { code: 'zero-norm', message: `has a zero axis with the angle ${n[at + 3]}; a zero axis may only stand with angle 0` };
        return { quaternion: sensed(maps, aboutAxis(n, at, length, n[at + 3]!, unit)) };
      }, { width: 4 });
    }
    case 'mrp':
      return Object.assign((n: Float64Array, at: number): Decoded => {
        const square = n[at]! ** 2 + n[at + 1]! ** 2 + n[at + 2]! ** 2;
        const q: Quaternion = square > 1e300 ? [-1, 0, 0, 0] : [1 - square, 2 * n[at]!, 2 * n[at + 1]!, 2 * n[at + 2]!];
        return { quaternion: sensed(convention.maps, normalise(q)) };
      }, { width: 3 });
    case 'gibbs':
      return Object.assign((n: Float64Array, at: number): Decoded => ({ quaternion: sensed(convention.maps, normalise([1, n[at]!, n[at + 1]!, n[at + 2]!])) }), { width: 3 });
  }
}

const sensed = (maps: 'body-to-reference' | 'reference-to-body', q: Quaternion): Quaternion => (maps === 'body-to-reference' ? q : conjugate(q));

function aboutAxis(n: Float64Array, at: number, length: number, angle: number, unit: 'deg' | 'rad'): Quaternion {
  if (length === 0) return [1, 0, 0, 0];
  const [s, c] = sinCos(angle / 2, unit);
  return [c, (n[at]! / length) * s, (n[at + 1]! / length) * s, (n[at + 2]! / length) * s];
}
