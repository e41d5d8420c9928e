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

/** |x| 2^260; what lies below 2^-260 is cut off. */
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
  // In two steps, the smaller first: 2^-1290 is no double, and 2^1030 is none either.
  return Number(kept) * 2 ** -Number(WHOLE_BITS) * 2 ** (excess - Number(REST_BITS));
}

/**
 * x = k π/1536 + r for an angle of any size in radians, in integers: the double at slot `at` and its low part.
 * Leaves k mod 3072 and r as a pair at REDUCED. Rare, so plain.
 */
export function reduceLargeAngle(at: number): void {
  const x = scratch[at]!;
  const whole = scaled(x) << WHOLE_BITS;
  const twoPi = 2n * scaledPi();
  const k = (whole * 3072n + twoPi / 2n) / twoPi;
  const rest = toPair((whole * 3072n - k * twoPi) / 3072n);
  const sign = x < 0 ? -1 : 1;
  scratch[REDUCED] = sign * Number(k % 3072n) + 0;
  scratch[REDUCED + 1] = sign * rest[0];
  scratch[REDUCED + 2] = sign * rest[1] + scratch[at + 1]!;
}

/**
 * Half the length of a vector of any size, less whole turns, as a pair at slot `at`: a length rounded first, even to
 * 106 bits, would leave nothing of a rotation vector of many turns.
 */
export function reduceHalfLength(x: number, y: number, z: number, unit: 'deg' | 'rad', at: number): void {
  const square = [x, y, z].reduce((sum, component) => sum + scaled(component) ** 2n, 0n);
  const half = squareRoot(square) << (WHOLE_BITS - 1n);
  const turn = unit === 'deg' ? 360n << BITS : 2n * scaledPi();
  [scratch[at], scratch[at + 1]] = toPair(half % turn);
}

function squareRoot(value: bigint): bigint {
  let guess = 1n << BigInt((value.toString(2).length >> 1) + 1);
  for (;;) {
    const next = (guess + value / guess) >> 1n;
    if (next >= guess) return guess;
    guess = next;
  }
}

/** A multiple of 2^-1290 as a pair hi, lo. */
function toPair(value: bigint): [number, number] {
  const hi = toDouble(value);
  return [hi, toDouble(value - fromDouble(hi))];
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
