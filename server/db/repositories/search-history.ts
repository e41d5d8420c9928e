import type { Sequelize } from 'sequelize';
import type { RequestRow } from '../models/request.ts';
import { select } from '../select.ts';

export interface HistoryFilter {
  /** Only calls of this person's keys and their own. */
  readonly ownerId: string | null;
  readonly keyId?: string | undefined;
  readonly role?: string | undefined;
  readonly route?: string | undefined;
  readonly status?: number | undefined;
  /** 4 for every status from 400 to 499. */
  readonly statusClass?: number | undefined;
  readonly verdict?: string | undefined;
  readonly warning?: string | undefined;
  /** How the request id begins; eight characters or more. */
  readonly requestId?: string | undefined;
  /** Milliseconds; not before, and before. */
  readonly from?: number | undefined;
  readonly to?: number | undefined;
}

/** A place in the history's order: by time, then by commit. */
export interface HistoryPosition {
  readonly at: number;
  readonly id: number;
}

export type HistoryRow = RequestRow & { keyName: string | null; keyPrefix: string | null; personName: string | null };

export interface FoundPage {
  readonly rows: HistoryRow[];
  /** Where the search goes on; null where everything has been looked at. */
  readonly next: HistoryPosition | null;
}

/** One condition of a filter: a list of candidates read off its own index, newest first, or a test of a row found otherwise. */
interface Condition {
  readonly source: string;
  readonly where: string;
  readonly test: string;
  /** Columns of the source, named `r`. */
  readonly at: string;
  readonly id: string;
}

/** Rows that one page looks at, at most: what bounds its time on a history of any size. */
export const LOOKED_AT_MOST = 5_000;
/** A condition's density is told by how far back this many of its rows reach. */
const PROBED = 1_000;

const byIndex = (index: string, test: string): Condition => ({ source: `requests r INDEXED BY ${index}`, where: test, test, at: 'r.at', id: 'r.id' });
const EVERYTHING = byIndex('requests_by_time', 'TRUE');

/**
 * Finds a page. The rarest condition is walked off its index, the others are tested on each row; a page that has looked at
 * `lookedAtMost` rows ends early and says where to go on, so that no filter, however unlucky, takes longer than the next.
 */
export async function searchHistory(sequelize: Sequelize, filter: HistoryFilter, before: HistoryPosition | null, limit: number, lookedAtMost = LOOKED_AT_MOST): Promise<FoundPage> {
  const conditions = conditionsOf(filter);
  const rarest = await rarestOf(sequelize, conditions, filter, before);
  const tests = conditions.filter((condition) => condition !== rarest).map(({ test }) => test);
  const rows: HistoryRow[] = [];
  let position = before;
  let looked = 0;
  // Without tests every candidate is a row of the page. With them few may pass: the next look is wider.
  let chunk = tests.length === 0 ? limit + 1 : 4 * limit;
  for (;;) {
    const candidates = ordered(rarest, filter, position);
    const values = { ...valuesOf(filter, position), chunk };
    const found = await select<HistoryRow>(sequelize, `
      SELECT ${COLUMNS} FROM (${candidates} LIMIT $chunk) c CROSS JOIN requests r ON r.id = c.id
        LEFT JOIN api_keys k ON k.id = r.key_id LEFT JOIN people p ON p.id = r.person_id
      ${tests.length > 0 ? `WHERE ${tests.join(' AND ')}` : ''} ORDER BY c.at DESC, c.id DESC LIMIT $rows`, { ...values, rows: limit + 1 - rows.length });
    rows.push(...found);
    if (rows.length > limit) {
      rows.length = limit;
      const { at, id } = rows.at(-1)!;
      return { rows, next: { at, id } };
    }
    const [last] = await select<HistoryPosition>(sequelize, `${candidates} LIMIT 1 OFFSET $skipped`, { ...values, skipped: chunk - 1 });
    if (!last) return { rows, next: null };
    looked += chunk;
    position = last;
    if (looked >= lookedAtMost) return { rows, next: last };
    chunk = Math.min(4 * chunk, lookedAtMost - looked);
  }
}

