import type { Database } from '../database.ts';
import type { RequestRow } from '../models/request.ts';
import { select } from '../select.ts';
import type { NewRun } from './runs.ts';
import type { NewRequest } from './store-requests.ts';

export interface HistoryFilter {
  /** Only calls of this person's keys and their own. */
  readonly ownerId: string | null;
  readonly keyId?: string | undefined;
  readonly route?: string | undefined;
  /** Lowest and highest status, both included. */
  readonly status?: readonly [number, number] | undefined;
  readonly from?: number | undefined;
  readonly to?: number | undefined;
  /** Only rows committed before this one. */
  readonly before?: number | undefined;
  readonly limit: number;
}

export type HistoryRow = RequestRow & { keyName: string | null; keyPrefix: string | null; personName: string | null };

export interface HistoryRepository {
  /** Resolves once the row is committed. */
  append(request: NewRequest, run: NewRun | null): Promise<void>;
  /** Newest first. */
  page(filter: HistoryFilter): Promise<HistoryRow[]>;
  routes(ownerId: string | null): Promise<string[]>;
}

export function historyRepository({ sequelize, writes }: Database): HistoryRepository {
  return {
    append: (request, run) => writes.append({ request, run }),
    page: (filter) => {
      const { where, values } = conditionsOf(filter);
      return select<HistoryRow>(sequelize, `
        SELECT r.id, r.request_id AS requestId, r.at, r.key_id AS keyId, r.person_id AS personId, r.owner_id AS ownerId, r.method, r.route,
          r.status, r.code, r.duration_us AS durationUs, r.attitudes, r.warnings, r.warning_codes AS warningCodes,
          k.name AS keyName, k.prefix AS keyPrefix, p.name AS personName
        FROM requests r LEFT JOIN api_keys k ON k.id = r.key_id LEFT JOIN people p ON p.id = r.person_id
        ${where} ORDER BY r.id DESC LIMIT $limit`, values);
    },
    routes: async (ownerId) => {
      // A walk over the index from one route to the next: DISTINCT would read every row.
      const rows = await select<{ route: string }>(sequelize, `
        WITH RECURSIVE seen(route) AS (
          SELECT MIN(route) FROM requests
          UNION ALL SELECT (SELECT MIN(route) FROM requests WHERE route > seen.route) FROM seen WHERE seen.route IS NOT NULL
        ) SELECT route FROM seen WHERE route IS NOT NULL
        ${ownerId === null ? '' : 'AND EXISTS (SELECT 1 FROM requests r WHERE r.route = seen.route AND r.owner_id = $ownerId)'}`,
      { ownerId });
      return rows.map(({ route }) => route);
    },
  };
}

function conditionsOf(filter: HistoryFilter): { where: string; values: Record<string, string | number | null | undefined> } {
  const { ownerId, keyId, route, status, from, to, before, limit } = filter;
  const conditions = [
    ownerId !== null && 'r.owner_id = $ownerId',
    keyId !== undefined && 'r.key_id = $keyId',
    route !== undefined && 'r.route = $route',
    status !== undefined && 'r.status BETWEEN $lowest AND $highest',
    from !== undefined && 'r.at >= $from',
    to !== undefined && 'r.at < $to',
    before !== undefined && 'r.id < $before',
  ].filter((condition) => condition !== false);
  return {
    where: conditions.length > 0 ? `WHERE ${conditions.join(' AND ')}` : '',
    values: { ownerId, keyId, route, lowest: status?.[0], highest: status?.[1], from, to, before, limit },
  };
}
