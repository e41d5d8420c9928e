import { Worker, type ResourceLimits } from 'node:worker_threads';
import { projectFile } from '../project-file.ts';
import { WorkerFailure, type Failure } from './failure.ts';

interface Waiting<Result> {
  readonly resolve: (result: Result) => void;
  readonly reject: (error: Error) => void;
}

export type Reply<Result> = { readonly id: number } & ({ readonly result: Result } | { readonly failure: Failure });

/** Work that would hold up the service, done in a thread of its own, started at the first request. */
export class WorkerThread<Request, Result> {
  readonly #file: string;
  readonly #limits: ResourceLimits;
  #worker: Worker | null = null;
  #next = 1;
  readonly #waiting = new Map<number, Waiting<Result>>();

  /** @param file - what npm run build:server makes of the thread, also where the rest runs from source. */
  constructor(file: string, limits: ResourceLimits = {}) {
    this.#file = file;
    this.#limits = limits;
  }

  /** @param given - Buffers that the request holds and the caller gives away: they move instead of being copied. */
  ask(request: Request, given: readonly ArrayBuffer[] = []): Promise<Result> {
    const worker = (this.#worker ??= this.#start());
    return new Promise((resolve, reject) => {
      const id = this.#next++;
      this.#waiting.set(id, { resolve, reject });
      worker.postMessage({ id, request }, given);
    });
  }

  async close(): Promise<void> {
    await this.#worker?.terminate();
    this.#failAll(new Error('The service is shutting down.'));
  }

  #start(): Worker {
    const worker = new Worker(projectFile(this.#file), { resourceLimits: this.#limits });
    worker.unref();
    worker.on('message', (reply: Reply<Result>) => {
      const waiting = this.#waiting.get(reply.id);
      this.#waiting.delete(reply.id);
      if ('result' in reply) waiting?.resolve(reply.result);
      else waiting?.reject(WorkerFailure.revive(reply.failure));
    });
    worker.on('error', (error) => this.#failAll(error instanceof Error ? error : new Error(String(error))));
    worker.on('exit', () => {
      this.#worker = null;
      this.#failAll(new Error(`${this.#file} ended early.`));
    });
    return worker;
  }

  #failAll(error: Error): void {
    for (const { reject } of this.#waiting.values()) reject(error);
    this.#waiting.clear();
  }
}
