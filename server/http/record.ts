import { keptBody } from '#server/domain/history/kept-body.ts';
import type { Services } from '../services.ts';
import type { Call } from './call.ts';

/** Writes the call into the history and resolves once that is committed: only then may its answer leave. */
export function record({ history, historySettings }: Services, call: Call, route: string, status: number, code: string | null): Promise<void> {
  const { caller, meter } = call;
  const refused = status >= 400;
  const body = call.body && call.bodyMayBeKept ? keptBody(call.body, historySettings.current.keepBodies) : null;
  const row = {
    requestId: call.id,
    at: call.startedAt,
    keyId: caller?.keyId ?? null,
    personId: caller?.personId ?? null,
    ownerId: caller?.ownerId ?? null,
    role: caller?.role ?? null,
    method: call.request.method,
    route,
    status,
    code,
    durationUs: Number((process.hrtime.bigint() - call.startedNs) / 1000n),
    attitudes: refused ? 0 : meter.attitudes,
    warnings: refused ? 0 : meter.warnings,
    warningCodes: refused ? '' : meter.warningCodes.join(','),
    verdict: refused ? null : call.run?.verdict ?? null,
    bodySha256: body?.sha256 ?? null,
    bodyBytes: body?.bytes ?? null,
  };
  const run = refused || !call.run ? null : {
    ...call.run, detail: JSON.stringify(call.run.detail), at: row.at, requestId: row.requestId, keyId: row.keyId, personId: row.personId, ownerId: row.ownerId!,
  };
  return history.append({ request: row, run, body: body?.text ?? null });
}
