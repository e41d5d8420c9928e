import type { Convention } from '../../../../../shared/attitude/convention.ts';
import { createConverter } from '../../../../../shared/attitude/converter.ts';
import { AttitudeError } from '../../../../../shared/attitude/errors.ts';
import { readingOf } from '../../../../../shared/attitude/reading.ts';
import type { AttitudeWarning } from '../../../../../shared/attitude/warnings.ts';
import { readNumber } from '../../../lib/read-number.ts';
import { inRepresentation, REPRESENTATIONS } from './facet-choices.ts';

export interface Computed {
  readonly numbers: readonly number[];
  readonly warnings: readonly AttitudeWarning[];
  readonly reading: string;
  /** Angle left to gimbal lock of the target's angles, or of yaw, pitch, roll where the target has none. Degrees. */
  readonly marginDeg: number;
  readonly condition: number | null;
  /** The attitude in every representation between the target's axes; an error where one does not exist. */
  readonly every: readonly { readonly convention: Convention; readonly numbers: readonly number[] | string }[];
}

export interface Refused {
  readonly refusal: string;
  /** Which numbers are no numbers. */
  readonly bad: readonly number[];
}

/** The numbers as typed, read without guessing: a decimal comma, a unit or an empty field is no number. */
export function readNumbers(texts: readonly string[]): { values: number[]; bad: number[] } {
  const values = texts.map((text) => readNumber(text.trim()));
  return { values, bad: values.flatMap((value, i) => (Number.isFinite(value) ? [] : [i])) };
}

/** Converts with the same core as the service. */
export function compute(from: Convention, to: Convention, texts: readonly string[]): Computed | Refused {
  const { values, bad } = readNumbers(texts);
  if (bad.length > 0) return { refusal: `${bad.length === 1 ? 'One number is' : `${bad.length} numbers are`} missing or not a number.`, bad };
  try {
    const input = Float64Array.from(values);
    const converter = createConverter(from, to);
    const numbers = Array.from(converter.convert(input));
    const angles = to.representation === 'euler' ? to : inRepresentation(to, 'euler');
    const every = REPRESENTATIONS.map((representation) => inRepresentation(to, representation)).map((convention) => ({ convention, numbers: converted(from, convention, input) }));
    return { numbers, warnings: converter.warnings(), reading: readingOf(from, values), ...lockOf(from, angles, input), every };
  } catch (error) {
    if (error instanceof AttitudeError) return { refusal: error.message, bad: [] };
    throw error;
  }
}

function converted(from: Convention, to: Convention, input: Float64Array): number[] | string {
  try {
    return Array.from(createConverter(from, to).convert(input));
  } catch (error) {
    if (error instanceof AttitudeError) return error.faults[0]?.message ?? error.message;
    throw error;
  }
}

/** How near lock the angles are: with the warning limit at 90° every attitude is reported on. */
function lockOf(from: Convention, angles: Convention, input: Float64Array): { marginDeg: number; condition: number | null } {
  try {
    const converter = createConverter(from, angles, { warnWithinDeg: 90.0001 });
    converter.convert(input);
    const worst = converter.warnings().map((warning) => warning.worst).find(({ marginDeg }) => marginDeg !== undefined);
    return { marginDeg: worst?.marginDeg ?? 90, condition: worst?.condition === undefined ? 1 : worst.condition };
  } catch (error) {
    if (error instanceof AttitudeError) return { marginDeg: NaN, condition: null };
    throw error;
  }
}
