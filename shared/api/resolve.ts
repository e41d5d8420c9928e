import { z } from 'zod';
import { conventionFacets, conventionReference } from './convention.ts';
import { endpoint } from './endpoint.ts';
import { ATTITUDES_PER_CALL } from './limits.ts';
import { rateFacets, rateReference } from './rates.ts';

const side = z.enum(['reference', 'body']);
const numbers = { type: 'array', items: { type: 'number' } } as const;

export const resolveInput = z.strictObject({
  attitude: conventionReference,
  from: side.meta({ description: 'The axes that the vectors are given in; they are resolved in the other ones.' }),
  rate: rateReference.optional().meta({ description: 'The form of the samples’ angular velocity; needed with derivatives.' }),
  samples: z.custom<unknown[]>((value) => Array.isArray(value), { error: 'must be an array of samples, each { "attitude": [numbers], "vector": [x, y, z], "derivative"?: [x, y, z], "rate"?: [numbers] }' }).meta({
    override: { type: 'array', minItems: 1, items: { type: 'object', required: ['attitude', 'vector'], additionalProperties: false, properties: { attitude: numbers, vector: { ...numbers, minItems: 3, maxItems: 3 }, derivative: { ...numbers, minItems: 3, maxItems: 3 }, rate: numbers } } },
    description: 'Either every sample has a derivative and a rate, or none. A derivative is how the vector changes as seen from the frame it is given in.',
  }),
}).meta({ id: 'ResolveInput' });

const vectors = z.array(z.tuple([z.number(), z.number(), z.number()]));
export const resolveOutput = z.strictObject({
  vectors, derivatives: vectors.optional().meta({ description: 'How each vector changes as seen from the frame it is resolved in.' }),
  attitude: conventionFacets, from: side, to: side, rate: rateFacets.optional(), engine: z.string(),
}).meta({ id: 'ResolveOutput' });

export const resolveEndpoint = endpoint({
  id: 'resolveVectors', method: 'post', path: '/resolve', tag: 'Attitude',
  summary: 'Resolve vectors between reference and body axes, and their derivatives by the transport theorem',
  description: `Seen from the reference a vector changes by ω × v more than seen from the body. Up to ${ATTITUDES_PER_CALL.toLocaleString('en')} samples a call.`,
  auth: 'caller', permission: 'attitude.compute', recordsSessions: true,
  body: resolveInput, status: 200, response: resolveOutput, problems: [400, 401, 403, 413, 415, 422, 429, 503],
  example: { attitude: { preset: 'aircraft-euler-deg' }, from: 'body', rate: { rate: 'body', unit: 'deg/s' }, samples: [{ attitude: [0, 0, 0], vector: [10, 0, 0], derivative: [1, 0, 0], rate: [0, 0, 90] }] },
});

export type ResolveInput = z.output<typeof resolveInput>;
export type ResolveOutput = z.output<typeof resolveOutput>;
