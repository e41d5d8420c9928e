import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { storeRun, type NewRun } from './runs.ts';
import { storeRequests, type NewRequest } from './store-requests.ts';

/** What a call leaves behind: its history row, the run it made if it made one, and its body if that is kept. Stored together or not at all. */
export interface NewRecord {
  readonly request: NewRequest;
  readonly run: NewRun | null;
  /** The body, where it is kept. */
  readonly body?: string | null;
}

export async function storeRecords(sequelize: Sequelize, records: readonly NewRecord[], transaction: Transaction): Promise<void> {
  await storeRequests(sequelize, records.map(({ request }) => request), transaction);
  for (const { request, run, body } of records) {
    if (run) await storeRun(sequelize, run, transaction);
    if (body != null) {
      await sequelize.query('INSERT INTO request_bodies (request, body) SELECT id, $1 FROM requests WHERE request_id = $2', { bind: [body, request.requestId], transaction, type: QueryTypes.INSERT });
    }
  }
}
