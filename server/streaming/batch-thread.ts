import type { AttitudeWarning } from '#shared/attitude/warnings.ts';
import { WorkerThread } from '../threads/worker-thread.ts';
import type { Batch, ConvertedBatch, WantsCrossCheck } from './batch.ts';
import { whollyOwned } from './owned.ts';
import type { ConvertedPart, StreamOpening } from './streamed-conversion.ts';

export type BatchRequest =
  | { readonly kind: 'batch'; readonly batch: Batch }
  | { readonly kind: 'open'; readonly stream: string; readonly opening: StreamOpening }
  | { readonly kind: 'part'; readonly stream: string; readonly bytes: Uint8Array; readonly last: boolean; readonly whole: boolean }
  | { readonly kind: 'close'; readonly stream: string };
export type BatchReply = ConvertedBatch | WantsCrossCheck | ConvertedPart | { readonly warnings: readonly AttitudeWarning[] } | null;

/** One stream as seen from outside its thread. */
export interface OpenStream {
  part(bytes: Uint8Array, last: boolean, whole: boolean): Promise<ConvertedPart>;
  /** What was warned of; the stream is forgotten. */
  close(): Promise<readonly AttitudeWarning[]>;
}

const WORKER = 'dist/server/batch-worker.js';
/** Streams hold a part each and little else; with the engine's usual allowance what they leave behind would pile up first. */
const STREAM_MEMORY = { maxYoungGenerationSizeMb: 3, maxOldGenerationSizeMb: 64 };

/**
 * Long batches and streams, parsed, converted and written in threads of their own, one for each kind, so that the
 * service goes on answering meanwhile. Streams take turns part by part, and never wait for a batch.
 */
export class BatchThread {
  readonly #batches = new WorkerThread<BatchRequest, BatchReply>(WORKER);
  readonly #streams = new WorkerThread<BatchRequest, BatchReply>(WORKER, STREAM_MEMORY);

  convert = (batch: Batch): Promise<ConvertedBatch | WantsCrossCheck> => this.#batches.ask({ kind: 'batch', batch }, whollyOwned(batch.body)) as Promise<ConvertedBatch | WantsCrossCheck>;

  /** @throws AttitudeError where the two conventions cannot be converted into one another. */
  async open(stream: string, opening: StreamOpening): Promise<OpenStream> {
    await this.#streams.ask({ kind: 'open', stream, opening });
    return {
      part: (bytes, last, whole) => this.#streams.ask({ kind: 'part', stream, bytes, last, whole }, whollyOwned(bytes)) as Promise<ConvertedPart>,
      close: async () => (await this.#streams.ask({ kind: 'close', stream }) as { warnings: AttitudeWarning[] }).warnings,
    };
  }

  async close(): Promise<void> {
    await Promise.all([this.#batches.close(), this.#streams.close()]);
  }
}
