import { parentPort } from 'node:worker_threads';
import { WorkerFailure } from './failure.ts';

/** Answers the requests of a WorkerThread, one after another. `giving` names the buffers of a result that move instead of being copied. */
export function serveThread<Request, Result>(work: (request: Request) => Result | Promise<Result>, giving: (result: Result) => ArrayBuffer[] = () => []): void {
  let before: Promise<void> = Promise.resolve();
  parentPort!.on('message', ({ id, request }: { readonly id: number; readonly request: Request }) => {
    before = before.then(async () => {
      try {
        const result = await work(request);
        parentPort!.postMessage({ id, result }, giving(result));
      } catch (error) {
        parentPort!.postMessage({ id, failure: WorkerFailure.of(error) });
      }
    });
  });
}
