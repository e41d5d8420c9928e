import fc from 'fast-check';
import { expect, it } from 'vitest';
import { readNumber } from '../../../web/src/lib/read-number.ts';

it.each(['', ' ', '0,5', '10deg', '0x10', '1e400', 'NaN', 'Infinity', '1_000', '--1', '1e', '.', '٣'])('does not guess what %j means', (text) => {
  expect(readNumber(text)).toBeNaN();
});

it.each([['-0', -0], ['.5', 0.5], ['5.', 5], ['+1e-3', 0.001], ['4.9e-324', 5e-324]] as const)('reads %s', (text, value) => {
  expect(Object.is(readNumber(text), value)).toBe(true);
});

it('reads back every finite double as JavaScript writes it', () => {
  fc.assert(fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => Object.is(readNumber(String(value)), Object.is(value, -0) ? 0 : value)));
});
