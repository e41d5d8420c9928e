import type { RunDocument } from '#shared/api/runs.ts';
import type { RunRow } from '#server/db/repositories/runs.ts';
import { toTimestamp } from '../clock.ts';

type Of<Kind extends RunDocument['kind']> = Extract<RunDocument, { kind: Kind }>;
type Deep<T> = T extends (infer E)[] ? readonly Deep<E>[] : T extends object ? { readonly [K in keyof T]: Deep<T[K]> } : T;
type Detail<Run> = Omit<Run, 'id' | 'at' | 'verdict' | 'label' | 'commit' | 'key' | 'person' | 'count' | 'failed' | 'kind'>;

/** What of a run is kept as JSON. Runs of attitudes were there first, and name no kind. */
export type AttitudeRunDetail = Deep<Detail<Of<'attitudes'>>>;
export type RateRunDetail = Deep<Detail<Of<'rates'>>> & { readonly kind: 'rates' };
export type RunDetail = AttitudeRunDetail | RateRunDetail;

export function presentRun(row: RunRow): RunDocument {
  const detail = JSON.parse(row.detail) as RunDetail;
  return {
    kind: 'attitudes', id: row.id, at: toTimestamp(row.at), verdict: row.verdict, label: row.label, commit: row.commitId,
    key: row.keyId === null ? null : { id: row.keyId, name: row.keyName ?? '' },
    person: row.personId === null ? null : { id: row.personId, name: row.personName ?? '' },
    count: row.count, failed: row.failed,
    ...detail,
  } as unknown as RunDocument;
}
