import path from 'node:path';
import { mkdir } from 'node:fs/promises';
import type { Logger } from 'pino';
import type { Config } from './config.ts';
import { CrossChecker } from './cross-check/cross-checker.ts';
import { connect, disconnect, type Database } from './db/database.ts';
import { apiKeysRepository } from './db/repositories/api-keys.ts';
import { historySettingsRepository } from './db/repositories/history-settings.ts';
import { limitsRepository } from './db/repositories/limits.ts';
import { runsRepository } from './db/repositories/runs.ts';
import { streamedCallsRepository } from './db/repositories/streamed-calls.ts';
import { usageRepository } from './db/repositories/usage.ts';
import { historyRepository } from './db/repositories/history.ts';
import { peopleRepository } from './db/repositories/people.ts';
import { sessionsRepository } from './db/repositories/sessions.ts';
import type { Clock } from './domain/clock.ts';
import { HistorySettings } from './domain/history/history-settings.ts';
import { KeyRing } from './domain/keys/key-ring.ts';
import { LimitTable } from './domain/limits/limit-table.ts';
import { ParallelCalls } from './domain/limits/parallel-calls.ts';
import { Quota } from './domain/limits/quota.ts';
import { SessionTokens } from './domain/sessions/session-tokens.ts';
import { sessionCookie } from './http/cookie.ts';
import { createRateLimiter } from './http/rate-limiter.ts';
import { Identifier } from './identification/identifier.ts';
import { BatchThread } from './streaming/batch-thread.ts';

export interface ServiceOptions {
  readonly config: Config;
  readonly logger: Logger;
  readonly clock?: Clock;
}

/** Everything that the use cases work on, put together once. */
export async function createServices({ config, logger, clock = Date.now }: ServiceOptions) {
  await mkdir(config.dataDirectory, { recursive: true });
  const database: Database = await connect(path.join(config.dataDirectory, 'dextral.sqlite'));
  const apiKeys = apiKeysRepository(database);
  const crossChecker = new CrossChecker();
  const identifier = new Identifier();
  const batches = new BatchThread();
  const usage = usageRepository(database);
  return {
    config, logger, clock, database, apiKeys,
    people: peopleRepository(database),
    sessions: sessionsRepository(database),
    history: historyRepository(database),
    historySettings: await HistorySettings.load(historySettingsRepository(database)),
    usage,
    runs: runsRepository(database),
    streamedCalls: streamedCallsRepository(database),
    limits: await LimitTable.load(limitsRepository(database)),
    quota: new Quota(usage, clock),
    parallel: new ParallelCalls(),
    limitRate: createRateLimiter(),
    keyRing: new KeyRing(apiKeys, clock),
    tokens: new SessionTokens(config.sessionSecret),
    cookie: sessionCookie(config.publicUrl),
    crossChecker,
    identifier,
    batches,
    async close() {
      await crossChecker.close();
      await identifier.close();
      await batches.close();
      await disconnect(database);
    },
  };
}

export type Services = Awaited<ReturnType<typeof createServices>>;
