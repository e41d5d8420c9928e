import { ROLES, type Role } from '#shared/api/roles.ts';
import type { ApiKeysRepository } from '#server/db/repositories/api-keys.ts';
import type { UsageRepository } from '#server/db/repositories/usage.ts';
import { scopeOf, subjectOf, type Caller } from '../caller.ts';
import { toTimestamp, type Clock } from '../clock.ts';
import type { LimitTable } from '../limits/limit-table.ts';
import { monthOf, nextMonth } from '../limits/quota.ts';

export interface UsageContext {
  readonly usage: UsageRepository;
  readonly limits: LimitTable;
  readonly apiKeys: ApiKeysRepository;
  readonly clock: Clock;
}

/** What the caller itself has used in a month. */
export async function ownUsage({ usage, limits, clock }: UsageContext, caller: Caller, asked: string | undefined) {
  const month = asked ?? monthOf(clock());
  const days = await usage.days(subjectOf(caller), month);
  return {
    month,
    requests: days.reduce((sum, { requests }) => sum + requests, 0),
    attitudes: days.reduce((sum, { attitudes }) => sum + attitudes, 0),
    limits: limits.of(caller),
    resetsAt: toTimestamp(nextMonth(Date.parse(`${month}-01T00:00:00Z`))),
    days,
  };
}

/** What each key that the caller may see has used in a month, with its quota, and the sums by role. */
export async function usageByKey({ usage, limits, apiKeys, clock }: UsageContext, caller: Caller, asked: string | undefined) {
  const month = asked ?? monthOf(clock());
  const ownerId = scopeOf(caller, 'usage.read');
  const [rows, keys] = await Promise.all([usage.byKey(month, ownerId), apiKeys.list(ownerId)]);
  const keyLimits = new Map(keys.map((key) => [key.id, key]));
  const sum = (role: Role, what: 'requests' | 'attitudes') => rows.filter((row) => row.role === role).reduce((total, row) => total + row[what], 0);
  return {
    month,
    keys: rows.map(({ keyId, name, prefix, role, requests, attitudes }) => ({
      id: keyId, name, prefix, role, requests, attitudes, attitudesPerMonth: limits.of({ role, keyLimits: keyLimits.get(keyId) ?? null }).attitudesPerMonth,
    })),
    roles: ROLES.map((role) => ({ role, requests: sum(role, 'requests'), attitudes: sum(role, 'attitudes') })).filter(({ requests }) => requests > 0),
  };
}
