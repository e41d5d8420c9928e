import type { HistorySettingsRepository, HistorySettingsRow } from '#server/db/repositories/history-settings.ts';

/** What the history keeps, in memory, so that a call costs no query; changed here and in the database together. */
export class HistorySettings {
  readonly #repository: HistorySettingsRepository;
  #current: HistorySettingsRow;

  private constructor(repository: HistorySettingsRepository, current: HistorySettingsRow) {
    this.#repository = repository;
    this.#current = current;
  }

  static async load(repository: HistorySettingsRepository): Promise<HistorySettings> {
    return new HistorySettings(repository, await repository.read());
  }

  get current(): HistorySettingsRow {
    return this.#current;
  }

  /** In force on the next call. */
  async change(settings: HistorySettingsRow, by: string, at: number): Promise<HistorySettingsRow> {
    await this.#repository.write(settings, by, at);
    this.#current = settings;
    return settings;
  }
}
