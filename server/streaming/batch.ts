import { isUtf8 } from 'node:buffer';
import { convertInput, type ConvertInput, type ConvertOutput } from '#shared/api/attitude.ts';
import type { ConventionReference } from '#shared/api/convention.ts';
import { NUMBERS_PER_ATTITUDE, type Convention } from '#shared/attitude/convention.ts';
import type { AttitudeWarning } from '#shared/attitude/warnings.ts';
import { convertAttitudes } from '#server/domain/attitude/convert.ts';
import { resolveConvention } from '#server/domain/conventions/resolve-convention.ts';
import { DomainError } from '#server/domain/errors.ts';
import { BatchMeter } from '#server/domain/meter.ts';
import { explainIssues } from '../http/explain-issues.ts';
import { decoderOf, encoderOf, type Format } from './formats.ts';

/** A body of rows, with what JSON would have said of them. */
export interface RowsInput {
  readonly format: Format;
  readonly from: ConventionReference;
  readonly to: ConventionReference;
  readonly options: NonNullable<ConvertInput['options']>;
}

/** A call with JSON on one side at least: held whole, all or nothing. */
export interface Batch {
  readonly body: Uint8Array;
  /** Null where the body is JSON. */
  readonly rows: RowsInput | null;
  /** Null where the answer is JSON. */
  readonly output: Format | null;
  /** Attitudes that the caller may send in one call. */
  readonly most: number;
}

export interface ConvertedBatch {
  readonly output: Uint8Array;
  readonly attitudes: number;
  readonly warnings: readonly AttitudeWarning[];
}

/** A call that wants a cross-check, which runs in another thread; given back as it was understood. */
export interface WantsCrossCheck {
  readonly crossCheck: ConvertInput;
}

/**
 * A batch from its bytes to the bytes of its answer, by the same use case as any other call: a long one costs as much
 * to parse and to write as to compute.
 */
export async function convertBatch({ body, rows, output, most }: Batch): Promise<ConvertedBatch | WantsCrossCheck> {
  const input = rows ? fromRows(body, rows) : fromJson(body);
  if (input.options?.crossCheck && !output) return { crossCheck: input };
  const meter = new BatchMeter(most);
  const answer = await convertAttitudes({ crossChecker: { check: cannotCheck } }, input, meter);
  return { output: output ? encoded(answer, output) : Buffer.from(JSON.stringify(answer)), attitudes: meter.attitudes, warnings: answer.warnings as AttitudeWarning[] };
}

function fromJson(body: Uint8Array): ConvertInput {
  const parsed = parseJson(body);
  const checked = convertInput.safeParse(parsed);
  if (!checked.success) throw explainIssues(checked.error, parsed, 'body');
  return checked.data;
}

function parseJson(body: Uint8Array): unknown {
  if (body.length === 0) throw new DomainError('malformed-json', 'The body is empty.');
  if (!isUtf8(body)) throw new DomainError('malformed-json', 'The body is not valid UTF-8.');
  try {
    return JSON.parse(Buffer.from(body.buffer, body.byteOffset, body.byteLength).toString('utf8')) as unknown;
  } catch (error) {
    throw new DomainError('malformed-json', `The body is not valid JSON: ${(error as Error).message}. NaN and Infinity are not JSON.`);
  }
}

function fromRows(body: Uint8Array, { format, from, to, options }: RowsInput): ConvertInput {
  const convention = resolveConvention(from, '/from');
  const { numbers, refusal } = decoderOf(format, convention).decode(body, true);
  if (refusal) throw new DomainError(refusal.code, refusal.message, refusal.items);
  const width = NUMBERS_PER_ATTITUDE[convention.representation];
  const attitudes = Array.from({ length: numbers.length / width }, (_, index) => Array.from(numbers.subarray(index * width, (index + 1) * width)));
  return { from, to, attitudes, options };
}

function encoded({ attitudes, to, warnings }: ConvertOutput, output: Format): Uint8Array {
  const encoder = encoderOf(output, to as Convention);
  return Buffer.concat([encoder.opening, encoder.rows(Float64Array.from(attitudes.flat())), encoder.closing({ attitudes: attitudes.length, warnings: warnings as AttitudeWarning[] })]);
}

function cannotCheck(): never {
  throw new DomainError('invalid-field', 'A cross-check is part of a JSON answer; ask for application/json.', [{ pointer: '/options/crossCheck', message: 'needs a JSON answer' }]);
}
