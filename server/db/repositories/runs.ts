import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { Database } from '../database.ts';
import { select } from '../select.ts';

export interface NewRun {
  readonly id: string;
  readonly at: number;
  readonly requestId: string | null;
  readonly keyId: string | null;
  readonly personId: string | null;
  readonly ownerId: string;
  readonly label: string | null;
  readonly commitId: string | null;
  readonly verdict: 'pass' | 'fail';
  readonly count: number;
  readonly failed: number;
  /** Conventions, tolerance, worst, statistics, failures, summary, engine: JSON. */
  readonly detail: string;
}

export type RunRow = NewRun & { readonly sequence: number; readonly keyName: string | null; readonly personName: string | null };

export interface RunsFilter {
  readonly ownerId: string | null;
  readonly verdict?: string | undefined;
  readonly label?: string | undefined;
  readonly keyId?: string | undefined;
  readonly before?: number | undefined;
  readonly limit: number;
}

export interface RunsRepository {
  /** Newest first. */
  page(filter: RunsFilter): Promise<RunRow[]>;
  byId(id: string, ownerId: string | null): Promise<RunRow | null>;
}

/** Stores a run within the transaction of its history row. */
export async function storeRun(sequelize: Sequelize, run: NewRun, transaction: Transaction): Promise<void> {
  await sequelize.query(`
    INSERT INTO runs (id, at, request_id, key_id, person_id, owner_id, label, commit_id, verdict, count, failed, detail)
    VALUES ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10, $11, $12)`, {
    bind: [run.id, run.at, run.requestId, run.keyId, run.personId, run.ownerId, run.label, run.commitId, run.verdict, run.count, run.failed, run.detail], transaction, type: QueryTypes.INSERT,
  });
}

const SELECTED = `
  SELECT r.sequence, r.id, r.at, r.request_id AS requestId, r.key_id AS keyId, r.person_id AS personId, r.owner_id AS ownerId, r.label, r.commit_id AS commitId,
    r.verdict, r.count, r.failed, r.detail, k.name AS keyName, p.name AS personName
  FROM runs r LEFT JOIN api_keys k ON k.id = r.key_id LEFT JOIN people p ON p.id = r.person_id`;

export function runsRepository({ sequelize }: Database): RunsRepository {
  return {
    page: ({ ownerId, verdict, label, keyId, before, limit }) => {
      const conditions = [
        ownerId !== null && 'r.owner_id = $ownerId', verdict !== undefined && 'r.verdict = $verdict', label !== undefined && 'r.label = $label',
        keyId !== undefined && 'r.key_id = $keyId', before !== undefined && 'r.sequence < $before',
      ].filter((condition) => condition !== false);
      return select<RunRow>(sequelize, `${SELECTED} ${conditions.length > 0 ? `WHERE ${conditions.join(' AND ')}` : ''} ORDER BY r.sequence DESC LIMIT $limit`, { ownerId, verdict, label, keyId, before, limit });
    },
    byId: async (id, ownerId) => (await select<RunRow>(sequelize, `${SELECTED} WHERE r.id = $id ${ownerId === null ? '' : 'AND r.owner_id = $ownerId'}`, { id, ownerId }))[0] ?? null,
  };
}
