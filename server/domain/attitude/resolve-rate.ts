import type { RateReference } from '#shared/api/rates.ts';
import type { Convention, EulerConvention } from '#shared/attitude/convention.ts';
import { rateFits, type Rate } from '#shared/attitude/rates/rate.ts';
import { resolveConvention } from '../conventions/resolve-convention.ts';
import { DomainError } from '../errors.ts';

/**
 * The rate that a body names, with its angles.
 * @throws DomainError `missing-facet` where Euler rates lack their angles, `invalid-facet` where a rate does not fit its attitude.
 */
export function resolveRate(reference: RateReference, attitude: Convention, pointer: string): Rate {
  if (reference.rate !== 'euler') {
    if (!rateFits(attitude, reference)) {
      const message = `is "${reference.rate}", the derivative of the attitude's own numbers, but the attitude is given as "${attitude.representation}"`;
      throw new DomainError('invalid-facet', `${pointer}/rate ${message}.`, [{ pointer: `${pointer}/rate`, message }]);
    }
    return reference;
  }
  const angles = reference.angles === undefined ? attitude : resolveConvention(reference.angles, `${pointer}/angles`);
  if (angles.representation === 'euler') return { rate: 'euler', unit: reference.unit, angles: angles satisfies EulerConvention };
  const missing = reference.angles === undefined;
  const message = missing
    ? `is missing; it must be the Euler convention whose angles are meant, since the attitude is given as "${attitude.representation}"`
    : `has the representation "${angles.representation}"; it must be "euler"`;
  throw new DomainError(missing ? 'missing-facet' : 'invalid-facet', `${pointer}/angles ${message}.`, [{ pointer: `${pointer}/angles`, message }]);
}
