import type { UsageRepository } from '#server/db/repositories/usage.ts';
import type { Clock } from '../clock.ts';

/** What one subject has used and set aside in the month it was last asked for. */
interface Account {
  month: string;
  used: number;
  reserved: number;
}

/** Accounts kept in memory at most; those with nothing set aside are dropped first. */
const REMEMBERED = 10_000;

export const monthOf = (milliseconds: number): string => new Date(milliseconds).toISOString().slice(0, 7);

/** The first moment of the next month, UTC. */
export function nextMonth(milliseconds: number): number {
  const date = new Date(milliseconds);
  return Date.UTC(date.getUTCFullYear(), date.getUTCMonth() + 1, 1);
}

/**
 * The monthly quota, exactly: units are set aside before an answer is computed and booked when its record is committed.
 * What is used comes from the meter in the database, so a restart forgets nothing; looking and setting aside are one
 * synchronous step, so parallel calls cannot spend the same unit.
 */
export class Quota {
  readonly #usage: UsageRepository;
  readonly #clock: Clock;
  readonly #accounts = new Map<string, Account>();

  constructor(usage: UsageRepository, clock: Clock) {
    this.#usage = usage;
    this.#clock = clock;
  }

  /** Opens the subject's account for this month; afterwards `reserve` can be asked without waiting. */
  async open(subject: string): Promise<void> {
    const month = monthOf(this.#clock());
    if (this.#accounts.get(subject)?.month === month) return;
    const used = await this.#usage.attitudesInMonth(subject, month);
    // Another call may have opened it meanwhile, and set something aside.
    const account = this.#accounts.get(subject);
    if (account?.month === month) return;
    if (this.#accounts.size >= REMEMBERED) this.#dropOneIdle();
    this.#accounts.set(subject, { month, used, reserved: 0 });
  }

  /** Sets units aside; null where fewer are left. The returned reservation is booked or given back, once. */
  reserve(subject: string, units: number, limit: number): Reservation | null {
    const account = this.#accounts.get(subject);
    if (!account || account.used + account.reserved + units > limit) return null;
    account.reserved += units;
    let open = true;
    const settle = (booked: number): void => {
      if (!open) return;
      open = false;
      account.reserved -= units;
      account.used += booked;
    };
    return { book: () => settle(units), release: () => settle(0) };
  }

  /** Units left this month, for an account that is open. */
  left(subject: string, limit: number): number {
    const account = this.#accounts.get(subject);
    return account ? Math.max(0, limit - account.used - account.reserved) : limit;
  }

  #dropOneIdle(): void {
    for (const [subject, { reserved }] of this.#accounts) {
      if (reserved === 0) return void this.#accounts.delete(subject);
    }
  }
}

export interface Reservation {
  book(): void;
  release(): void;
}
