import type { Sequelize } from 'sequelize';
import { openDatabase } from './connection.ts';
import { migrate } from './migrate.ts';
import { defineApiKey, type ApiKeyModel } from './models/api-key.ts';
import { definePerson, type PersonModel } from './models/person.ts';
import { defineRequest, type RequestModel } from './models/request.ts';
import { defineSession, type SessionModel } from './models/session.ts';
import { storeRecords, type NewRecord } from './repositories/store-records.ts';
import { WriteQueue } from './write-queue.ts';

/** The open database: models for reading, one queue for writing. */
export interface Database {
  readonly sequelize: Sequelize;
  readonly people: PersonModel;
  readonly sessions: SessionModel;
  readonly apiKeys: ApiKeyModel;
  readonly requests: RequestModel;
  readonly writes: WriteQueue<NewRecord>;
}

/** Opens the file and brings its schema up to date. */
export async function connect(file: string): Promise<Database> {
  const sequelize = openDatabase(file);
  await migrate(sequelize);
  return {
    sequelize,
    people: definePerson(sequelize),
    sessions: defineSession(sequelize),
    apiKeys: defineApiKey(sequelize),
    requests: defineRequest(sequelize),
    writes: new WriteQueue(sequelize, (rows, transaction) => storeRecords(sequelize, rows, transaction)),
  };
}

/** Drains the write queue, then closes the file. */
export async function disconnect(database: Database): Promise<void> {
  await database.writes.close();
  await database.sequelize.close();
}
