import type { Logger } from 'pino';

export interface Job {
  readonly name: string;
  readonly everyMs: number;
  /** Returns what it did, for the log; nothing is logged where that is 0. */
  run(): Promise<number>;
}

/** Runs each job at once and then again and again, never twice at a time; a job that fails is logged and tried again. */
export function startJobs(jobs: readonly Job[], logger: Logger): { stop(): Promise<void> } {
  const stops = jobs.map((job) => {
    let running: Promise<void> | null = null;
    const start = (): void => {
      running ??= job.run().then(
        (done) => { if (done > 0) logger.info({ job: job.name, done }, 'job done'); },
        (error: unknown) => logger.error({ err: error, job: job.name }, 'job failed'),
      ).finally(() => { running = null; });
    };
    start();
    const timer = setInterval(start, job.everyMs).unref();
    return async () => {
      clearInterval(timer);
      await running;
    };
  });
  return { stop: async () => void await Promise.all(stops.map((stop) => stop())) };
}
