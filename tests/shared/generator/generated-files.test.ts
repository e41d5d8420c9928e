import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { arcTangent, fromDouble, ONE, PI, sine, toPair } from '#shared/generator/fixed-point.ts';
import { generatedFiles } from '#shared/generator/generated-files.ts';
import { BigNumber } from '#server/cross-check/big-number.ts';

it.each(generatedFiles())('%s is what the generator writes', (path, source) => {
  expect(readFileSync(new URL(`../../../shared/attitude/${path}`, import.meta.url), 'utf8')).toBe(source);
});

/** A fixed-point number in decimal, to 64 digits. */
const decimal = (x: bigint): BigNumber => new BigNumber(x.toString()).div(new BigNumber(ONE.toString()));

it('makes its tables from series that mathjs agrees with at 60 digits', () => {
  expect(decimal(PI).minus(BigNumber.acos(-1)).abs().lt('1e-60')).toBe(true);
  for (const x of [0.25, 1, 1.5]) {
    expect(decimal(sine(fromDouble(x))).minus(BigNumber.sin(x)).abs().lt('1e-60')).toBe(true);
    if (x <= 1) expect(decimal(arcTangent(fromDouble(x))).minus(BigNumber.atan(x)).abs().lt('1e-60')).toBe(true);
  }
  // π as a double-double: Hida, Li & Bailey 2001, QD library, quoted from memory.
  expect(toPair(PI)).toEqual([3.141592653589793116, 1.224646799147353207e-16]);
});
