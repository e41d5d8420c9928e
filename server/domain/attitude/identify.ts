import type { IdentificationDocument, IdentifyInput, ObservedAttitudes, ObservedRates, RateIdentificationDocument } from '#shared/api/identify.ts';
import { isNamedFrame } from '#shared/attitude/axes.ts';
import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { FEWEST } from '#shared/attitude/identification/rates/measured-rates.ts';
import { LARGEST_COMPONENT } from '#shared/attitude/refuse-out-of-range.ts';
import type { Identifier } from '#server/identification/identifier.ts';
import { resolveConvention } from '../conventions/resolve-convention.ts';
import { DomainError } from '../errors.ts';
import type { Meter } from '../meter.ts';
import { readAttitudes } from './read-attitudes.ts';
import { readObserved } from './read-observed.ts';
import { readTimes } from './read-times.ts';
import { pointingInto } from './refuse-attitudes.ts';
import { resolveRate } from './resolve-rate.ts';

export interface IdentifyContext {
  readonly identifier: Pick<Identifier, 'identify' | 'identifyRates'>;
}

/** Finds every convention that the observed numbers may follow; nothing observed is believed but the numbers. */
export async function identify({ identifier }: IdentifyContext, request: IdentifyInput, meter: Meter): Promise<IdentificationDocument | RateIdentificationDocument> {
  const { reference, observed } = request;
  meter.spend(reference.attitudes.length, '/reference/attitudes');
  const convention = resolveConvention(reference.convention, '/reference/convention');
  const attitudes = readAttitudes(reference.attitudes, convention, '/reference/attitudes');
  // The engine converts them again; here only what is wrong with them is found, with its place in the body.
  pointingInto('/reference/attitudes', () => createConverter(convention, convention).convert(attitudes));
  const trusted = { convention, attitudes };
  return 'rates' in observed ? identifyRates(identifier, request, observed, trusted) : identifyAttitudes(identifier, request, observed, trusted);
}

interface Trusted {
  readonly convention: Convention;
  readonly attitudes: Float64Array;
}

async function identifyAttitudes(identifier: IdentifyContext['identifier'], { reference, times, noise }: IdentifyInput, observed: ObservedAttitudes, trusted: Trusted): Promise<IdentificationDocument> {
  const count = reference.attitudes.length;
  const stated = observed.stated === undefined ? null : resolveConvention(observed.stated, '/observed/stated');
  if (stated) refuseOtherFrame(trusted.convention, stated, '/observed/stated');
  const identification = await identifier.identify({
    reference: trusted,
    observed: { representation: observed.representation, numbers: readObserved(observed.numbers, count, '/observed/numbers'), ...(stated ? { stated } : {}) },
    ...(times ? { times: readTimes(times, count, '/reference/attitudes') } : {}),
    noise,
  });
  return identification as unknown as IdentificationDocument;
}

async function identifyRates(identifier: IdentifyContext['identifier'], { reference, times, noise }: IdentifyInput, observed: ObservedRates, trusted: Trusted): Promise<RateIdentificationDocument> {
  const count = reference.attitudes.length;
  const attitude = resolveConvention(observed.stated.attitude, '/observed/stated/attitude');
  refuseOtherFrame(trusted.convention, attitude, '/observed/stated/attitude');
  const rate = resolveRate(observed.stated.rate, attitude, '/observed/stated/rate');
  if (!times) {
    const message = 'is missing; observed rates are compared with those of the reference attitudes, which come from their times';
    throw new DomainError('missing-field', `/times ${message}.`, [{ pointer: '/times', message }]);
  }
  if ((noise.rate === undefined) !== (noise.rateUnit === undefined)) {
    const absent = noise.rate === undefined ? 'rate' : 'rateUnit';
    const message = 'is missing; the noise of rates is a number with its unit';
    throw new DomainError('missing-field', `/noise/${absent} ${message}.`, [{ pointer: `/noise/${absent}`, message }]);
  }
  if (count < FEWEST) throw new DomainError('count-mismatch', `${count} attitudes are too few to tell rates from.`, [{ pointer: '/reference/attitudes', message: `must hold at least ${FEWEST} for rates` }]);
  const input = {
    reference: trusted, times: readTimes(times, count, '/reference/attitudes'),
    observed: { rates: readObserved(observed.rates, count, '/observed/rates', LARGEST_COMPONENT), stated: { attitude, rate } },
    noise: { angle: noise.angle, unit: noise.unit, rate: noise.rate ?? 0, rateUnit: noise.rateUnit ?? 'rad/s' },
  } as const;
  return (await identifier.identifyRates(input)) as unknown as RateIdentificationDocument;
}

/** Local-level axes can be relabelled into one another; a named frame only be itself. */
function refuseOtherFrame(reference: Convention, stated: Convention, pointer: string): void {
  if (!isNamedFrame(reference.reference) && !isNamedFrame(stated.reference)) return;
  if (reference.reference === stated.reference) return;
  const message = `is ${stated.reference}, which cannot be related to the reference's ${reference.reference} without a position or an epoch`;
  throw new DomainError('unrelated-frames', `${pointer}/reference ${message}.`, [{ pointer: `${pointer}/reference`, message }]);
}
