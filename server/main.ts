import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { ConfigError, readConfig, type Config } from './config.ts';
import { createPerson } from './domain/people/create-person.ts';
import { createApp } from './http/app.ts';
import { pruneHistory } from './jobs/prune-history.ts';
import { startJobs } from './jobs/schedule.ts';
import { createLogger } from './logger.ts';
import { createServices, type Services } from './services.ts';

const demo = process.argv.includes('--demo');

function configOrExit(): Config {
  try {
    return readConfig(process.env, { demo });
  } catch (error) {
    if (!(error instanceof ConfigError)) throw error;
    console.error(`Dextral cannot start:\n${error.problems.map((problem) => `  - ${problem}`).join('\n')}`);
    process.exit(2);
  }
}

/** A database without an administrator is of no use to anybody: the first one comes from the environment. */
async function ensureAdministrator(services: Services): Promise<void> {
  if (await services.people.countAdministrators() > 0) return;
  const { firstAdministrator } = services.config;
  if (!firstAdministrator) {
    console.error('Dextral cannot start:\n  - The database holds no administrator yet: set DEXTRAL_ADMIN_EMAIL and DEXTRAL_ADMIN_PASSWORD (at least 12 characters) for the first start.');
    process.exit(2);
  }
  await createPerson(services, { ...firstAdministrator, name: 'Administrator', role: 'administrator' });
}

const config = configOrExit();
const logger = createLogger();
const services = await createServices({ config, logger });
if (demo) {
  const { seedDemo } = await import('./demo/seed.ts');
  await seedDemo(services);
} else {
  await ensureAdministrator(services);
}

const HOUR = 3_600_000;
const jobs = startJobs([{ name: 'prune-history', everyMs: HOUR, run: () => pruneHistory(services) }], logger);

/** A stream may take as long as this to arrive; one that stalls is given up long before. */
const LONGEST_REQUEST_MS = 3_600_000;
const server = createServer({ requestTimeout: LONGEST_REQUEST_MS }, createApp(services));
server.listen(config.port, config.host, async () => {
  const { port } = server.address() as AddressInfo;
  const url = config.port === 0 ? `http://${config.host}:${port}` : config.publicUrl.origin;
  logger.info({ url }, 'listening');
  if (demo) {
    const { announceDemo } = await import('./demo/announce.ts');
    await announceDemo(config.dataDirectory, url);
  }
});

let stopping = false;
/** Answers what has arrived, commits what waits, then ends. */
function stop(signal: string): void {
  if (stopping) return;
  stopping = true;
  logger.info({ signal }, 'stopping');
  server.close(async () => {
    await jobs.stop();
    await services.close();
    logger.info('stopped');
    process.exit(0);
  });
  server.closeIdleConnections();
  setTimeout(() => server.closeAllConnections(), 10_000).unref();
}
process.on('SIGTERM', () => stop('SIGTERM'));
process.on('SIGINT', () => stop('SIGINT'));
