import { randomUUID } from 'node:crypto';
import { errorSentence } from '#shared/attitude/verification/error-sentence.ts';
import type { ApiKeyRow } from '#server/db/models/api-key.ts';
import type { NewRecord } from '#server/db/repositories/store-records.ts';
import { ENGINE } from '#server/domain/attitude/engine.ts';
import type { RunDetail } from '#server/domain/runs/present-run.ts';
import { pastCalls } from '#server/scenario/history.ts';
import { RecordedLegs } from '#server/scenario/recorded-legs.ts';
import { pastRuns, type PastRun } from '#server/scenario/runs.ts';

/** The scenario's past weeks as the records they would have left: calls, and verifications with their runs, oldest first. */
export function pastRecords(now: number, keyByName: ReadonlyMap<string, ApiKeyRow>): NewRecord[] {
  const flight = new RecordedLegs();
  const calls = pastCalls(now, flight).map(({ key, warningCodes, ...call }): NewRecord => {
    const row = key === null ? undefined : keyByName.get(key);
    return { request: { ...call, requestId: randomUUID(), keyId: row?.id ?? null, personId: null, ownerId: row?.ownerId ?? null, role: row?.role ?? null, warningCodes: warningCodes.join(','), verdict: null, bodySha256: null, bodyBytes: null }, run: null };
  });
  const runs = pastRuns(now, flight).map((run) => recordOf(run, keyByName.get(run.key)!));
  return [...calls, ...runs].sort((a, b) => a.request.at - b.request.at);
}

function recordOf(run: PastRun, key: ApiKeyRow): NewRecord {
  const requestId = randomUUID();
  const { unit } = run.tolerance;
  const detail: RunDetail = {
    expected: run.expected, actual: run.actual, tolerance: run.tolerance, failures: run.failures,
    worst: { ...run.worst, unit }, statistics: { ...run.statistics, unit },
    summary: `Worst at attitude ${run.worst.index}: ${errorSentence(run.worst.angle, unit, run.worst.axisBody)}`,
    engine: ENGINE,
  };
  return {
    request: { requestId, at: run.at, keyId: key.id, personId: null, ownerId: key.ownerId, role: key.role, method: 'POST', route: '/api/v1/verify', status: 200, code: null, durationUs: run.durationUs, attitudes: run.count, warnings: 0, warningCodes: '', verdict: run.verdict, bodySha256: null, bodyBytes: null },
    run: { id: randomUUID(), at: run.at, requestId, keyId: key.id, personId: null, ownerId: key.ownerId, label: run.label, commitId: run.commit, verdict: run.verdict, count: run.count, failed: run.failed, detail: JSON.stringify(detail) },
  };
}
