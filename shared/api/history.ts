import { z } from 'zod';
import { pageQuery, timestamp } from './common.ts';
import { endpoint } from './endpoint.ts';

export const historyEntry = z.strictObject({
  id: z.string().meta({ description: 'The request id, as in the X-Request-Id header of the answer.' }),
  at: timestamp,
  key: z.strictObject({ id: z.string(), name: z.string(), prefix: z.string() }).nullable(),
  person: z.strictObject({ id: z.string(), name: z.string() }).nullable(),
  method: z.string(),
  route: z.string(),
  status: z.int(),
  code: z.string().nullable().meta({ description: 'The problem code of a refused call.' }),
  durationMs: z.number(),
  attitudes: z.int(),
  warnings: z.int().meta({ description: 'Attitudes that a warning was given for.' }),
  warningCodes: z.array(z.string()),
}).meta({ id: 'HistoryEntry' });

export const historyQuery = z.strictObject({
  ...pageQuery,
  key: z.string().optional().meta({ description: 'API key id.' }),
  route: z.string().optional().meta({ description: 'As in the entries, such as /api/v1/convert.' }),
  status: z.string().regex(/^([1-5][0-9]{2}|[1-5]xx)$/, { error: 'must be a status such as 404, or a class such as 4xx' }).optional(),
  from: timestamp.optional().meta({ description: 'Not before this time.' }),
  to: timestamp.optional().meta({ description: 'Before this time.' }),
});

export const listHistoryEndpoint = endpoint({
  id: 'listHistory', method: 'get', path: '/history', tag: 'History', summary: 'API calls, newest first',
  description: 'Every API call is one entry, refused ones included. A person whose role reaches only their own sees the calls of their keys and their own.',
  auth: 'caller', permission: 'history.read', query: historyQuery, status: 200,
  response: z.strictObject({
    items: z.array(historyEntry),
    nextCursor: z.string().nullable().meta({ description: 'Give it as `cursor` for the next page; null on the last.' }),
    routes: z.array(z.string()).meta({ description: 'Routes that the caller’s history holds, for filtering.' }),
  }),
  problems: [400, 401, 403, 422, 429, 503],
});

export type HistoryQuery = z.output<typeof historyQuery>;
export type HistoryEntryDocument = z.output<typeof historyEntry>;
