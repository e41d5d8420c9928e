import type { Role } from '#shared/api/roles.ts';
import type { LimitsRepository, LimitsRow } from '#server/db/repositories/limits.ts';
import type { Caller } from '../caller.ts';

export type Limits = Omit<LimitsRow, 'role'>;

/** The limits of every role in memory, so that a call costs no query; changed here and in the database together. */
export class LimitTable {
  readonly #repository: LimitsRepository;
  readonly #byRole: Map<Role, Limits>;

  private constructor(repository: LimitsRepository, rows: readonly LimitsRow[]) {
    this.#repository = repository;
    this.#byRole = new Map(rows.map(({ role, ...limits }) => [role, limits]));
  }

  static async load(repository: LimitsRepository): Promise<LimitTable> {
    return new LimitTable(repository, await repository.list());
  }

  rows(): LimitsRow[] {
    return [...this.#byRole].map(([role, limits]) => ({ role, ...limits }));
  }

  /** What a caller may use: the role's limits, or the key's where those are tighter. */
  of({ role, keyLimits }: Pick<Caller, 'role' | 'keyLimits'>): Limits {
    const limits = this.#byRole.get(role)!;
    if (!keyLimits) return limits;
    const tighter = (name: keyof Limits): number => Math.min(limits[name], keyLimits[name] ?? Infinity);
    return {
      requestsPerMinute: tighter('requestsPerMinute'), attitudesPerMonth: tighter('attitudesPerMonth'),
      attitudesPerCall: tighter('attitudesPerCall'), parallelRequests: tighter('parallelRequests'),
    };
  }

  /** In force on the next request. */
  async change(row: LimitsRow, by: string, at: number): Promise<void> {
    await this.#repository.update(row, by, at);
    const { role, ...limits } = row;
    this.#byRole.set(role, limits);
  }
}
