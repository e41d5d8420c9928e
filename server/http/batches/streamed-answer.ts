import type { Response } from 'express';
import type { AttitudeWarning } from '#shared/attitude/warnings.ts';
import { subjectOf } from '#server/domain/caller.ts';
import { meterWarnings } from '#server/domain/attitude/meter-warnings.ts';
import type { QuotaMeter } from '#server/domain/meter.ts';
import type { Services } from '#server/services.ts';
import type { Encoder } from '#server/streaming/encode/encoder.ts';
import type { Refusal } from '#server/streaming/refusal.ts';
import type { ConvertedPart } from '#server/streaming/streamed-conversion.ts';
import type { Call } from '../call.ts';
import { record } from '../record.ts';
import { BrokenOffError } from './body.ts';

/** The history's code of a stream that has not ended, and of one whose process was killed. */
const UNFINISHED = 'unfinished';
/** The history's code of a stream whose caller went away. */
const BROKEN_OFF = 'broken-off';

/**
 * An answer that leaves in parts. Its history row is committed before the first part leaves, each part's attitudes are
 * committed to row and meter before that part leaves, and the row's end before the answer's: nothing that was answered is
 * lost, whatever happens to the process, and what looks whole is recorded as whole.
 */
export class StreamedAnswer {
  /** Whether anything has left: then there is no way back to a problem document. */
  started = false;
  /** Why the answer ends before the body does. */
  refusal: Refusal | null = null;
  /** Attitudes answered so far. */
  #rows = 0;
  readonly #services: Services;
  readonly #call: Call;
  readonly #meter: QuotaMeter;
  readonly #route: string;
  readonly #encoder: Encoder;
  readonly #contentType: string;

  constructor(services: Services, call: Call, meter: QuotaMeter, route: string, encoder: Encoder, contentType: string) {
    this.#services = services;
    this.#call = call;
    this.#meter = meter;
    this.#route = route;
    this.#encoder = encoder;
    this.#contentType = contentType;
  }

  /** A part that is not the last of an answer; resolves when it has been handed to the connection and there is room for more. */
  async part({ output, attitudes, refusal }: ConvertedPart): Promise<void> {
    this.#rows += attitudes;
    if (!this.started) {
      this.#reserveAll(attitudes);
      await record(this.#services, this.#call, this.#route, 200, UNFINISHED);
      this.#meter.settle(true);
      this.#begin();
      await this.#write(output);
      return;
    }
    const granted = this.#meter.spendUpTo(attitudes);
    if (granted > 0) await this.#services.streamedCalls.advance({ requestId: this.#call.id, subject: subjectOf(this.#call.caller!), at: this.#call.startedAt, attitudes: granted });
    this.#meter.settle(true);
    this.refusal = refusal;
    if (granted < attitudes) {
      this.#rows -= attitudes - granted;
      const { code, message } = this.#meter.quotaExceeded(attitudes - granted);
      this.refusal = { code, message, row: this.#rows + 1, items: [] };
    }
    await this.#write(granted < attitudes ? this.#encoder.cut(output, granted) : output);
  }

  /** An answer that is complete in one part is recorded and sent like any other. */
  async only({ output, attitudes }: ConvertedPart, warnings: readonly AttitudeWarning[]): Promise<void> {
    this.#rows = attitudes;
    this.#reserveAll(attitudes);
    meterWarnings(this.#meter, warnings);
    await record(this.#services, this.#call, this.#route, 200, null);
    this.#meter.settle(true);
    this.#begin();
    await this.#write(output);
    this.#finish(warnings);
  }

  /** Ends an answer that has begun, in its own format; its end is on record first. */
  async end(warnings: readonly AttitudeWarning[]): Promise<void> {
    meterWarnings(this.#meter, warnings);
    await this.#recordEnd(this.refusal?.code ?? null, this.refusal && { row: this.refusal.row, detail: this.refusal.message });
    this.#finish(warnings);
  }

  /** Breaks off an answer that cannot be ended: whoever reads it sees that it is not whole. */
  async breakOff(error: unknown): Promise<void> {
    this.#call.response.destroy();
    this.#meter.settle(false);
    const gone = error instanceof BrokenOffError;
    if (!gone) this.#services.logger.error({ err: error, requestId: this.#call.id, route: this.#route }, 'streamed answer broken off');
    await this.#recordEnd(gone ? BROKEN_OFF : 'internal', { row: null, detail: gone ? error.message : 'The service failed in mid-stream.' })
      .catch((recordError: unknown) => this.#services.logger.error({ err: recordError, requestId: this.#call.id }, 'end of a streamed answer could not be recorded'));
  }

  #reserveAll(attitudes: number): void {
    if (this.#meter.spendUpTo(attitudes) < attitudes) {
      this.#meter.settle(false);
      throw this.#meter.quotaExceeded(attitudes);
    }
  }

  #begin(): void {
    this.started = true;
    const { response } = this.#call;
    response.status(200).setHeader('Content-Type', this.#contentType);
    response.setHeader('Trailer', 'Dextral-Problem, Dextral-Warnings');
    response.write(this.#encoder.opening);
  }

  #finish(warnings: readonly AttitudeWarning[]): void {
    const { response, id } = this.#call;
    if (this.refusal) response.write(this.#encoder.refusal(this.refusal, id));
    else response.write(this.#encoder.closing({ attitudes: this.#rows, warnings }));
    // Structured fields (RFC 9651).
    response.addTrailers({
      ...(this.refusal ? { 'Dextral-Problem': `${this.refusal.code}${this.refusal.row === null ? '' : `;row=${this.refusal.row}`}` } : {}),
      ...(warnings.length > 0 ? { 'Dextral-Warnings': warnings.map(({ code, count }) => `${code};count=${count}`).join(', ') } : {}),
    });
    response.end();
  }

  #recordEnd(code: string | null, refusal: { row: number | null; detail: string } | null): Promise<void> {
    const { id, startedNs } = this.#call;
    const { warnings, warningCodes } = this.#meter;
    return this.#services.streamedCalls.end({ requestId: id, code, durationUs: Number((process.hrtime.bigint() - startedNs) / 1000n), warnings, warningCodes, refusal });
  }

  async #write(bytes: Uint8Array): Promise<void> {
    const { response } = this.#call;
    if (response.destroyed) throw new BrokenOffError('The connection was closed before the answer was complete.');
    if (bytes.length > 0 && !response.write(bytes)) await roomIn(response);
  }
}

/** Waits until a connection takes more. @throws BrokenOffError where it is closed instead. */
function roomIn(response: Response): Promise<void> {
  return new Promise((resolve, reject) => {
    const settle = (done: () => void) => () => {
      response.off('drain', onDrain);
      response.off('close', onClose);
      done();
    };
    const onDrain = settle(resolve);
    const onClose = settle(() => reject(new BrokenOffError('The connection was closed before the answer was complete.')));
    response.on('drain', onDrain);
    response.on('close', onClose);
  });
}
