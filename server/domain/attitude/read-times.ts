import { DomainError } from '../errors.ts';

/**
 * Times of a recording, s.
 * @throws DomainError `count-mismatch` where there is not one for each attitude, `invalid-field` where they do not increase.
 */
export function readTimes(times: readonly number[], count: number, attitudes: string): Float64Array {
  if (times.length !== count) {
    throw new DomainError('count-mismatch', `/times holds ${times.length} for ${count} attitudes.`, [{ pointer: '/times', message: `must hold one for each of the ${count} attitudes in ${attitudes}` }]);
  }
  const items = times.flatMap((time, index) => (index > 0 && !(time > times[index - 1]!) ? [{ pointer: `/times/${index}`, message: `is ${time}, not later than the one before it, ${times[index - 1]}` }] : []));
  if (items.length > 0) throw new DomainError('invalid-field', `${items[0]!.pointer} ${items[0]!.message}.`, items.slice(0, 100));
  return Float64Array.from(times);
}
