import { PAGE_SIZE } from '#shared/api/limits.ts';
import type { HistoryEntryDocument, HistoryFilterQuery, HistoryQuery, HistoryRecordDocument } from '#shared/api/history.ts';
import type { HistoryRepository } from '#server/db/repositories/history.ts';
import type { HistoryPosition, HistoryRow } from '#server/db/repositories/search-history.ts';
import { scopeOf, type Caller } from '../caller.ts';
import { toTimestamp } from '../clock.ts';
import { DomainError } from '../errors.ts';
import { csvRow } from './csv.ts';
import { readCursor, readFilter, writeCursor } from './read-filter.ts';

export interface HistoryContext {
  readonly history: HistoryRepository;
}

export interface HistoryPage {
  readonly items: HistoryEntryDocument[];
  readonly nextCursor: string | null;
  readonly searchedBackTo: string | null;
  readonly routes: string[];
}

/** Rows fetched at a time by an export: enough to be quick, few enough to hold in memory many times over. */
const EXPORTED_AT_A_TIME = 1_000;

/** One page of the caller's history, newest first. */
export async function listHistory({ history }: HistoryContext, caller: Caller, query: HistoryQuery): Promise<HistoryPage> {
  const ownerId = scopeOf(caller, 'history.read');
  const limit = query.limit === undefined ? PAGE_SIZE.default : Number(query.limit);
  const before = query.cursor === undefined ? null : readCursor(query.cursor);
  const [{ rows, next }, routes] = await Promise.all([history.page(readFilter(query, ownerId), before, limit), history.routes(ownerId)]);
  return {
    items: rows.map(presentEntry), routes,
    nextCursor: next && writeCursor(next),
    searchedBackTo: next && rows.length < limit ? toTimestamp(next.at) : null,
  };
}

/** @throws DomainError `not-found`, also for a call that the caller may not see. */
export async function getHistoryEntry({ history }: HistoryContext, caller: Caller, id: string): Promise<HistoryRecordDocument> {
  const row = await history.byRequestId(id.toLowerCase(), scopeOf(caller, 'history.read'));
  if (!row) throw new DomainError('not-found', `The history holds no call with the id "${id.slice(0, 100)}".`);
  return { ...presentEntry(row), body: row.bodySha256 === null ? null : { sha256: row.bodySha256, bytes: row.bodyBytes!, text: row.body } };
}

/** The whole of the caller's history that passes the filter as CSV, newest first, fetched as fast as it is taken. */
export function exportHistory({ history }: HistoryContext, caller: Caller, query: HistoryFilterQuery): AsyncIterable<string> {
  const filter = readFilter(query, scopeOf(caller, 'history.read'));
  return (async function* () {
    yield csvRow(['time', 'request id', 'key', 'key prefix', 'person', 'role', 'method', 'route', 'status', 'problem', 'verdict', 'duration in ms', 'attitudes', 'warnings', 'warning codes']);
    let position: HistoryPosition | null = null;
    do {
      const { rows, next } = await history.page(filter, position, EXPORTED_AT_A_TIME);
      yield rows.map(exportedRow).join('');
      position = next;
    } while (position);
  })();
}

const exportedRow = (row: HistoryRow): string => csvRow([
  toTimestamp(row.at), row.requestId, row.keyName, row.keyPrefix, row.personName, row.role, row.method, row.route, row.status, row.code, row.verdict,
  row.durationUs / 1000, row.attitudes, row.warnings, row.warningCodes.replaceAll(',', ' '),
]);

export function presentEntry(row: HistoryRow): HistoryEntryDocument {
  return {
    id: row.requestId,
    at: toTimestamp(row.at),
    key: row.keyId === null ? null : { id: row.keyId, name: row.keyName ?? '', prefix: row.keyPrefix ?? '' },
    person: row.personId === null ? null : { id: row.personId, name: row.personName ?? '' },
    role: row.role,
    method: row.method,
    route: row.route,
    status: row.status,
    code: row.code,
    verdict: row.verdict,
    durationMs: row.durationUs / 1000,
    attitudes: row.attitudes,
    warnings: row.warnings,
    warningCodes: row.warningCodes === '' ? [] : row.warningCodes.split(','),
  };
}
