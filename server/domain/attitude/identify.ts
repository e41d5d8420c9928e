import type { IdentificationDocument, IdentifyInput } from '#shared/api/identify.ts';
import { isNamedFrame } from '#shared/attitude/axes.ts';
import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import type { Identifier } from '#server/identification/identifier.ts';
import { resolveConvention } from '../conventions/resolve-convention.ts';
import { DomainError } from '../errors.ts';
import type { Meter } from '../meter.ts';
import { readAttitudes, readRows } from './read-attitudes.ts';
import { readTimes } from './read-times.ts';
import { pointingInto } from './refuse-attitudes.ts';

export interface IdentifyContext {
  readonly identifier: Pick<Identifier, 'identify'>;
}

/** Finds every convention that the observed numbers may follow; nothing observed is believed but the numbers. */
export async function identify({ identifier }: IdentifyContext, request: IdentifyInput, meter: Meter): Promise<IdentificationDocument> {
  const { reference, observed, times, noise } = request;
  const count = reference.attitudes.length;
  meter.spend(count, '/reference/attitudes');
  const convention = resolveConvention(reference.convention, '/reference/convention');
  const stated = observed.stated === undefined ? null : resolveConvention(observed.stated, '/observed/stated');
  if (stated) refuseOtherFrame(convention, stated);
  const attitudes = readAttitudes(reference.attitudes, convention, '/reference/attitudes');
  // The engine converts them again; here only what is wrong with them is found, with its place in the body.
  pointingInto('/reference/attitudes', () => createConverter(convention, convention).convert(attitudes));
  if (observed.numbers.length !== count) {
    throw new DomainError('count-mismatch', `/observed/numbers holds ${observed.numbers.length} rows for ${count} reference attitudes.`, [{ pointer: '/observed/numbers', message: `must hold one row for each of the ${count} attitudes in /reference/attitudes` }]);
  }
  const identification = await identifier.identify({
    reference: { convention, attitudes },
    observed: { representation: observed.representation, numbers: readObserved(observed.numbers), ...(stated ? { stated } : {}) },
    ...(times ? { times: readTimes(times, count, '/reference/attitudes') } : {}),
    noise,
  });
  return identification as unknown as IdentificationDocument;
}

/** 3, 4 or 9 numbers an attitude, as the first one has. */
function readObserved(rows: readonly unknown[]): Float64Array {
  const [first] = rows;
  const nested = Array.isArray(first) && first.length === 3 && first.every(Array.isArray);
  const width = nested ? 9 : Array.isArray(first) ? first.length : 0;
  if (width !== 3 && width !== 4 && width !== 9) {
    const message = Array.isArray(first) ? `has ${width} numbers; an attitude is listed by 3, 4 or 9` : 'must be an array of 3, 4 or 9 numbers';
    throw new DomainError('count-mismatch', `/observed/numbers/0 ${message}.`, [{ pointer: '/observed/numbers/0', message }]);
  }
  return readRows(rows, { width, mayNest: width === 9, taker: 'each attitude, as the first one,', pointer: '/observed/numbers', within: '' });
}

/** Local-level axes can be relabelled into one another; a named frame only be itself. */
function refuseOtherFrame(reference: Convention, stated: Convention): void {
  if (!isNamedFrame(reference.reference) && !isNamedFrame(stated.reference)) return;
  if (reference.reference === stated.reference) return;
  const message = `is ${stated.reference}, which cannot be related to the reference's ${reference.reference} without a position or an epoch`;
  throw new DomainError('unrelated-frames', `/observed/stated/reference ${message}.`, [{ pointer: '/observed/stated/reference', message }]);
}
