import type { Sequelize } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import { firstTables } from './migrations/0001-first-tables.ts';
import { runs } from './migrations/0003-runs.ts';
import { limitsAndUsage } from './migrations/0002-limits-and-usage.ts';
import { historyFilters } from './migrations/0004-history-filters.ts';
import { bodiesAndRetention } from './migrations/0005-bodies-and-retention.ts';
import { streamRefusals } from './migrations/0012-stream-refusals.ts';

/** One step of the schema, in raw SQL: Sequelize's own column changes rebuild a table and lose its cascade children. */
export interface Migration {
  readonly name: string;
  readonly statements: readonly string[];
}

const MIGRATIONS: readonly Migration[] = [firstTables, limitsAndUsage, runs, historyFilters, bodiesAndRetention, streamRefusals];

/** Brings the schema up to date; returns the names of the steps it took. */
export async function migrate(sequelize: Sequelize): Promise<string[]> {
  const umzug = new Umzug({
    context: sequelize,
    storage: new SequelizeStorage({ sequelize, tableName: 'migrations' }),
    logger: undefined,
    migrations: MIGRATIONS.map(({ name, statements }) => ({
      name,
      up: () => sequelize.transaction(async (transaction) => {
        for (const statement of statements) await sequelize.query(statement, { transaction });
      }),
    })),
  });
  return (await umzug.up()).map(({ name }) => name);
}
