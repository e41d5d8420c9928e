import { scratch } from './scratch.ts';

/** Slot where a reduction leaves steps (mod a whole turn), rest hi, rest lo. */
export const REDUCED = 124;

/** Bits below the unit that the rest is known to; enough for the closest that a double comes to a multiple of π/1536. */
const REST_BITS = 260n;
/** Bits of the largest double above the unit. */
const WHOLE_BITS = 1030n;
const BITS = REST_BITS + WHOLE_BITS;

let pi: bigint | null = null;

/** π 2^1290 by Machin's formula, 16 atan(1/5) − 4 atan(1/239). Made when an angle first needs it. */
function scaledPi(): bigint {
  if (pi !== null) return pi;
  const arc = (n: bigint): bigint => {
    let power = (1n << (BITS + 16n)) / n;
    let sum = 0n;
    for (let k = 1n; power !== 0n; k += 2n) {
      sum += k % 4n === 1n ? power / k : -power / k;
      power /= n * n;
    }
    return sum;
  };
  pi = (16n * arc(5n) - 4n * arc(239n)) >> 16n;
  return pi;
}

/** |x| 2^260 for |x| ≥ 1. */
function scaled(x: number): bigint {
  let integer = Math.abs(x);
  let shift = 0n;
  while (!Number.isInteger(integer)) {
    integer *= 2;
    shift++;
  }
  return (BigInt(integer) << REST_BITS) >> shift;
}

/** A signed integer × 2^-1290 as the double nearest to it. */
function toDouble(value: bigint): number {
  if (value < 0n) return -toDouble(-value);
  const excess = Math.max(0, value.toString(2).length - 53);
  const kept = excess === 0 ? value : (value + (1n << BigInt(excess - 1))) >> BigInt(excess);
  // In two steps: 2^-1290 is no double.
  return Number(kept) * 2 ** (excess - Number(REST_BITS)) * 2 ** -Number(WHOLE_BITS);
}

/**
 * x = k π/1536 + r for an angle of any size in radians, in integers: the double at slot `at` and its low part.
 * Leaves k mod 3072 and r as a pair at REDUCED. Rare, so plain.
 */
export function reduceLargeAngle(at: number): void {
  const x = scratch[at]!;
  const low = scratch[at + 1]!;
  reduceScaled(scaled(x), x < 0);
  scratch[REDUCED + 2]! += low;
}

/** The same for an angle given as `size` 2^-260 and its sign. */
export function reduceScaled(size: bigint, negative: boolean): void {
  const whole = size << WHOLE_BITS;
  const twoPi = 2n * scaledPi();
  const turned = ((whole * 3072n) / twoPi + 1n) >> 0n;
  const k = turned - (turned * twoPi - whole * 3072n > twoPi / 2n ? 1n : 0n);
  const rest = (whole * 3072n - k * twoPi) / 3072n;
  const hi = toDouble(rest);
  const hiScaled = rest - fromDouble(hi);
  const sign = negative ? -1 : 1;
  scratch[REDUCED] = sign * Number(k % 3072n) + 0;
  scratch[REDUCED + 1] = sign * hi;
  scratch[REDUCED + 2] = sign * toDouble(hiScaled);
}

function fromDouble(value: number): bigint {
  if (value < 0) return -fromDouble(-value);
  let integer = value;
  let shift = 0n;
  while (!Number.isInteger(integer)) {
    integer *= 2;
    shift++;
  }
  return (BigInt(integer) << BITS) >> shift;
}
