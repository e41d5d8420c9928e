import { WorkerThread } from '../threads/worker-thread.ts';
import type { CrossCheckRequest, CrossCheckResult } from './cross-check.ts';

/** Runs cross-checks in a thread of its own: the 64-digit arithmetic takes milliseconds an attitude. */
export class CrossChecker {
  readonly #thread = new WorkerThread<CrossCheckRequest, CrossCheckResult>('dist/server/cross-check-worker.js');

  check = (request: CrossCheckRequest): Promise<CrossCheckResult> => this.#thread.ask(request);
  close = (): Promise<void> => this.#thread.close();
}
