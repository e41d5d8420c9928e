import type { Convention, DcmConvention } from '../convention.ts';
import { createConverter } from '../converter.ts';
import { AttitudeError } from '../errors.ts';
import { createRateConverter } from '../rates/rate-converter.ts';
import { refuseOutOfRange } from '../refuse-out-of-range.ts';
import type { Rate } from '../rates/rate.ts';

export type Side = 'reference' | 'body';

/** Vectors with the attitudes at which they stand, flat: three components a vector. */
export interface VectorsAt {
  readonly attitudes: Float64Array;
  readonly vectors: Float64Array;
  /** How the vectors change as seen from the frame they are given in, with the angular velocity, in the form of `rate`. */
  readonly change?: { readonly derivatives: Float64Array; readonly rate: Rate; readonly rates: Float64Array };
}

export interface ResolvedVectors {
  readonly vectors: Float64Array;
  /** How they change as seen from the frame they are resolved in; null where no change was given. */
  readonly derivatives: Float64Array | null;
}

/**
 * Resolves vectors between the reference axes and the body axes of a convention, and their derivatives by the transport
 * theorem: with ω the angular velocity of the body relative to the reference,
 *
 *   (dv/dt as seen from the reference) = (dv/dt as seen from the body) + ω × v,
 *
 * each resolved in the axes it is seen from. Source: Goldstein, Classical Mechanics, sect. 4.9 (from memory).
 * With C between the axes as they stand, v_body = C v_ref, that is v̇_body = C v̇_ref − [ω×] v_body with [ω×] = C Ċᵀ,
 * between left-handed sets too.
 *
 * Accuracy: plain double precision on correctly rounded matrices: a few units in the last place of |v|, and of |ω| |v|.
 *
 * @param from - the side whose axes the vectors are given in; they come out in the other one's.
 * @throws AttitudeError `count-mismatch`, `not-finite`, `out-of-range`, and as createConverter and createRateConverter.
 */
export function resolveVectors(attitude: Convention, from: Side, { attitudes, vectors, change }: VectorsAt): ResolvedVectors {
  const components: DcmConvention = { representation: 'dcm', reference: attitude.reference, body: attitude.body, maps: 'reference-to-body', layout: 'row-major' };
  const matrices = createConverter(attitude, components).convert(attitudes);
  const count = matrices.length / 9;
  for (const given of [vectors, ...(change ? [change.derivatives] : [])]) {
    if (given.length !== 3 * count) throw new AttitudeError('count-mismatch', `${given.length} numbers are not three for each of ${count} attitudes.`);
    refuseOutOfRange(given, 3, 'Vector');
  }
  const omegas = change ? createRateConverter(attitude, change.rate, { rate: 'body', unit: 'rad/s' }).convert(attitudes, change.rates).rates : null;
  const resolved = new Float64Array(3 * count);
  const derivatives = change ? new Float64Array(3 * count) : null;
  for (let i = 0; i < count; i++) {
    const c = matrices.subarray(9 * i, 9 * i + 9);
    const v = vectors.subarray(3 * i, 3 * i + 3);
    const out = resolved.subarray(3 * i, 3 * i + 3);
    (from === 'reference' ? toBody : toReference)(c, v, out);
    if (!change) continue;
    const dv = change.derivatives.subarray(3 * i, 3 * i + 3);
    const dOut = derivatives!.subarray(3 * i, 3 * i + 3);
    const omega = omegas!.subarray(3 * i, 3 * i + 3);
    if (from === 'reference') {
      const turning = cross(omega, out);
      toBody(c, dv, dOut);
      for (let k = 0; k < 3; k++) dOut[k]! -= turning[k]!;
    } else {
      const turning = cross(omega, v);
      toReference(c, [0, 1, 2].map((k) => dv[k]! + turning[k]!), dOut);
    }
  }
  // Nobody means −0.
  for (const numbers of [resolved, ...(derivatives ? [derivatives] : [])]) for (let k = 0; k < numbers.length; k++) numbers[k]! += 0;
  return { vectors: resolved, derivatives };
}

type Three = ArrayLike<number>;

function toBody(c: Three, v: Three, out: Float64Array): void {
  for (let k = 0; k < 3; k++) out[k] = c[3 * k]! * v[0]! + c[3 * k + 1]! * v[1]! + c[3 * k + 2]! * v[2]!;
}

function toReference(c: Three, v: Three, out: Float64Array): void {
  for (let k = 0; k < 3; k++) out[k] = c[k]! * v[0]! + c[3 + k]! * v[1]! + c[6 + k]! * v[2]!;
}

const cross = (a: Three, b: Three): [number, number, number] => [a[1]! * b[2]! - a[2]! * b[1]!, a[2]! * b[0]! - a[0]! * b[2]!, a[0]! * b[1]! - a[1]! * b[0]!];
