import type { Decimal } from 'decimal.js';
import { all, create } from 'mathjs';

/** Decimal arithmetic of 64 digits, by mathjs; its types leave out the class of its numbers, which is Decimal's. */
const math = create(all!, { number: 'BigNumber', precision: 64 }) as unknown as { BigNumber: typeof Decimal };
export const BigNumber = math.BigNumber;
export type BigNumber = Decimal;

export const ZERO = new BigNumber(0);
export const ONE = new BigNumber(1);
export const TWO = new BigNumber(2);
export const PI = BigNumber.acos(-1);

const exponentOf = new DataView(new ArrayBuffer(8));

/** The exact value of a double (to 64 digits): from its mantissa and exponent, not from its shortest decimal. */
export function exactly(double: number): BigNumber {
  if (double === 0) return ZERO;
  exponentOf.setFloat64(0, double);
  const biased = (exponentOf.getUint16(0) >> 4) & 0x7ff;
  // 2^exponent is the value of the last bit; scaled so that both factors are doubles, also for subnormal numbers.
  const exponent = Math.max(biased, 1) - 1075;
  const half = Math.trunc(exponent / 2);
  return new BigNumber(double / 2 ** half / 2 ** (exponent - half)).times(BigNumber.pow(2, exponent));
}

/** |double − exact| in units of the last place of the double nearest to exact. */
export function ulpsBetween(double: number, exact: BigNumber): number {
  const nearest = Math.abs(exact.toNumber());
  exponentOf.setFloat64(0, nearest);
  const exponent = Math.max((exponentOf.getUint16(0) >> 4) & 0x7ff, 1) - 1075;
  return exactly(double).minus(exact).abs().div(BigNumber.pow(2, exponent)).toNumber();
}
