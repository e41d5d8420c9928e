import { coreOptions } from '#server/domain/attitude/convert.ts';
import { resolveConvention } from '#server/domain/conventions/resolve-convention.ts';
import { DomainError } from '#server/domain/errors.ts';
import { QuotaMeter } from '#server/domain/meter.ts';
import type { Services } from '#server/services.ts';
import type { ConvertedPart } from '#server/streaming/streamed-conversion.ts';
import { encoderOf, type Format } from '#server/streaming/formats.ts';
import type { Call } from '../call.ts';
import { HttpProblem } from '../problems.ts';
import { bodyParts, leaveBody } from './body.ts';
import { contentTypeOf } from './negotiate.ts';
import { readQuery } from './query.ts';
import { StreamedAnswer } from './streamed-answer.ts';

/** Bytes at the beginning that are answered whole or not at all. */
const FIRST_PART_BYTES = 1024 * 1024;
/** Bytes that are converted at a time after that. */
const PART_BYTES = 256 * 1024;
/** Converted bytes that wait at most while those before them are on their way. */
const GATHERED_BYTES = 512 * 1024;
/** A connection on which nothing moves for so long is given up. */
const STALLED_MS = 60_000;

/**
 * Answers rows with rows while they arrive, in memory that does not grow. What is wrong within the first part is refused
 * with a problem document; later the answer says so in its own format where the refused row would stand, and ends.
 */
export async function answerStream(services: Services, call: Call, route: string, { input, output }: { input: Format; output: Format }): Promise<void> {
  const { request, response, meter } = call;
  if (!(meter instanceof QuotaMeter)) throw new Error('A stream needs a metered caller.');
  const { from: statedFrom, to: statedTo, options } = readQuery(request);
  const [from, to] = [resolveConvention(statedFrom, '?from'), resolveConvention(statedTo, '?to')];
  const stream = await services.batches.open(call.id, { from, to, options: coreOptions(options), input, output });
  const answer = new StreamedAnswer(services, call, meter, route, encoderOf(output, to), contentTypeOf(output));
  response.setTimeout(STALLED_MS, () => request.socket.destroy());
  let sending: Promise<void> = Promise.resolve();
  let idle = true;
  let waiting: ConvertedPart | null = null;
  let first = true;
  let complete = false;
  let warnings = null;
  try {
    // Parts are converted while those before them are recorded and sent; what gathers meanwhile is recorded as one.
    for await (const { bytes, last } of bodyParts(request, FIRST_PART_BYTES, PART_BYTES)) {
      const part = await stream.part(bytes, last, first);
      if (first && part.refusal) throw new DomainError(part.refusal.code, part.refusal.message, part.refusal.items);
      if (first && last) {
        warnings = await stream.close();
        await answer.only(part, warnings);
        complete = true;
        break;
      }
      first = false;
      waiting = waiting ? joined(waiting, part) : part;
      const ends = last || part.refusal !== null;
      if (!idle && !ends && waiting.output.length < GATHERED_BYTES) continue;
      await sending;
      if (answer.refusal) break;
      idle = false;
      sending = answer.part(waiting).finally(() => { idle = true; });
      sending.catch(() => undefined);
      waiting = null;
      if (ends) break;
    }
    await sending;
  } catch (error) {
    await sending.catch(() => undefined);
    if (!answer.started) throw error;
    if (!(error instanceof HttpProblem)) {
      await answer.breakOff(error);
      return;
    }
    answer.refusal = { code: error.code, message: error.message, row: null, items: [] };
  } finally {
    warnings ??= await stream.close();
    leaveBody(request, response);
  }
  if (!complete) await answer.end(warnings).catch((error: unknown) => answer.breakOff(error));
}

const joined = (a: ConvertedPart, b: ConvertedPart): ConvertedPart => ({ output: Buffer.concat([a.output, b.output]), attitudes: a.attitudes + b.attitudes, refusal: b.refusal });
