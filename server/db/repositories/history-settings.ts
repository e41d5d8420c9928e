import type { Database } from '../database.ts';
import { select } from '../select.ts';

export interface HistorySettingsRow {
  /** Whether bodies of computing calls are kept, up to 64 KiB each. */
  readonly keepBodies: boolean;
  /** Days after which a call is forgotten; null for never. */
  readonly retentionDays: number | null;
}

export interface HistorySettingsRepository {
  read(): Promise<HistorySettingsRow>;
  write(settings: HistorySettingsRow, by: string, at: number): Promise<void>;
}

export function historySettingsRepository({ sequelize, writes }: Database): HistorySettingsRepository {
  return {
    read: async () => {
      const [row] = await select<{ keepBodies: number; retentionDays: number | null }>(sequelize, 'SELECT keep_bodies AS keepBodies, retention_days AS retentionDays FROM history_settings WHERE id = 1');
      return { keepBodies: row!.keepBodies === 1, retentionDays: row!.retentionDays };
    },
    write: ({ keepBodies, retentionDays }, by, at) => writes.run(async (transaction) => {
      await sequelize.query('UPDATE history_settings SET keep_bodies = $1, retention_days = $2, updated_at = $3, updated_by = $4 WHERE id = 1', { bind: [keepBodies ? 1 : 0, retentionDays, at, by], transaction });
    }),
  };
}
