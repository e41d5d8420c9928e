import type { HistoryFilterQuery } from '#shared/api/history.ts';
import type { HistoryFilter, HistoryPosition } from '#server/db/repositories/search-history.ts';
import { DomainError } from '../errors.ts';

/** What a filter's texts mean, within what the caller may see. */
export function readFilter(query: HistoryFilterQuery, ownerId: string | null): HistoryFilter {
  const { key, role, route, status, verdict, warning, id, from, to } = query;
  return {
    ownerId, role, route, verdict, warning,
    keyId: key,
    ...(status === undefined ? {} : status.endsWith('xx') ? { statusClass: Number(status[0]) } : { status: Number(status) }),
    requestId: id?.toLowerCase(),
    from: from === undefined ? undefined : Date.parse(from),
    to: to === undefined ? undefined : Date.parse(to),
  };
}

export const writeCursor = ({ at, id }: HistoryPosition): string => `${at}-${id}`;

/** @throws DomainError `invalid-cursor`. */
export function readCursor(text: string): HistoryPosition {
  const match = /^([0-9]{1,15})-([0-9]{1,15})$/.exec(text);
  if (!match) throw new DomainError('invalid-cursor', `"${text.slice(0, 100)}" is not a cursor of this list.`, [{ pointer: '?cursor', message: 'must be a nextCursor of this list' }]);
  return { at: Number(match[1]), id: Number(match[2]) };
}
