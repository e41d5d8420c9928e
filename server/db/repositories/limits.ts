import type { Role } from '#shared/api/roles.ts';
import type { Database } from '../database.ts';
import { select } from '../select.ts';

export interface LimitsRow {
  readonly role: Role;
  readonly requestsPerMinute: number;
  readonly attitudesPerMonth: number;
  readonly attitudesPerCall: number;
  readonly parallelRequests: number;
}

export interface LimitsRepository {
  list(): Promise<LimitsRow[]>;
  update(limits: LimitsRow, by: string, at: number): Promise<void>;
}

export function limitsRepository({ sequelize, writes }: Database): LimitsRepository {
  return {
    list: () => select<LimitsRow>(sequelize, `
      SELECT role, requests_per_minute AS requestsPerMinute, attitudes_per_month AS attitudesPerMonth, attitudes_per_call AS attitudesPerCall, parallel_requests AS parallelRequests
      FROM role_limits ORDER BY role`),
    update: ({ role, requestsPerMinute, attitudesPerMonth, attitudesPerCall, parallelRequests }, by, at) => writes.run(async (transaction) => {
      await sequelize.query(`
        UPDATE role_limits SET requests_per_minute = $1, attitudes_per_month = $2, attitudes_per_call = $3, parallel_requests = $4, updated_at = $5, updated_by = $6 WHERE role = $7`,
      { bind: [requestsPerMinute, attitudesPerMonth, attitudesPerCall, parallelRequests, at, by, role], transaction });
    }),
  };
}
