import { parentPort } from 'node:worker_threads';
import { WorkerFailure } from './failure.ts';

/** Answers the requests of a WorkerThread, one after another. */
export function serveThread<Request, Result>(work: (request: Request) => Result | Promise<Result>): void {
  let before: Promise<void> = Promise.resolve();
  parentPort!.on('message', ({ id, request }: { readonly id: number; readonly request: Request }) => {
    before = before.then(async () => {
      try {
        parentPort!.postMessage({ id, result: await work(request) });
      } catch (error) {
        parentPort!.postMessage({ id, failure: WorkerFailure.of(error) });
      }
    });
  });
}
