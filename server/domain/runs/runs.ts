import { PAGE_SIZE } from '#shared/api/limits.ts';
import type { RunDocument } from '#shared/api/runs.ts';
import type { RunsRepository } from '#server/db/repositories/runs.ts';
import { scopeOf, type Caller } from '../caller.ts';
import { DomainError } from '../errors.ts';
import { presentRun } from './present-run.ts';

export interface RunsContext {
  readonly runs: RunsRepository;
}

export async function listRuns({ runs }: RunsContext, caller: Caller, query: { cursor?: string | undefined; limit?: string | undefined; verdict?: string | undefined; label?: string | undefined; key?: string | undefined }): Promise<{ items: RunDocument[]; nextCursor: string | null }> {
  const ownerId = scopeOf(caller, 'runs.read');
  if (query.cursor !== undefined && !/^[0-9]{1,15}$/.test(query.cursor)) throw new DomainError('invalid-cursor', `"${query.cursor}" is not a cursor of this list.`, [{ pointer: '?cursor', message: 'must be a nextCursor of this list' }]);
  const limit = query.limit === undefined ? PAGE_SIZE.default : Number(query.limit);
  const rows = await runs.page({ ownerId, verdict: query.verdict, label: query.label, keyId: query.key, before: query.cursor === undefined ? undefined : Number(query.cursor), limit: limit + 1 });
  const page = rows.slice(0, limit);
  return { items: page.map(presentRun), nextCursor: rows.length > limit ? String(page.at(-1)!.sequence) : null };
}

/** @throws DomainError `not-found`, also for a run that the caller may not see. */
export async function getRun({ runs }: RunsContext, caller: Caller, id: string): Promise<RunDocument> {
  const row = await runs.byId(id, scopeOf(caller, 'runs.read'));
  if (!row) throw new DomainError('not-found', `There is no run with the id "${id.slice(0, 100)}".`);
  return presentRun(row);
}
