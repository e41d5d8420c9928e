import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { components, paths } from '../../../lib/contract.gen.ts';

export type HistoryEntry = components['schemas']['HistoryEntry'];

/** As in the page's address; empty text is no filter. */
export interface HistoryFilter {
  readonly key: string;
  readonly role: string;
  readonly route: string;
  readonly status: string;
  readonly verdict: string;
  readonly warning: string;
  /** How a request id begins. */
  readonly id: string;
  readonly from: string;
  readonly to: string;
  readonly cursor: string;
}

export const NO_FILTER: HistoryFilter = { key: '', role: '', route: '', status: '', verdict: '', warning: '', id: '', from: '', to: '', cursor: '' };

/** What the service understands of a filter: an address can be edited by anybody, and its answer says what was wrong. */
function parametersOf(filter: HistoryFilter) {
  const { from, to, ...texts } = filter;
  const given = Object.fromEntries(Object.entries({ ...texts, id: texts.id.trim().length >= 8 ? texts.id.trim() : '' }).filter(([, value]) => value !== ''));
  return { ...given, ...(from && { from: `${from}:00Z` }), ...(to && { to: `${to}:00Z` }) } as NonNullable<paths['/history']['get']['parameters']['query']>;
}

/** Where the rows that a filter lets through can be fetched as CSV. */
export function exportAddress({ cursor: _, ...filter }: HistoryFilter): string {
  const search = new URLSearchParams(parametersOf({ ...filter, cursor: '' }) as Record<string, string>).toString();
  return `/api/v1/history.csv${search && `?${search}`}`;
}

export function historyQuery(filter: HistoryFilter, limit = 50) {
  const query = { ...parametersOf(filter), limit: String(limit) };
  return queryOptions({
    queryKey: ['history', query],
    queryFn: ({ signal }) => dataOf(client.GET('/history', { params: { query }, signal })),
    placeholderData: keepPreviousData,
  });
}
