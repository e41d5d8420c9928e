import type { IdentificationDocument } from '#shared/api/identify.ts';
import type { RunDocument } from '#shared/api/runs.ts';
import type { Convention } from '#shared/attitude/convention.ts';
import type { RunRow } from '#server/db/repositories/runs.ts';
import { toTimestamp } from '../clock.ts';

type Unit = RunDocument['tolerance']['unit'];

/** What of a run is kept as JSON. */
export interface RunDetail {
  readonly expected: Convention;
  readonly actual: Convention;
  readonly tolerance: { readonly angle: number; readonly unit: Unit };
  readonly worst: { readonly index: number; readonly angle: number; readonly unit: Unit; readonly axisBody: readonly [number, number, number] };
  readonly statistics: { readonly rms: number; readonly median: number; readonly p95: number; readonly max: number; readonly unit: Unit };
  readonly failures: readonly { readonly index: number; readonly angle: number }[];
  readonly summary: string;
  readonly engine: string;
  readonly diagnosis?: IdentificationDocument;
}

export function presentRun(row: RunRow): RunDocument {
  const detail = JSON.parse(row.detail) as RunDetail;
  return {
    id: row.id, at: toTimestamp(row.at), verdict: row.verdict, label: row.label, commit: row.commitId,
    key: row.keyId === null ? null : { id: row.keyId, name: row.keyName ?? '' },
    person: row.personId === null ? null : { id: row.personId, name: row.personName ?? '' },
    count: row.count, failed: row.failed,
    ...(detail as unknown as Pick<RunDocument, 'tolerance' | 'worst' | 'statistics' | 'expected' | 'actual' | 'failures' | 'summary' | 'engine' | 'diagnosis'>),
  };
}
