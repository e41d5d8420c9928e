import type { Sequelize, Transaction } from 'sequelize';
import { storeRun, type NewRun } from './runs.ts';
import { storeRequests, type NewRequest } from './store-requests.ts';

/** What a call leaves behind: its history row, and the run it made if it made one. Stored together or not at all. */
export interface NewRecord {
  readonly request: NewRequest;
  readonly run: NewRun | null;
}

export async function storeRecords(sequelize: Sequelize, records: readonly NewRecord[], transaction: Transaction): Promise<void> {
  await storeRequests(sequelize, records.map(({ request }) => request), transaction);
  for (const { run } of records) if (run) await storeRun(sequelize, run, transaction);
}
