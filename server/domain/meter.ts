import { DomainError } from './errors.ts';
import type { Limits } from './limits/limit-table.ts';
import { nextMonth, type Quota, type Reservation } from './limits/quota.ts';

/** What a call uses and what it is warned of: spent before the work, kept in the history with the answer. */
export interface Meter {
  readonly attitudes: number;
  warnings: number;
  readonly warningCodes: string[];
  /**
   * Sets attitudes aside for this call.
   * @throws DomainError `batch-too-large` beyond what one call may carry, `quota-exceeded` beyond what is left this month.
   */
  spend(attitudes: number, pointer: string): void;
}

/** A meter of the caller's quota. `settle` books what was spent, or gives it back where the call was refused. */
export class QuotaMeter implements Meter {
  attitudes = 0;
  warnings = 0;
  readonly warningCodes: string[] = [];
  readonly #quota: Quota;
  readonly #subject: string;
  readonly #limits: Limits;
  readonly #now: number;
  readonly #reservations: Reservation[] = [];

  constructor(quota: Quota, subject: string, limits: Limits, now: number) {
    this.#quota = quota;
    this.#subject = subject;
    this.#limits = limits;
    this.#now = now;
  }

  spend(attitudes: number, pointer: string): void {
    const { attitudesPerCall, attitudesPerMonth } = this.#limits;
    refuseBatchAbove(attitudesPerCall, attitudes, pointer);
    const reservation = this.#quota.reserve(this.#subject, attitudes, attitudesPerMonth);
    if (!reservation) throw this.quotaExceeded(attitudes);
    this.#reservations.push(reservation);
    this.attitudes += attitudes;
  }

  /** Sets aside as many of these attitudes as are left this month, for a part of a stream; returns how many. */
  spendUpTo(attitudes: number): number {
    const { attitudesPerMonth } = this.#limits;
    const granted = Math.min(attitudes, this.#quota.left(this.#subject, attitudesPerMonth));
    const reservation = this.#quota.reserve(this.#subject, granted, attitudesPerMonth);
    if (!reservation) return 0;
    this.#reservations.push(reservation);
    this.attitudes += granted;
    return granted;
  }

  quotaExceeded(attitudes: number): DomainError {
    const { attitudesPerMonth } = this.#limits;
    const left = this.#quota.left(this.#subject, attitudesPerMonth);
    const seconds = Math.ceil((nextMonth(this.#now) - this.#now) / 1000);
    return new DomainError('quota-exceeded', `${attitudes} attitudes are more than the ${left} left of your ${attitudesPerMonth} this month; the quota starts anew on ${new Date(nextMonth(this.#now)).toISOString()}.`, [], seconds);
  }

  /** Books or gives back what was set aside since the last time. */
  settle(answered: boolean): void {
    for (const reservation of this.#reservations.splice(0)) {
      if (answered) reservation.book();
      else reservation.release();
    }
  }
}

/** Counts one batch away from its caller's quota, which is asked afterwards. */
export class BatchMeter implements Meter {
  attitudes = 0;
  warnings = 0;
  readonly warningCodes: string[] = [];
  readonly #most: number;

  constructor(most: number) {
    this.#most = most;
  }

  spend(attitudes: number, pointer: string): void {
    refuseBatchAbove(this.#most, attitudes, pointer);
    this.attitudes += attitudes;
  }
}

function refuseBatchAbove(most: number, attitudes: number, pointer: string): void {
  if (attitudes > most) throw new DomainError('batch-too-large', `${attitudes} are more than the ${most} that one call of yours may carry.`, [{ pointer, message: `must hold at most ${most}` }]);
}

/** For callers without a quota: visitors, who compute nothing. */
export class NoMeter implements Meter {
  readonly attitudes = 0;
  warnings = 0;
  readonly warningCodes: string[] = [];
  spend(): void {
    throw new DomainError('not-allowed', 'This operation computes nothing.');
  }
}
