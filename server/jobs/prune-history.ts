import type { HistoryRepository } from '#server/db/repositories/history.ts';
import type { Clock } from '../domain/clock.ts';
import type { HistorySettings } from '../domain/history/history-settings.ts';

const DAY = 86_400_000;
/** Calls forgotten in one transaction: some milliseconds, so that calls waiting to be recorded hardly notice. */
const AT_A_TIME = 1_000;

export interface PruneContext {
  readonly history: Pick<HistoryRepository, 'prune'>;
  readonly historySettings: HistorySettings;
  readonly clock: Clock;
}

/** Forgets the calls that are older than the workspace keeps them; returns how many. The meter and the runs stay. */
export async function pruneHistory({ history, historySettings, clock }: PruneContext, atATime = AT_A_TIME): Promise<number> {
  const { retentionDays } = historySettings.current;
  if (retentionDays === null) return 0;
  const before = clock() - retentionDays * DAY;
  let forgotten = 0;
  for (;;) {
    const deleted = await history.prune(before, atATime);
    forgotten += deleted;
    if (deleted < atATime) return forgotten;
  }
}
