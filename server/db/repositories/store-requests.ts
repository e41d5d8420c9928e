import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { RequestRow } from '../models/request.ts';

export type NewRequest = Omit<RequestRow, 'id'>;

const COLUMNS = [
  'request_id', 'at', 'key_id', 'person_id', 'owner_id', 'method', 'route', 'status', 'code', 'duration_us', 'attitudes', 'warnings', 'warning_codes',
] as const;

/** Well within the 32,766 bound values that SQLite takes a statement, and short enough to read in an error. */
const ROWS_PER_STATEMENT = 200;

const valuesOf = (row: NewRequest): (string | number | null)[] => [
  row.requestId, row.at, row.keyId, row.personId, row.ownerId, row.method, row.route, row.status, row.code, row.durationUs, row.attitudes, row.warnings, row.warningCodes,
];

/** Stores a group of history rows and the last use of their keys, in raw SQL: building a model per row costs more than the insert. */
export async function storeRequests(sequelize: Sequelize, rows: readonly NewRequest[], transaction: Transaction): Promise<void> {
  for (let start = 0; start < rows.length; start += ROWS_PER_STATEMENT) {
    const part = rows.slice(start, start + ROWS_PER_STATEMENT);
    const places = part.map((_, row) => `(${COLUMNS.map((__, column) => `$${row * COLUMNS.length + column + 1}`).join(', ')})`).join(', ');
    await sequelize.query(`INSERT INTO requests (${COLUMNS.join(', ')}) VALUES ${places}`, {
      bind: part.flatMap(valuesOf), transaction, type: QueryTypes.INSERT,
    });
  }
  const lastUse = new Map<string, number>();
  for (const { keyId, at } of rows) if (keyId !== null) lastUse.set(keyId, Math.max(at, lastUse.get(keyId) ?? 0));
  for (const [keyId, at] of lastUse) {
    await sequelize.query('UPDATE api_keys SET last_used_at = MAX(COALESCE(last_used_at, 0), $1) WHERE id = $2', { bind: [at, keyId], transaction, type: QueryTypes.UPDATE });
  }
}
