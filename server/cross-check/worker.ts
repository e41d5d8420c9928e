import { parentPort } from 'node:worker_threads';
import { crossCheck, type CrossCheckRequest } from './cross-check.ts';

/** One request after another: the 64-digit arithmetic takes milliseconds an attitude and must not hold up the service. */
parentPort!.on('message', ({ id, request }: { id: number; request: CrossCheckRequest }) => {
  try {
    parentPort!.postMessage({ id, result: crossCheck(request) });
  } catch (error) {
    parentPort!.postMessage({ id, error: error instanceof Error ? (error.stack ?? error.message) : String(error) });
  }
});
