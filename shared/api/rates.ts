import { z } from 'zod';
import { RATE_UNITS } from '../attitude/rates/rate.ts';
import { warning } from './attitude.ts';
import { conventionFacets, conventionReference } from './convention.ts';
import { endpoint } from './endpoint.ts';
import { ATTITUDES_PER_CALL } from './limits.ts';

const unit = z.enum(RATE_UNITS);

/** A form of rate, as a body names it. */
export const rateReference = z.discriminatedUnion('rate', [
  z.strictObject({ rate: z.literal('body'), unit }),
  z.strictObject({ rate: z.literal('reference'), unit }),
  z.strictObject({ rate: z.literal('euler'), unit, angles: conventionReference.optional().meta({ description: 'The Euler convention whose angles are meant; required where the attitude is given in another representation.' }) }),
  z.strictObject({ rate: z.literal('quaternion') }),
  z.strictObject({ rate: z.literal('dcm') }),
]).meta({ id: 'Rate', description: 'body, reference: angular velocity of the body axes relative to the reference axes, components in body or in reference axes. euler: derivatives of the angles, in their order and signs. quaternion, dcm: derivatives of the attitude’s own numbers.' });

export const rateFacets = z.strictObject({ rate: z.enum(['body', 'reference', 'euler', 'quaternion', 'dcm']), unit: unit.optional(), angles: conventionFacets.optional() });

export const ratesInput = z.strictObject({
  attitude: conventionReference,
  from: rateReference,
  to: rateReference,
  samples: z.custom<unknown[]>((value) => Array.isArray(value), { error: 'must be an array of samples, each { "attitude": [numbers], "rate": [numbers] }' }).meta({
    override: { type: 'array', minItems: 1, items: { type: 'object', required: ['attitude', 'rate'], additionalProperties: false, properties: { attitude: { type: 'array', items: { type: 'number' } }, rate: { type: 'array', items: { type: 'number' } } } } },
  }),
}).meta({ id: 'RatesInput' });

export const ratesOutput = z.strictObject({
  rates: z.array(z.array(z.number().nullable())).meta({ description: 'null where an Euler rate does not exist, at gimbal lock; the middle one always does.' }),
  conditions: z.array(z.number().nullable()).meta({ description: 'κ of the Euler angles in play, by which a rate error can grow; 1 where there are none, null at lock.' }),
  attitude: conventionFacets,
  from: rateFacets,
  to: rateFacets,
  warnings: z.array(warning),
  engine: z.string(),
}).meta({ id: 'RatesOutput' });

export const ratesEndpoint = endpoint({
  id: 'convertRates', method: 'post', path: '/rates', tag: 'Attitude',
  summary: 'Convert rates between two forms, each at its attitude',
  description: `Up to ${ATTITUDES_PER_CALL.toLocaleString('en')} samples a call.`,
  auth: 'caller', permission: 'attitude.compute', recordsSessions: true,
  body: ratesInput, status: 200, response: ratesOutput,
  problems: [400, 401, 403, 413, 415, 422, 429, 503],
  example: { attitude: { preset: 'aircraft-euler-deg' }, from: { rate: 'euler', unit: 'deg/s' }, to: { rate: 'body', unit: 'deg/s' }, samples: [{ attitude: [200, 0, 30], rate: [4.6, 0, 0] }] },
});

export type RatesInput = z.output<typeof ratesInput>;
export type RatesOutput = z.output<typeof ratesOutput>;
export type RateReference = z.output<typeof rateReference>;
