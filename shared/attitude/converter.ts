import { NUMBERS_PER_ATTITUDE, type Convention } from './convention.ts';
import { decoderOf, isRefusal, type Decoded } from './decode.ts';
import { encoderOf } from './encode.ts';
import { AttitudeError, LISTED_AT_MOST, type AttitudeErrorCode, type AttitudeFault } from './errors.ts';
import { relabelMatrix, relabelQuaternion, relabellingBetween, relabellingQuaternions } from './relabelling.ts';
import { WarningTally } from './warning-tally.ts';
import type { AttitudeWarning } from './warnings.ts';

export interface ConverterOptions {
  /** What to do with numbers that are no rotation by more than 1e-6: refuse ("none", when absent) or take the nearest rotation. */
  readonly repair?: 'none' | 'nearest';
  /** Warn where an Euler answer is closer to gimbal lock than this, in degrees; 1 when absent. */
  readonly warnWithinDeg?: number;
}

/**
 * Turns attitudes in one convention into attitudes in another. One converter may be called for successive parts
 * of a stream: indices go on, warnings gather, and a "continuous" quaternion sign carries over.
 */
export interface Converter {
  readonly from: Convention;
  readonly to: Convention;
  readonly inputWidth: number;
  readonly outputWidth: number;
  /**
   * @param input - count × inputWidth numbers.
   * @param output - count × outputWidth numbers to write into; made when absent.
   * @throws AttitudeError naming every bad attitude of this call (first 100); then nothing counts as written.
   */
  convert(input: Float64Array, output?: Float64Array): Float64Array;
  /** Everything to be warned of so far. */
  warnings(): AttitudeWarning[];
}

/** @throws AttitudeError `unrelated-frames`, `improper-axes`, `invalid-convention`. */
export function createConverter(from: Convention, to: Convention, options: ConverterOptions = {}): Converter {
  const relabelling = relabellingBetween(from, to);
  const quaternions = relabellingQuaternions(relabelling);
  const decode = decoderOf(from, options.repair ?? 'none');
  const encode = encoderOf(to);
  const tally = new WarningTally(options.warnWithinDeg ?? 1);
  const inputWidth = NUMBERS_PER_ATTITUDE[from.representation];
  const outputWidth = NUMBERS_PER_ATTITUDE[to.representation];
  let converted = 0;

  function convert(input: Float64Array, output?: Float64Array): Float64Array {
    const count = input.length / inputWidth;
    if (!Number.isInteger(count)) throw new AttitudeError('count-mismatch', `${input.length} numbers are not a whole count of attitudes of ${inputWidth} numbers each.`);
    const out = output ?? new Float64Array(count * outputWidth);
    const faults = new Faults();
    for (let i = 0; i < count; i++) {
      const decoded = decode(input, i * inputWidth);
      if (isRefusal(decoded)) {
        faults.add(decoded.code, { index: converted + i, message: decoded.message, ...(decoded.component === undefined ? {} : { component: decoded.component }), ...(decoded.defect === undefined ? {} : { defect: decoded.defect }) });
        continue;
      }
      const encoded = encode(relabelled(decoded), out, i * outputWidth);
      if (encoded.notRepresentable) faults.add('not-representable', { index: converted + i, message: 'is a half turn, for which no Gibbs vector exists' });
      if (decoded.defect !== undefined) tally.repaired(converted + i, from.representation === 'dcm' ? 'reorthonormalised' : 'renormalised', decoded.defect);
      if (to.representation === 'euler' && encoded.cosine !== undefined) {
        const at = i * outputWidth;
        const listed: [number, number, number] = [out[at]!, out[at + 1]!, out[at + 2]!];
        const middle = listed[to.order.indexOf(2)]! * to.signs[1];
        tally.lock(converted + i, encoded.cosine, encoded.locked ?? false, to, listed, middle);
      }
    }
    faults.throwIfAny(count);
    // Nobody means −0: it would be written as 0 in JSON and differ from itself elsewhere.
    for (let k = 0; k < count * outputWidth; k++) out[k]! += 0;
    converted += count;
    return out;
  }

  function relabelled({ quaternion, matrix }: Decoded) {
    // Angles decode to both: a matrix keeps their exact zeros and ones, a quaternion their small rotations.
    const takesMatrix = to.representation === 'dcm' || to.representation === 'euler';
    if (matrix && (takesMatrix || !quaternion)) return { matrix: relabelMatrix(relabelling, matrix) };
    return { quaternion: relabelQuaternion(quaternions!, quaternion!) };
  }

  return { from, to, inputWidth, outputWidth, convert, warnings: () => tally.warnings() };
}

/** What is wrong with a batch: the first kind of fault names the error, every attitude at fault is counted. */
class Faults {
  #code: AttitudeErrorCode | null = null;
  #count = 0;
  readonly #listed: AttitudeFault[] = [];

  add(code: AttitudeErrorCode, fault: AttitudeFault): void {
    this.#code ??= code;
    this.#count++;
    if (this.#listed.length < LISTED_AT_MOST) this.#listed.push(fault);
  }

  throwIfAny(count: number): void {
    if (this.#code === null) return;
    const first = this.#listed[0]!;
    const subject = this.#count === 1 ? 'One attitude' : `${this.#count} attitudes`;
    throw new AttitudeError(this.#code, `${subject} of ${count} cannot be used; attitude ${first.index} ${first.message}.`, this.#listed, this.#count);
  }
}
