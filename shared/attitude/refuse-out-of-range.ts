import { AttitudeError } from './errors.ts';

/**
 * Largest size of a component of a rate or a vector. Products of three such numbers and their squares stay within the
 * range of a double, so that no answer overflows; no measurement comes near it.
 */
export const LARGEST_COMPONENT = 1e100;

/**
 * @param width - numbers a row. @param noun - what a row is, for the error. @param first - index of the first row.
 * @throws AttitudeError `not-finite` or `out-of-range`, naming every bad number.
 */
export function refuseOutOfRange(numbers: Float64Array, width: number, noun: string, first = 0): void {
  const bad = [...numbers.keys()].filter((k) => !(Math.abs(numbers[k]!) <= LARGEST_COMPONENT));
  if (bad.length === 0) return;
  const finite = bad.every((k) => Number.isFinite(numbers[k]));
  throw new AttitudeError(finite ? 'out-of-range' : 'not-finite', `${noun} ${first + Math.floor(bad[0]! / width)} has a number that is ${finite ? `beyond ±${LARGEST_COMPONENT}` : 'not finite'}.`, bad.map((k) => ({
    index: first + Math.floor(k / width), component: k % width, message: `is ${numbers[k]}; it must be a number within ±${LARGEST_COMPONENT}`,
  })));
}
