import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { components } from '../../../lib/contract.gen.ts';

export type HistoryEntry = components['schemas']['HistoryEntry'];

/** As in the page's address; empty text is no filter. */
export interface HistoryFilter {
  readonly key: string;
  readonly route: string;
  readonly status: string;
  readonly from: string;
  readonly to: string;
  readonly cursor: string;
}

export function historyQuery(filter: HistoryFilter, limit = 50) {
  const query = {
    ...(filter.key && { key: filter.key }),
    ...(filter.route && { route: filter.route }),
    ...(filter.status && { status: filter.status }),
    ...(filter.from && { from: `${filter.from}:00Z` }),
    ...(filter.to && { to: `${filter.to}:00Z` }),
    ...(filter.cursor && { cursor: filter.cursor }),
    limit: String(limit),
  };
  return queryOptions({
    queryKey: ['history', query],
    queryFn: ({ signal }) => dataOf(client.GET('/history', { params: { query }, signal })),
    placeholderData: keepPreviousData,
  });
}
