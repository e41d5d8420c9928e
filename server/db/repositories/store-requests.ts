import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { RequestRow } from '../models/request.ts';

export type NewRequest = Omit<RequestRow, 'id'>;

const COLUMNS = [
  'request_id', 'at', 'key_id', 'person_id', 'owner_id', 'role', 'method', 'route', 'status', 'code', 'duration_us', 'attitudes', 'warnings', 'warning_codes', 'verdict', 'body_sha256', 'body_bytes',
] as const;

/** Well within the 32,766 bound values that SQLite takes a statement, and short enough to read in an error. */
const ROWS_PER_STATEMENT = 200;

const valuesOf = (row: NewRequest): (string | number | null)[] => [
  row.requestId, row.at, row.keyId, row.personId, row.ownerId, row.role, row.method, row.route, row.status, row.code, row.durationUs, row.attitudes, row.warnings, row.warningCodes, row.verdict, row.bodySha256, row.bodyBytes,
];

/** Stores a group of history rows with the codes of their warnings, the last use of their keys and the meter, in raw SQL: building a model per row costs more than the insert. */
export async function storeRequests(sequelize: Sequelize, rows: readonly NewRequest[], transaction: Transaction): Promise<void> {
  for (let start = 0; start < rows.length; start += ROWS_PER_STATEMENT) {
    const part = rows.slice(start, start + ROWS_PER_STATEMENT);
    const places = part.map((_, row) => `(${COLUMNS.map((__, column) => `$${row * COLUMNS.length + column + 1}`).join(', ')})`).join(', ');
    await sequelize.query(`INSERT INTO requests (${COLUMNS.join(', ')}) VALUES ${places}`, {
      bind: part.flatMap(valuesOf), transaction, type: QueryTypes.INSERT,
    });
    await storeWarnings(sequelize, part.filter(({ warningCodes }) => warningCodes !== ''), transaction);
  }
  for (const [keyId, at] of lastUses(rows)) {
    await sequelize.query('UPDATE api_keys SET last_used_at = MAX(COALESCE(last_used_at, 0), $1) WHERE id = $2', { bind: [at, keyId], transaction, type: QueryTypes.UPDATE });
  }
  for (const { subject, day, requests, attitudes } of usesByDay(rows)) {
    await sequelize.query(`INSERT INTO usage_by_day (subject, day, requests, attitudes) VALUES ($1, $2, $3, $4)
      ON CONFLICT (subject, day) DO UPDATE SET requests = requests + excluded.requests, attitudes = attitudes + excluded.attitudes`,
    { bind: [subject, day, requests, attitudes], transaction, type: QueryTypes.INSERT });
  }
}

/** One row for each code of each request, for finding requests by it. */
async function storeWarnings(sequelize: Sequelize, warned: readonly NewRequest[], transaction: Transaction): Promise<void> {
  if (warned.length === 0) return;
  await sequelize.query(`
    INSERT OR IGNORE INTO request_warnings (code, at, request)
    SELECT codes.value, r.at, r.id FROM requests r, json_each('["' || replace(r.warning_codes, ',', '","') || '"]') AS codes
    WHERE r.request_id IN (${warned.map((_, i) => `$${i + 1}`).join(', ')})`, { bind: warned.map(({ requestId }) => requestId), transaction, type: QueryTypes.INSERT });
}

function lastUses(rows: readonly NewRequest[]): Map<string, number> {
  const latest = new Map<string, number>();
  for (const { keyId, at } of rows) if (keyId !== null) latest.set(keyId, Math.max(at, latest.get(keyId) ?? 0));
  return latest;
}

interface DayUse {
  readonly subject: string;
  readonly day: string;
  requests: number;
  attitudes: number;
}

/** The meter is kept in the transaction of the history, so that the two can never differ. */
function usesByDay(rows: readonly NewRequest[]): DayUse[] {
  const uses = new Map<string, DayUse>();
  for (const { keyId, personId, at, attitudes } of rows) {
    const subject = keyId ?? personId;
    if (subject === null) continue;
    const day = new Date(at).toISOString().slice(0, 10);
    const use = uses.get(`${subject} ${day}`) ?? { subject, day, requests: 0, attitudes: 0 };
    use.requests++;
    use.attitudes += attitudes;
    uses.set(`${subject} ${day}`, use);
  }
  return [...uses.values()];
}
