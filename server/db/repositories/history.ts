import type { Database } from '../database.ts';
import { select } from '../select.ts';
import type { NewRun } from './runs.ts';
import { searchHistory, type FoundPage, type HistoryFilter, type HistoryPosition } from './search-history.ts';
import type { NewRequest } from './store-requests.ts';

export interface HistoryRepository {
  /** Resolves once the row is committed. */
  append(request: NewRequest, run: NewRun | null): Promise<void>;
  /** Newest first. A page may be short, even empty, and still have a `next`: then the search ended early and goes on from there. */
  page(filter: HistoryFilter, before: HistoryPosition | null, limit: number): Promise<FoundPage>;
  routes(ownerId: string | null): Promise<string[]>;
}

export function historyRepository({ sequelize, writes }: Database): HistoryRepository {
  return {
    append: (request, run) => writes.append({ request, run }),
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
  };
}
