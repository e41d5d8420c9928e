import type { AttitudeWarning } from '#shared/attitude/warnings.ts';
import { WorkerThread } from '../threads/worker-thread.ts';
import type { Batch, ConvertedBatch, WantsCrossCheck } from './batch.ts';
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

/**
 * Long batches and streams, parsed, converted and written in a thread of their own, so that the service goes on
 * answering meanwhile. Streams take turns part by part.
 */
export class BatchThread {
  readonly #thread = new WorkerThread<BatchRequest, BatchReply>('dist/server/batch-worker.js');

  convert = (batch: Batch): Promise<ConvertedBatch | WantsCrossCheck> => this.#thread.ask({ kind: 'batch', batch }) as Promise<ConvertedBatch | WantsCrossCheck>;

  /** @throws AttitudeError where the two conventions cannot be converted into one another. */
  async open(stream: string, opening: StreamOpening): Promise<OpenStream> {
    await this.#thread.ask({ kind: 'open', stream, opening });
    return {
      part: (bytes, last, whole) => this.#thread.ask({ kind: 'part', stream, bytes, last, whole }) as Promise<ConvertedPart>,
      close: async () => (await this.#thread.ask({ kind: 'close', stream }) as { warnings: AttitudeWarning[] }).warnings,
    };
  }

  close = (): Promise<void> => this.#thread.close();
}
