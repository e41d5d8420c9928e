import { runInThisContext } from 'node:vm';
import { describe, expect, it } from 'vitest';
import { DIGESTED, digest, digests } from '#tests/support/digest.ts';
import { digestBundle } from '#tests/support/digest-bundle.ts';
import pinned from '#tests/support/digests.json' with { type: 'json' };

// tests/browser/bit-identity.test.ts asks the same of a browser's engine.
describe('the bits that the core answers', () => {
  it(`are those pinned, over ${DIGESTED} conversions of each kind`, async () => {
    // As one script, since the test runner's module wrapping slows the core tenfold.
    const core = runInThisContext(`${await digestBundle()}; core`) as { digests: typeof digests };
    expect(core.digests(DIGESTED)).toEqual(pinned);
  }, 60_000);
});

describe('digest', () => {
  it('tells any bit apart', () => {
    const numbers = [0, -0, 1, 1 + 2 ** -52, -1, 5e-324, 2 ** 900];
    expect(new Set(numbers.map((number) => digest(Float64Array.of(number)))).size).toBe(numbers.length);
    expect(digest(Float64Array.of(1, 2))).not.toBe(digest(Float64Array.of(2, 1)));
  });

  it('covers every pair of conventions', () => expect(Object.keys(digests(1))).toEqual(Object.keys(pinned)));
});
