import { describe, expect, it } from 'vitest';
import { PRESETS } from '#shared/attitude/presets.ts';
import { readingOf } from '#shared/attitude/reading.ts';
import { EULER_DEG, QUATERNION } from '#tests/support/conventions.ts';

describe('readingOf', () => {
  it.each([
    [[30, 10, 20], 'nose 030.0° true, 10.0° up, right wing 20.0° down'],
    [[0, 0, 0], 'nose 000.0° true, level, wings level'],
    [[-90, -5, -12], 'nose 270.0° true, 5.0° down, right wing 12.0° up'],
    [[359.97, 0, 0], 'nose 000.0° true, level, wings level'],
    [[45, 90, 0], 'nose straight up, right wing towards 135.0° true'],
    [[45, -90, 0], 'nose straight down, right wing towards 135.0° true'],
    [[10, 0, 180], 'nose 010.0° true, level, inverted'],
    [[10, 0, 120], 'nose 010.0° true, level, right wing 120.0° down past the vertical (inverted)'],
  ])('of %j', (angles, expected) => expect(readingOf(EULER_DEG, angles)).toBe(expected));

  it('names directions in frames that are no local level', () => {
    expect(readingOf({ ...QUATERNION, reference: 'ECEF' }, [1, 0, 0, 0])).toBe('in ECEF: nose (1.0000, 0.0000, 0.0000), right wing (0.0000, 1.0000, 0.0000), belly (0.0000, 0.0000, 1.0000)');
  });

  it.each(PRESETS.map((preset) => [preset.id, preset] as const))('of the worked attitude of %s', (_id, preset) => {
    expect(readingOf(preset.convention, preset.worked.numbers)).toBe(preset.worked.reading);
  });
});