export const COLUMNS = `r.id, r.request_id AS requestId, r.at, r.key_id AS keyId, r.person_id AS personId, r.owner_id AS ownerId, r.role, r.method, r.route,
  r.status, r.code, r.duration_us AS durationUs, r.attitudes, r.warnings, r.warning_codes AS warningCodes, r.verdict, r.body_sha256 AS bodySha256, r.body_bytes AS bodyBytes,
  k.name AS keyName, k.prefix AS keyPrefix, p.name AS personName`;

function conditionsOf({ ownerId, keyId, role, route, status, statusClass, verdict, warning, requestId }: HistoryFilter): Condition[] {
  const conditions = [
    ownerId !== null && byIndex('requests_by_owner', 'r.owner_id = $ownerId'),
    keyId !== undefined && byIndex('requests_by_key', 'r.key_id = $keyId'),
    role !== undefined && byIndex('requests_by_role', 'r.role = $role'),
    route !== undefined && byIndex('requests_by_route', 'r.route = $route'),
    status !== undefined && byIndex('requests_by_status', 'r.status = $status'),
    statusClass !== undefined && byIndex('requests_by_status_class', 'r.status / 100 = $statusClass'),
    verdict !== undefined && byIndex('requests_by_verdict', 'r.verdict = $verdict'),
    warning !== undefined && WARNED,
    requestId !== undefined && NAMED,
  ].filter((condition) => condition !== false);
  return conditions.length > 0 ? conditions : [EVERYTHING];
}

const WARNED: Condition = {
  source: 'request_warnings r', where: 'r.code = $warning', at: 'r.at', id: 'r.request',
  test: 'EXISTS (SELECT 1 FROM request_warnings w WHERE w.code = $warning AND w.at = r.at AND w.request = r.id)',
};
const BEGINS = 'r.request_id BETWEEN $requestId AND $requestIdEnd';
/** The plus keeps the planner from walking the index of times in search of one id. */
const NAMED: Condition = { source: 'requests r', where: BEGINS, test: BEGINS, at: '+r.at', id: 'r.id' };

/** A condition's rows within the filter's time, from a position on, newest first. */
function ordered({ source, where, at, id }: Condition, { from, to }: HistoryFilter, position: HistoryPosition | null): string {
  const bounds = [
    where,
    from !== undefined && `${at} >= $from`,
    to !== undefined && `${at} < $to`,
    position !== null && `${at} <= $beforeAt AND (${at} < $beforeAt OR ${id} < $beforeId)`,
  ].filter((bound) => bound !== false);
  return `SELECT r.at, ${id} AS id FROM ${source} WHERE ${bounds.join(' AND ')} ORDER BY ${at} DESC, ${id} DESC`;
}

/** The condition with the fewest rows, or, of those with many, the one whose newest thousand reach furthest back. */
async function rarestOf(sequelize: Sequelize, conditions: readonly Condition[], filter: HistoryFilter, before: HistoryPosition | null): Promise<Condition> {
  // An id names one call: nothing can be rarer.
  if (conditions.length === 1 || filter.requestId !== undefined) return conditions.at(-1)!;
  const probes = conditions.map((condition, i) => `(SELECT at FROM (${ordered(condition, filter, before)} LIMIT 1 OFFSET ${PROBED - 1})) AS c${i}`);
  const [reach] = await select<Record<string, number | null>>(sequelize, `SELECT ${probes.join(', ')}`, valuesOf(filter, before));
  const reaches = conditions.map((_, i) => reach![`c${i}`] ?? -Infinity);
  return conditions[reaches.indexOf(Math.min(...reaches))]!;
}

function valuesOf({ ownerId, keyId, role, route, status, statusClass, verdict, warning, requestId, from, to }: HistoryFilter, before: HistoryPosition | null) {
  // "~" sorts behind everything that an id holds.
  return { ownerId, keyId, role, route, status, statusClass, verdict, warning, requestId, requestIdEnd: `${requestId}~`, from, to, beforeAt: before?.at, beforeId: before?.id };
}
