import { z } from 'zod';
import { role, timestamp } from './common.ts';
import { endpoint } from './endpoint.ts';

export const apiKey = z.strictObject({
  id: z.string(),
  name: z.string(),
  prefix: z.string().meta({ description: 'The part of the key that may be shown; enough to recognise it.' }),
  role,
  createdAt: timestamp,
  createdBy: z.strictObject({ id: z.string(), name: z.string() }),
  expiresAt: timestamp.nullable(),
  lastUsedAt: timestamp.nullable(),
  revokedAt: timestamp.nullable(),
}).meta({ id: 'ApiKey' });

export const issueKeyInput = z.strictObject({
  name: z.string().trim().min(1, { error: 'must not be empty' }).max(80, { error: 'must have at most 80 characters' }),
  role,
  expiresAt: timestamp.nullable().meta({ description: 'When the key stops working by itself; null for never.' }),
}).meta({ id: 'IssueKeyInput' });

export const listKeysEndpoint = endpoint({
  id: 'listKeys', method: 'get', path: '/keys', tag: 'Keys', summary: 'List API keys, newest first',
  auth: 'session', permission: 'keys.read', status: 200, response: z.strictObject({ items: z.array(apiKey) }), problems: [401, 403, 429],
});

export const issueKeyEndpoint = endpoint({
  id: 'issueKey', method: 'post', path: '/keys', tag: 'Keys', summary: 'Issue an API key; its secret is in this answer only',
  auth: 'session', permission: 'keys.issue', body: issueKeyInput, status: 201,
  response: z.strictObject({ key: apiKey, secret: z.string() }), problems: [400, 401, 403, 413, 415, 422, 429, 503],
  example: { name: 'Attitude pipeline', role: 'engineer', expiresAt: null },
});

export const revokeKeyEndpoint = endpoint({
  id: 'revokeKey', method: 'post', path: '/keys/{id}/revoke', tag: 'Keys', summary: 'Revoke an API key; the next call with it is refused',
  auth: 'session', permission: 'keys.revoke', params: z.strictObject({ id: z.string() }), status: 200,
  response: z.strictObject({ key: apiKey }), problems: [401, 403, 404, 409, 429, 503],
});

export type ApiKeyDocument = z.output<typeof apiKey>;
export type IssueKeyInput = z.output<typeof issueKeyInput>;
