import { isNamedFrame } from '../axes.ts';
import type { AngleUnit, Convention, DcmConvention, Representation } from '../convention.ts';
import { createConverter } from '../converter.ts';
import { AttitudeError } from '../errors.ts';
import { assemble } from './assemble.ts';
import { Criteria } from './fit/criteria.ts';
import { ReferenceRecording } from './fit/motion.ts';
import type { Identification } from './identification.ts';
import { decodersFor } from './lattice/decoders.ts';
import { DecoderSearch } from './search/decoder-search.ts';

export interface AttitudeIdentificationInput {
  /** Attitudes that are trusted, flat, as their convention lists them. */
  readonly reference: { readonly convention: Convention; readonly attitudes: Float64Array };
  /** The same attitudes as a box listed them, flat: 3, 4 or 9 numbers each. What it claims to list is not believed. */
  readonly observed: { readonly representation: Representation; readonly numbers: Float64Array; readonly stated?: Convention };
  /** s, increasing; without them no lag is looked for. */
  readonly times?: Float64Array;
  /** Standard deviation of each component of the error rotation vector; 0 means exact, which is taken as 1e-6 rad. */
  readonly noise: { readonly angle: number; readonly unit: AngleUnit };
}

const PER_UNIT: Readonly<Record<AngleUnit, number>> = { deg: Math.PI / 180, rad: 1 };

/**
 * Finds every convention that the numbers of a box may follow.
 *
 * Tried: all Euler sequences, motions, listing orders and signs in either unit; quaternions with either scalar, product
 * and sense; matrices in either sense and layout; rotation vectors, axis and angle, modified Rodrigues parameters, Gibbs
 * vectors, vector parts, and the numbers of half or twice the rotation; each with all 48 × 48 pairs of axis sets; then a
 * constant offset on either side or both, a time lag, and a scale of the numbers.
 *
 * @throws AttitudeError `count-mismatch`, `not-finite`, `unrelated-frames`, and as createConverter does for the reference.
 */
export function identifyAttitudes(input: AttitudeIdentificationInput): Identification {
  const { reference, observed, noise } = input;
  const { stated } = observed;
  const frame = isNamedFrame(reference.convention.reference) ? reference.convention.reference : null;
  if (stated && (frame !== null || isNamedFrame(stated.reference)) && stated.reference !== frame) {
    throw new AttitudeError('unrelated-frames', `${reference.convention.reference} and ${stated.reference} cannot be related without a position or an epoch.`);
  }
  const standard: DcmConvention = { representation: 'dcm', reference: frame ?? 'NED', body: 'FRD', maps: 'reference-to-body', layout: 'row-major' };
  const matrices = createConverter(reference.convention, standard).convert(reference.attitudes);
  const count = matrices.length / 9;
  const width = widthOf(observed.numbers, count);
  if (input.times && input.times.length !== count) throw new AttitudeError('count-mismatch', `${input.times.length} times do not match ${count} attitudes.`);
  refuseNonFinite(observed.numbers, width);

  const { numbers, mirrored } = properMatrices(observed.numbers, width);
  const sigma = noise.angle * PER_UNIT[noise.unit];
  const decoderSearch = new DecoderSearch({
    numbers, width, sigma,
    decoders: decodersFor(width, mirrored),
    recording: new ReferenceRecording(matrices, input.times ?? null),
    criteria: new Criteria(sigma),
  });
  return assemble(decoderSearch, {
    claim: { stated: stated ?? null, representation: observed.representation, frame, mirrored },
    reference: reference.convention, standard, unit: noise.unit,
  });
}

function widthOf(numbers: Float64Array, count: number): 3 | 4 | 9 {
  const width = numbers.length / count;
  if (count > 0 && (width === 3 || width === 4 || width === 9)) return width;
  throw new AttitudeError('count-mismatch', count === 0 ? 'No attitudes were given.' : `${numbers.length} numbers are not 3, 4 or 9 for each of ${count} attitudes.`);
}

function refuseNonFinite(numbers: Float64Array, width: number): void {
  const bad = numbers.findIndex((number) => !Number.isFinite(number));
  if (bad < 0) return;
  throw new AttitudeError('not-finite', `Observed attitude ${Math.floor(bad / width)} has a number that is not finite.`, [{ index: Math.floor(bad / width), component: bad % width, message: `number ${bad % width} is ${numbers[bad]}; every number must be finite` }]);
}

/** Matrices of determinant −1, between sets that differ in handedness, are read as their negatives. */
function properMatrices(numbers: Float64Array, width: number): { readonly numbers: Float64Array; readonly mirrored: boolean } {
  if (width !== 9) return { numbers, mirrored: false };
  const [a, b, c, d, e, f, g, h, k] = numbers as unknown as [number, number, number, number, number, number, number, number, number];
  const mirrored = a * (e * k - f * h) - b * (d * k - f * g) + c * (d * h - e * g) < 0;
  return mirrored ? { numbers: numbers.map((number) => -number), mirrored } : { numbers, mirrored };
}
