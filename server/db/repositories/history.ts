import type { Database } from '../database.ts';
import { select } from '../select.ts';
import { pruneRequests } from './prune-history.ts';
import { COLUMNS, searchHistory, type FoundPage, type HistoryFilter, type HistoryPosition, type HistoryRow } from './search-history.ts';
import type { NewRecord } from './store-records.ts';

export interface HistoryRepository {
  /** Resolves once the row is committed. */
  append(record: NewRecord): Promise<void>;
  /** Newest first. A page may be short, even empty, and still have a `next`: then the search ended early and goes on from there. */
  page(filter: HistoryFilter, before: HistoryPosition | null, limit: number): Promise<FoundPage>;
  routes(ownerId: string | null): Promise<string[]>;
  byRequestId(requestId: string, ownerId: string | null): Promise<(HistoryRow & { body: string | null }) | null>;
  /** Deletes the oldest calls before a time, so many at most; returns how many there were. */
  prune(before: number, limit: number): Promise<number>;
}

export function historyRepository({ sequelize, writes }: Database): HistoryRepository {
  return {
    append: (record) => writes.append(record),
    page: (filter, before, limit) => searchHistory(sequelize, filter, before, limit),
    routes: async (ownerId) => {
      // A walk over the index from one route to the next: DISTINCT would read every row.
      const whose = ownerId === null ? 'TRUE' : 'owner_id = $ownerId';
      const rows = await select<{ route: string }>(sequelize, `
        WITH RECURSIVE seen(route) AS (
          SELECT MIN(route) FROM requests WHERE ${whose}
          UNION ALL SELECT (SELECT MIN(route) FROM requests WHERE ${whose} AND route > seen.route) FROM seen WHERE seen.route IS NOT NULL
        ) SELECT route FROM seen WHERE route IS NOT NULL`, { ownerId });
      return rows.map(({ route }) => route);
    },
    byRequestId: async (requestId, ownerId) => (await select<HistoryRow & { body: string | null }>(sequelize, `
      SELECT ${COLUMNS}, b.body FROM requests r LEFT JOIN api_keys k ON k.id = r.key_id LEFT JOIN people p ON p.id = r.person_id LEFT JOIN request_bodies b ON b.request = r.id
      WHERE r.request_id = $requestId ${ownerId === null ? '' : 'AND r.owner_id = $ownerId'}`, { requestId, ownerId }))[0] ?? null,
    prune: (before, limit) => writes.run((transaction) => pruneRequests(sequelize, before, limit, transaction)),
  };
}
