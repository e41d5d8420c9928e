import { z } from 'zod';
import { warning } from './attitude.ts';
import { pageQuery, role, timestamp } from './common.ts';
import { endpoint } from './endpoint.ts';
import { KEPT_BODY_BYTES } from './limits.ts';

const verdict = z.enum(['pass', 'fail']);

export const historyEntry = z.strictObject({
  id: z.string().meta({ description: 'The request id, as in the X-Request-Id header of the answer.' }),
  at: timestamp,
  key: z.strictObject({ id: z.string(), name: z.string(), prefix: z.string() }).nullable(),
  person: z.strictObject({ id: z.string(), name: z.string() }).nullable(),
  role: role.nullable().meta({ description: 'Of the caller at the time of the call; null where nobody was known.' }),
  method: z.string(),
  route: z.string(),
  status: z.int(),
  code: z.string().nullable().meta({ description: 'The problem code of a refused call.' }),
  verdict: verdict.nullable().meta({ description: 'Of the run that the call made, if it made one.' }),
  durationMs: z.number(),
  attitudes: z.int(),
  warnings: z.int().meta({ description: 'Attitudes that a warning was given for.' }),
  warningCodes: z.array(z.string()),
}).meta({ id: 'HistoryEntry' });

const filter = {
  key: z.string().optional().meta({ description: 'API key id.' }),
  role: role.optional().meta({ description: 'Role of the caller at the time of the call.' }),
  route: z.string().optional().meta({ description: 'As in the entries, such as /api/v1/convert.' }),
  status: z.string().regex(/^([1-5][0-9]{2}|[1-5]xx)$/, { error: 'must be a status such as 404, or a class such as 4xx' }).optional(),
  verdict: verdict.optional(),
  warning: warning.shape.code.optional().meta({ description: 'Calls with a warning of this code.' }),
  id: z.string().regex(/^[0-9a-f-]{8,36}$/i, { error: 'must be a request id, or at least its first eight characters' }).optional().meta({ description: 'A request id, or how it begins.' }),
  from: timestamp.optional().meta({ description: 'Not before this time.' }),
  to: timestamp.optional().meta({ description: 'Before this time.' }),
};

export const historyQuery = z.strictObject({ ...pageQuery, ...filter });
export const historyFilterQuery = z.strictObject(filter);

export const listHistoryEndpoint = endpoint({
  id: 'listHistory', method: 'get', path: '/history', tag: 'History', summary: 'API calls, newest first',
  description: 'Every API call is one entry, refused ones included. A person whose role reaches only their own sees the calls of their keys and their own.\n\nA filter that few entries pass is searched in steps: a page may hold fewer entries than asked for, even none, and still have a `nextCursor`; the search then goes on from there.',
  auth: 'caller', permission: 'history.read', query: historyQuery, status: 200,
  response: z.strictObject({
    items: z.array(historyEntry),
    nextCursor: z.string().nullable().meta({ description: 'Give it as `cursor` for the next page; null on the last.' }),
    searchedBackTo: timestamp.nullable().meta({ description: 'Where a page is shorter than asked for and not the last: how far back it has looked.' }),
    routes: z.array(z.string()).meta({ description: 'Routes that the caller’s history holds, for filtering.' }),
  }),
  problems: [400, 401, 403, 422, 429, 503],
});

export const exportHistoryEndpoint = endpoint({
  id: 'exportHistory', method: 'get', path: '/history.csv', tag: 'History', summary: 'API calls as CSV, newest first',
  description: 'The whole history that passes the filter, as RFC 4180 with a header row. A text that a spreadsheet would take for a formula has an apostrophe in front.',
  auth: 'caller', permission: 'history.read', query: historyFilterQuery, status: 200, response: z.string(), contentType: 'text/csv', problems: [401, 403, 422, 429, 503],
});

export const historyRecord = z.strictObject({
  ...historyEntry.shape,
  body: z.strictObject({
    sha256: z.string().meta({ description: 'Of the body as it arrived, decompressed.' }),
    bytes: z.int(),
    text: z.string().nullable().meta({ description: `The body; null where the workspace keeps none, or it has more than ${KEPT_BODY_BYTES} bytes.` }),
  }).nullable().meta({ description: 'Of calls that compute; null for others.' }),
}).meta({ id: 'HistoryRecord' });

export const getHistoryEntryEndpoint = endpoint({
  id: 'getHistoryEntry', method: 'get', path: '/history/{id}', tag: 'History', summary: 'One API call, with its body where that is kept',
  auth: 'caller', permission: 'history.read', params: z.strictObject({ id: z.string() }), status: 200, response: historyRecord, problems: [401, 403, 404, 429, 503],
});

export const historySettings = z.strictObject({
  keepBodies: z.boolean({ error: 'must be true or false' }).meta({ description: `Whether the bodies of calls that compute are kept, up to ${KEPT_BODY_BYTES} bytes each. Otherwise only their SHA-256 is.` }),
  retentionDays: z.int({ error: 'must be a whole number from 1 to 3650, or null' }).min(1, { error: 'must be a whole number from 1 to 3650, or null' }).max(3650, { error: 'must be a whole number from 1 to 3650, or null' }).nullable()
    .meta({ description: 'Days after which calls are forgotten; null for never. Usage and runs stay.' }),
}).meta({ id: 'HistorySettings' });

export const getHistorySettingsEndpoint = endpoint({
  id: 'getHistorySettings', method: 'get', path: '/history/settings', tag: 'History', summary: 'What the history keeps, and for how long',
  auth: 'caller', permission: 'history.read', status: 200, response: historySettings, problems: [401, 403, 429, 503],
});

export const changeHistorySettingsEndpoint = endpoint({
  id: 'changeHistorySettings', method: 'put', path: '/history/settings', tag: 'History', summary: 'Change what the history keeps; in force on the next call',
  auth: 'session', permission: 'history.settings', body: historySettings, status: 200, response: historySettings, problems: [400, 401, 403, 413, 415, 422, 429, 503],
  example: { keepBodies: true, retentionDays: 365 },
});

export type HistoryRecordDocument = z.output<typeof historyRecord>;
export type HistoryFilterQuery = z.output<typeof historyFilterQuery>;
export type HistoryQuery = z.output<typeof historyQuery>;
export type HistoryEntryDocument = z.output<typeof historyEntry>;
