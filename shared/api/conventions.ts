import { z } from 'zod';
import { conventionFacets } from './convention.ts';
import { endpoint } from './endpoint.ts';

export const preset = z.strictObject({
  id: z.string(),
  title: z.string(),
  description: z.string(),
  convention: conventionFacets,
  standard: z.strictObject({
    name: z.string(),
    clause: z.string(),
    checked: z.enum(['confirmed', 'from memory']).meta({ description: 'Whether the entry was compared with the text of the standard.' }),
    note: z.string().optional(),
  }).nullable().meta({ description: 'The open standard that states this convention; null for one of ours.' }),
  worked: z.strictObject({
    reading: z.string(),
    numbers: z.array(z.number()),
  }).meta({ description: 'One attitude in this convention: nose 030° true, 10° up, right wing 20° down.' }),
  interfaces: z.array(z.strictObject({ interface: z.string(), version: z.int() }))
    .meta({ description: 'Published interface versions that state this convention.' }),
}).meta({ id: 'Preset' });

export const listConventionsEndpoint = endpoint({
  id: 'listConventions', method: 'get', path: '/conventions', tag: 'Conventions', summary: 'List the presets',
  auth: 'caller', permission: 'conventions.read', status: 200, response: z.strictObject({ items: z.array(preset) }), problems: [401, 403, 429, 503],
});

export const getConventionEndpoint = endpoint({
  id: 'getConvention', method: 'get', path: '/conventions/{id}', tag: 'Conventions', summary: 'One preset with every facet',
  auth: 'caller', permission: 'conventions.read', params: z.strictObject({ id: z.string() }), status: 200, response: preset, problems: [401, 403, 404, 429, 503],
});

export type PresetDocument = z.output<typeof preset>;
