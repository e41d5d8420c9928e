import { PAGE_SIZE } from '#shared/api/limits.ts';
import type { HistoryEntryDocument, HistoryQuery } from '#shared/api/history.ts';
import type { HistoryRepository, HistoryRow } from '#server/db/repositories/history.ts';
import { scopeOf, type Caller } from '../caller.ts';
import { toTimestamp } from '../clock.ts';
import { DomainError } from '../errors.ts';

export interface HistoryContext {
  readonly history: HistoryRepository;
}

export interface HistoryPage {
  readonly items: HistoryEntryDocument[];
  readonly nextCursor: string | null;
  readonly routes: string[];
}

/** One page of the caller's history, newest first. */
export async function listHistory({ history }: HistoryContext, caller: Caller, query: HistoryQuery): Promise<HistoryPage> {
  const ownerId = scopeOf(caller, 'history.read');
  const limit = query.limit === undefined ? PAGE_SIZE.default : Number(query.limit);
  const [rows, routes] = await Promise.all([
    history.page({
      ownerId,
      keyId: query.key,
      route: query.route,
      status: query.status === undefined ? undefined : statusRange(query.status),
      from: query.from === undefined ? undefined : Date.parse(query.from),
      to: query.to === undefined ? undefined : Date.parse(query.to),
      before: query.cursor === undefined ? undefined : readCursor(query.cursor),
      limit: limit + 1,
    }),
    history.routes(ownerId),
  ]);
  const items = rows.slice(0, limit);
  const last = items.at(-1);
  return { items: items.map(presentEntry), nextCursor: rows.length > limit && last ? String(last.id) : null, routes };
}

function statusRange(text: string): readonly [number, number] {
  if (!text.endsWith('xx')) return [Number(text), Number(text)];
  const hundreds = Number(text[0]) * 100;
  return [hundreds, hundreds + 99];
}

function readCursor(text: string): number {
  if (!/^[0-9]{1,15}$/.test(text)) throw new DomainError('invalid-cursor', `"${text}" is not a cursor of this list.`, [{ pointer: '?cursor', message: 'must be a nextCursor of this list' }]);
  return Number(text);
}

function presentEntry(row: HistoryRow): HistoryEntryDocument {
  return {
    id: row.requestId,
    at: toTimestamp(row.at),
    key: row.keyId === null ? null : { id: row.keyId, name: row.keyName ?? '', prefix: row.keyPrefix ?? '' },
    person: row.personId === null ? null : { id: row.personId, name: row.personName ?? '' },
    method: row.method,
    route: row.route,
    status: row.status,
    code: row.code,
    durationMs: row.durationUs / 1000,
    attitudes: row.attitudes,
    warnings: row.warnings,
    warningCodes: row.warningCodes === '' ? [] : row.warningCodes.split(','),
  };
}
