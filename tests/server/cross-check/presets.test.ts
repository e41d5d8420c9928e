import { describe, expect, it } from 'vitest';
import { createConverter } from '#shared/attitude/converter.ts';
import { PRESETS } from '#shared/attitude/presets.ts';
import { crossCheck } from '#server/cross-check/cross-check.ts';
import { EULER_DEG } from '#tests/support/conventions.ts';

const WORKED = Float64Array.of(30, 10, 20);

describe('the worked attitude of each preset', () => {
  it('has ids that are all different', () => expect(new Set(PRESETS.map(({ id }) => id)).size).toBe(PRESETS.length));

  it.each(PRESETS.map((preset) => [preset.id, preset] as const))('of %s is what the core gives and 64-digit arithmetic confirms', (_id, { convention, worked }) => {
    const output = createConverter(EULER_DEG, convention).convert(WORKED);
    expect(Array.from(output)).toEqual(worked.numbers);
    expect(crossCheck({ from: EULER_DEG, to: convention, input: WORKED, output }).maxUlp).toBeLessThanOrEqual(0.501);
  });
});
