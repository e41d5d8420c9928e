import type { Role } from '#shared/api/roles.ts';
import type { Database } from '../database.ts';
import { select } from '../select.ts';

export interface DayUsage {
  readonly day: string;
  readonly requests: number;
  readonly attitudes: number;
}

export interface KeyUsage {
  readonly keyId: string;
  readonly name: string;
  readonly prefix: string;
  readonly role: Role;
  readonly requests: number;
  readonly attitudes: number;
}

export interface UsageRepository {
  /** Attitudes that a key or person has used in a month such as "2026-03". */
  attitudesInMonth(subject: string, month: string): Promise<number>;
  days(subject: string, month: string): Promise<DayUsage[]>;
  /** Every key with use in the month, most used first; one owner's only where that is given. */
  byKey(month: string, ownerId: string | null): Promise<KeyUsage[]>;
}

export function usageRepository({ sequelize }: Database): UsageRepository {
  return {
    attitudesInMonth: async (subject, month) => (await select<{ attitudes: number }>(sequelize,
      'SELECT COALESCE(SUM(attitudes), 0) AS attitudes FROM usage_by_day WHERE subject = $subject AND day BETWEEN $first AND $last', { subject, ...daysOf(month) }))[0]!.attitudes,
    days: (subject, month) => select<DayUsage>(sequelize,
      'SELECT day, requests, attitudes FROM usage_by_day WHERE subject = $subject AND day BETWEEN $first AND $last ORDER BY day', { subject, ...daysOf(month) }),
    byKey: (month, ownerId) => select<KeyUsage>(sequelize, `
      SELECT k.id AS keyId, k.name, k.prefix, k.role, SUM(u.requests) AS requests, SUM(u.attitudes) AS attitudes
      FROM usage_by_day u JOIN api_keys k ON k.id = u.subject
      WHERE u.day BETWEEN $first AND $last ${ownerId === null ? '' : 'AND k.owner_id = $ownerId'}
      GROUP BY k.id ORDER BY attitudes DESC, requests DESC`, { ...daysOf(month), ownerId }),
  };
}

const daysOf = (month: string) => ({ first: `${month}-01`, last: `${month}-31` });
