import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter, type Converter, type ConverterOptions } from '#shared/attitude/converter.ts';
import { AttitudeError } from '#shared/attitude/errors.ts';
import type { AttitudeWarning } from '#shared/attitude/warnings.ts';
import type { Decoder } from './decode/decoder.ts';
import type { Encoder } from './encode/encoder.ts';
import { decoderOf, encoderOf, type Format } from './formats.ts';
import { attitudeRefusal, type Refusal } from './refusal.ts';

export interface StreamOpening {
  readonly from: Convention;
  readonly to: Convention;
  readonly options: ConverterOptions;
  readonly input: Format;
  readonly output: Format;
}

/** What one part of a body became. */
export interface ConvertedPart {
  /** Attitudes converted, encoded. */
  readonly output: Uint8Array;
  readonly attitudes: number;
  /** Why the stream goes no further, after those attitudes. */
  readonly refusal: Refusal | null;
}

/** One stream on its way from bytes to bytes, part by part. What it holds does not grow with the stream. */
export class StreamedConversion {
  readonly #converter: Converter;
  readonly #decoder: Decoder;
  readonly #encoder: Encoder;
  #attitudes = 0;

  /** @throws AttitudeError where the two conventions cannot be converted into one another. */
  constructor({ from, to, options, input, output }: StreamOpening) {
    this.#converter = createConverter(from, to, options);
    this.#decoder = decoderOf(input, from);
    this.#encoder = encoderOf(output, to);
  }

  /**
   * @param whole - Nothing has been answered yet: a bad attitude refuses the whole part, and all bad ones are named.
   *   Later, everything before the bad one is answered.
   */
  convert(bytes: Uint8Array, last: boolean, whole: boolean): ConvertedPart {
    const { numbers, refusal: unread } = this.#decoder.decode(bytes, last);
    const { output, refusal } = whole ? this.#allOrNothing(numbers) : this.#converter.convertUntilRefused(numbers);
    const attitudes = output.length / this.#converter.outputWidth;
    this.#attitudes += attitudes;
    const refused = refusal ? attitudeRefusal(refusal) : unread ?? (last && this.#attitudes === 0 ? EMPTY : null);
    return { output: this.#encoder.rows(output), attitudes, refusal: refused };
  }

  warnings(): AttitudeWarning[] {
    return this.#converter.warnings();
  }

  #allOrNothing(numbers: Float64Array): { output: Float64Array; refusal: AttitudeError | null } {
    try {
      return { output: this.#converter.convert(numbers), refusal: null };
    } catch (error) {
      if (error instanceof AttitudeError) return { output: new Float64Array(0), refusal: error };
      throw error;
    }
  }
}

const EMPTY: Refusal = { code: 'count-mismatch', message: 'The body holds no attitude.', row: null, items: [{ pointer: '', message: 'must hold at least one attitude' }] };
