import { Worker } from 'node:worker_threads';
import { projectFile } from '../project-file.ts';
import type { CrossCheckRequest, CrossCheckResult } from './cross-check.ts';

interface Waiting {
  readonly resolve: (result: CrossCheckResult) => void;
  readonly reject: (error: Error) => void;
}

type Reply = { readonly id: number } & ({ readonly result: CrossCheckResult } | { readonly error: string });

/** Runs cross-checks in a thread of its own, started at the first one. */
export class CrossChecker {
  #worker: Worker | null = null;
  #next = 1;
  readonly #waiting = new Map<number, Waiting>();

  check(request: CrossCheckRequest): Promise<CrossCheckResult> {
    const worker = (this.#worker ??= this.#start());
    return new Promise((resolve, reject) => {
      const id = this.#next++;
      this.#waiting.set(id, { resolve, reject });
      worker.postMessage({ id, request });
    });
  }

  async close(): Promise<void> {
    await this.#worker?.terminate();
    this.#failAll(new Error('The service is shutting down.'));
  }

  #start(): Worker {
    // A thread takes a file: the one that npm run build:server makes, also where the rest runs from source.
    const worker = new Worker(projectFile('dist/server/cross-check-worker.js'));
    worker.unref();
    worker.on('message', (reply: Reply) => {
      const waiting = this.#waiting.get(reply.id);
      this.#waiting.delete(reply.id);
      if ('result' in reply) waiting?.resolve(reply.result);
      else waiting?.reject(new Error(reply.error));
    });
    worker.on('error', (error) => this.#failAll(error instanceof Error ? error : new Error(String(error))));
    worker.on('exit', () => {
      this.#worker = null;
      this.#failAll(new Error('The cross-check ended early.'));
    });
    return worker;
  }

  #failAll(error: Error): void {
    for (const { reject } of this.#waiting.values()) reject(error);
    this.#waiting.clear();
  }
}
