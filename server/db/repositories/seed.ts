import type { Database } from '../database.ts';
import type { ApiKeyRow } from '../models/api-key.ts';
import type { PersonRow } from '../models/person.ts';
import { storeRecords, type NewRecord } from './store-records.ts';

export interface SeedRows {
  readonly people: readonly PersonRow[];
  readonly apiKeys: readonly ApiKeyRow[];
  readonly records: readonly NewRecord[];
}

/** Stores a whole scenario in one transaction: either all of it is there or none. */
export function insertSeed({ sequelize, people, apiKeys, writes }: Database, rows: SeedRows): Promise<void> {
  return writes.run(async (transaction) => {
    await people.bulkCreate([...rows.people], { transaction });
    await apiKeys.bulkCreate([...rows.apiKeys], { transaction });
    await storeRecords(sequelize, rows.records, transaction);
  });
}
