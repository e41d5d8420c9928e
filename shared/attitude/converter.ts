import { scratch } from './arithmetic/scratch.ts';
import { COSINE, DEFECT } from './arithmetic/slots.ts';
import { NUMBERS_PER_ATTITUDE, type Convention, type EulerConvention } from './convention.ts';
import { AttitudeError, LISTED_AT_MOST, type AttitudeErrorCode, type AttitudeFault } from './errors.ts';
import { LOCKED, NOT_REPRESENTABLE, REFUSED, REPAIRED } from './kernels/status.ts';
import { pipelineBetween } from './pipeline.ts';
import { refusalOf } from './refusal.ts';
import { determinantOf } from './relabelling.ts';
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
  /**
   * As `convert`, but ends before the first bad attitude and says what is wrong with it: everything before it counts
   * as converted, nothing after it has been looked at. For parts of a stream whose beginning has been answered.
   */
  convertUntilRefused(input: Float64Array): { readonly output: Float64Array; readonly refusal: AttitudeError | null };
  /** Everything to be warned of so far. */
  warnings(): AttitudeWarning[];
}

/** @throws AttitudeError `unrelated-frames`, `improper-axes`, `invalid-convention`. */
export function createConverter(from: Convention, to: Convention, options: ConverterOptions = {}): Converter {
  refuseImproper(from);
  refuseImproper(to);
  const { read, write } = pipelineBetween(from, to, options.repair ?? 'none');
  const tally = new WarningTally(options.warnWithinDeg ?? 1);
  const inputWidth = NUMBERS_PER_ATTITUDE[from.representation];
  const outputWidth = NUMBERS_PER_ATTITUDE[to.representation];
  const repairCode = from.representation === 'dcm' ? 'reorthonormalised' : 'renormalised';
  // Every cosine below this may be worth a warning; the tally decides.
  const cosineToReport = to.representation === 'euler' ? Math.min(1, (options.warnWithinDeg ?? 1) / 57) + 1e-6 : 0;
  let converted = 0;

  function convert(input: Float64Array, output?: Float64Array): Float64Array {
    const out = output ?? new Float64Array((input.length / inputWidth) * outputWidth);
    const { faults, count } = convertInto(input, out, false);
    faults.throwIfAny(count);
    converted += count;
    return out;
  }

  function convertUntilRefused(input: Float64Array): { output: Float64Array; refusal: AttitudeError | null } {
    const out = new Float64Array(Math.floor(input.length / inputWidth) * outputWidth);
    const { faults, count, done } = convertInto(input, out, true);
    const refusal = faults.error(count);
    converted += done;
    return { output: out.subarray(0, done * outputWidth), refusal };
  }

  function convertInto(input: Float64Array, out: Float64Array, stopAtFault: boolean): { faults: Faults; count: number; done: number } {
    const count = input.length / inputWidth;
    if (!Number.isInteger(count)) throw new AttitudeError('count-mismatch', `${input.length} numbers are not a whole count of attitudes of ${inputWidth} numbers each.`);
    const faults = new Faults();
    let i = 0;
    for (; i < count; i++) {
      if (stopAtFault && faults.any) break;
      const status = read(input, i * inputWidth);
      if (status === REFUSED) {
        const { code, ...fault } = refusalOf(from, input.slice(i * inputWidth, (i + 1) * inputWidth));
        faults.add(code, { index: converted + i, ...fault });
        continue;
      }
      if (status === REPAIRED) tally.repaired(converted + i, repairCode, scratch[DEFECT]!);
      const written = write(out, i * outputWidth);
      if (written === NOT_REPRESENTABLE) faults.add('not-representable', { index: converted + i, message: 'is a half turn, for which no Gibbs vector exists' });
      else if (scratch[COSINE]! < cosineToReport && to.representation === 'euler') reportLock(i, written === LOCKED, to, out);
    }
    return { faults, count, done: faults.any ? i - 1 : i };
  }

  function reportLock(i: number, locked: boolean, convention: EulerConvention, out: Float64Array): void {
    const at = i * outputWidth;
    const listed: [number, number, number] = [out[at]!, out[at + 1]!, out[at + 2]!];
    const middle = listed[convention.order.indexOf(2)]! * convention.signs[1];
    tally.lock(converted + i, scratch[COSINE]!, locked, convention, listed, middle);
  }

  return { from, to, inputWidth, outputWidth, convert, convertUntilRefused, warnings: () => tally.warnings() };
}

function refuseImproper(convention: Convention): void {
  if (convention.representation === 'dcm' || determinantOf(convention) > 0) return;
  throw new AttitudeError('improper-axes', `${convention.reference} and ${convention.body} differ in handedness: their component matrix has determinant −1, which the representation "${convention.representation}" cannot express. Use "dcm", or two sets of the same handedness.`);
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

  get any(): boolean {
    return this.#code !== null;
  }

  throwIfAny(count: number): void {
    const error = this.error(count);
    if (error) throw error;
  }

  error(count: number): AttitudeError | null {
    if (this.#code === null) return null;
    const first = this.#listed[0]!;
    const subject = this.#count === 1 ? 'One attitude' : `${this.#count} attitudes`;
    return new AttitudeError(this.#code, `${subject} of ${count} cannot be used; attitude ${first.index} ${first.message}.`, this.#listed, this.#count);
  }
}
