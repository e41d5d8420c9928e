import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Response } from 'express';
import type { Logger } from 'pino';

export const isStream = (answer: unknown): answer is AsyncIterable<string> => typeof answer === 'object' && answer !== null && Symbol.asyncIterator in answer;

/**
 * Sends an answer as it is made, as fast as it is taken. What fails on the way can no longer be answered with a problem:
 * the connection is broken off, so that nobody takes half an answer for a whole one.
 */
export async function sendStream(response: Response, parts: AsyncIterable<string>, { logger, requestId }: { logger: Logger; requestId: string }): Promise<void> {
  try {
    await pipeline(Readable.from(parts), response);
  } catch (error) {
    if ((error as { code?: string }).code !== 'ERR_STREAM_PREMATURE_CLOSE') logger.error({ err: error, requestId }, 'answer broken off');
    response.destroy();
  }
}
