import { z } from 'zod';
import { role, timestamp } from './common.ts';
import { endpoint } from './endpoint.ts';
import { ATTITUDES_PER_CALL } from './limits.ts';

const whole = (least: number, most: number) => z.int({ error: `must be a whole number from ${least} to ${most}` }).min(least, { error: `must be a whole number from ${least} to ${most}` }).max(most, { error: `must be a whole number from ${least} to ${most}` });

/** What one key or person of a role may use. */
export const limits = z.strictObject({
  requestsPerMinute: whole(1, 1_000_000),
  attitudesPerMonth: whole(0, 1_000_000_000_000),
  attitudesPerCall: whole(1, ATTITUDES_PER_CALL).meta({ description: 'Attitudes of one call with JSON on either side. What is streamed from rows to rows is bounded by the month alone.' }),
  parallelRequests: whole(1, 1_000),
}).meta({ id: 'Limits', description: 'What one key, or one person signed in, may use.' });

const roleLimits = z.strictObject({ role, ...limits.shape }).meta({ id: 'RoleLimits' });
const nullable = (schema: z.ZodNumber | z.ZodInt) => schema.nullable();
export const keyLimits = z.strictObject({
  requestsPerMinute: nullable(limits.shape.requestsPerMinute), attitudesPerMonth: nullable(limits.shape.attitudesPerMonth),
  attitudesPerCall: nullable(limits.shape.attitudesPerCall), parallelRequests: nullable(limits.shape.parallelRequests),
}).meta({ id: 'KeyLimits', description: 'Limits of one key; null for the role’s own. The tighter of the two is in force.' });

export const listLimitsEndpoint = endpoint({
  id: 'listLimits', method: 'get', path: '/limits', tag: 'Usage', summary: 'Limits of every role',
  auth: 'caller', permission: 'limits.read', status: 200, response: z.strictObject({ items: z.array(roleLimits) }), problems: [401, 403, 429, 503],
});

export const changeLimitsEndpoint = endpoint({
  id: 'changeLimits', method: 'put', path: '/limits/{role}', tag: 'Usage', summary: 'Change the limits of a role; in force on the next request',
  auth: 'session', permission: 'limits.change', params: z.strictObject({ role }), body: limits, status: 200, response: roleLimits, problems: [400, 401, 403, 413, 415, 422, 429, 503],
});

export const changeKeyLimitsEndpoint = endpoint({
  id: 'changeKeyLimits', method: 'put', path: '/keys/{id}/limits', tag: 'Keys', summary: 'Give a key tighter limits than its role',
  auth: 'session', permission: 'limits.change', params: z.strictObject({ id: z.string() }), body: keyLimits, status: 200, response: keyLimits, problems: [400, 401, 403, 404, 413, 415, 422, 429, 503],
});

const monthQuery = z.strictObject({
  month: z.string().regex(/^[0-9]{4}-(0[1-9]|1[0-2])$/, { error: 'must be a month such as 2026-03' }).optional().meta({ description: 'As 2026-03, by UTC; this month when absent.' }),
});

export const ownUsageEndpoint = endpoint({
  id: 'ownUsage', method: 'get', path: '/usage', tag: 'Usage', summary: 'What the caller has used this month, and what is left',
  description: 'Units are attitudes computed; refused requests cost none.',
  auth: 'caller', query: monthQuery, status: 200,
  response: z.strictObject({
    month: z.string(), requests: z.int(), attitudes: z.int(),
    limits, resetsAt: timestamp.meta({ description: 'When the quota starts anew.' }),
    days: z.array(z.strictObject({ day: z.string(), requests: z.int(), attitudes: z.int() })),
  }).meta({ id: 'OwnUsage' }),
  problems: [401, 422, 429, 503],
});

export const usageByKeyEndpoint = endpoint({
  id: 'usageByKey', method: 'get', path: '/usage/keys', tag: 'Usage', summary: 'What each key has used in a month, and each role',
  auth: 'caller', permission: 'usage.read', query: monthQuery, status: 200,
  response: z.strictObject({
    month: z.string(),
    keys: z.array(z.strictObject({ id: z.string(), name: z.string(), prefix: z.string(), role, requests: z.int(), attitudes: z.int(), attitudesPerMonth: z.int() })),
    roles: z.array(z.strictObject({ role, requests: z.int(), attitudes: z.int() })),
  }).meta({ id: 'UsageByKey' }),
  problems: [401, 403, 422, 429, 503],
});
