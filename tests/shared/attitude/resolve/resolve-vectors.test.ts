import { describe, expect, it } from 'vitest';
import type { Convention } from '#shared/attitude/convention.ts';
import { PRESETS } from '#shared/attitude/presets.ts';
import { resolveVectors } from '#shared/attitude/resolve/resolve-vectors.ts';

const preset = (id: string): Convention => PRESETS.find((each) => each.id === id)!.convention;
const EULER = preset('aircraft-euler-deg');
const of = (...numbers: number[]) => Float64Array.from(numbers);
const close = (actual: ArrayLike<number>, expected: readonly number[], digits = 14): void => expected.forEach((each, k) => expect(actual[k]).toBeCloseTo(each, digits));

describe('resolveVectors', () => {
  it('gives the weight of a pitched and banked aircraft: −g sin θ, g cos θ sin φ, g cos θ cos φ', () => {
    // Common practice; Stevens, Lewis & Johnson, Aircraft Control and Simulation, sect. 1.5 (from memory).
    const [theta, phi] = [(10 * Math.PI) / 180, (20 * Math.PI) / 180];
    const { vectors, derivatives } = resolveVectors(EULER, 'reference', { attitudes: of(77, 10, 20), vectors: of(0, 0, 9.80665) });
    close(vectors, [-9.80665 * Math.sin(theta), 9.80665 * Math.cos(theta) * Math.sin(phi), 9.80665 * Math.cos(theta) * Math.cos(phi)]);
    expect(derivatives).toBeNull();
  });

  it('goes there and back, derivatives too, in any axes', () => {
    for (const convention of [EULER, preset('ros-orientation'), { ...preset('aircraft-dcm'), reference: 'NEU', body: 'FRU' }] as Convention[]) {
      const attitudes = convention.representation === 'euler' ? of(40, -30, 65) : convention.representation === 'quaternion' ? of(0.5, -0.5, 0.5, 0.5) : of(0, 1, 0, -1, 0, 0, 0, 0, 1);
      const rate = { rate: 'body', unit: 'deg/s' } as const;
      const there = resolveVectors(convention, 'body', { attitudes, vectors: of(1, -2, 3), change: { derivatives: of(0.4, 0.5, -0.6), rate, rates: of(10, -20, 30) } });
      const back = resolveVectors(convention, 'reference', { attitudes, vectors: there.vectors, change: { derivatives: there.derivatives!, rate, rates: of(10, -20, 30) } });
      close(back.vectors, [1, -2, 3]);
      close(back.derivatives!, [0.4, 0.5, -0.6]);
    }
  });

  it('is the derivative of the components: against a difference over a small turn', () => {
    // Yaw, pitch, roll turning at 7, −4, 9 °/s; a vector constant in the reference.
    const at = (t: number) => of(30 + 7 * t, 12 - 4 * t, 50 + 9 * t);
    const v = of(100, -40, 7);
    const h = 1e-4;
    const [before, after] = [-h, h].map((t) => resolveVectors(EULER, 'reference', { attitudes: at(t), vectors: v }).vectors) as [Float64Array, Float64Array];
    const { derivatives } = resolveVectors(EULER, 'reference', { attitudes: at(0), vectors: v, change: { derivatives: of(0, 0, 0), rate: { rate: 'euler', unit: 'deg/s', angles: EULER as never }, rates: of(7, -4, 9) } });
    close(derivatives!, [0, 1, 2].map((k) => (after[k]! - before[k]!) / (2 * h)), 6);
  });

  it('a passenger walking forward in a level turn is seen from outside with ω × r', () => {
    // 10 m ahead of the origin, walking at 1 m/s, the aircraft turning right at 90 °/s from north: 1 m/s north and 10 · π/2 m/s east.
    const { vectors, derivatives } = resolveVectors(EULER, 'body', { attitudes: of(0, 0, 0), vectors: of(10, 0, 0), change: { derivatives: of(1, 0, 0), rate: { rate: 'body', unit: 'deg/s' }, rates: of(0, 0, 90) } });
    close(vectors, [10, 0, 0]);
    close(derivatives!, [1, 5 * Math.PI, 0]);
  });

  it('refuses what is not finite or not there', () => {
    expect(() => resolveVectors(EULER, 'body', { attitudes: of(0, 0, 0), vectors: of(1, 2) })).toThrow(expect.objectContaining({ code: 'count-mismatch' }));
    expect(() => resolveVectors(EULER, 'body', { attitudes: of(0, 0, 0), vectors: of(1, NaN, 2) })).toThrow(expect.objectContaining({ code: 'not-finite' }));
  });
});
