import { describe, expect, it } from 'vitest';
import { createConverter } from '#shared/attitude/converter.ts';
import { simulateFlight } from '#server/scenario/flight.ts';
import { EULER_DEG, QUATERNION } from '#tests/support/conventions.ts';

const flight = simulateFlight();

describe('the simulated flight', () => {
  it('lasts at least ten minutes at 50 Hz and is the same every time', () => {
    expect(flight.length).toBeGreaterThanOrEqual(10 * 60 * 50);
    expect(simulateFlight()[20_000]).toEqual(flight[20_000]);
  });

  it('records attitudes and body rates that belong together', () => {
    // Central differences of the attitude: ω_body = 2 vec(q* q̇). The rates change over 1/50 s, so agreement is to their own change.
    let worst = 0;
    for (let i = 1; i < flight.length - 1; i++) {
      const [before, q, after] = [flight[i - 1]!.quaternion, flight[i]!.quaternion, flight[i + 1]!.quaternion];
      const sign = before.reduce((sum, value, k) => sum + value * after[k]!, 0) < 0 ? -1 : 1;
      const d = after.map((value, k) => ((sign * value - before[k]!) * 50) / 2);
      const omega = [
        2 * (q[0] * d[1]! - q[1] * d[0]! - q[2] * d[3]! + q[3] * d[2]!),
        2 * (q[0] * d[2]! + q[1] * d[3]! - q[2] * d[0]! - q[3] * d[1]!),
        2 * (q[0] * d[3]! - q[1] * d[2]! + q[2] * d[1]! - q[3] * d[0]!),
      ];
      omega.forEach((rate, k) => { worst = Math.max(worst, Math.abs(rate - flight[i]!.rates[k]!)); });
    }
    expect(worst).toBeLessThan(0.05);
  });

  it('flies like an aircraft, and through the vertical in its loop', () => {
    const angles = createConverter(QUATERNION, EULER_DEG).convert(Float64Array.from(flight.flatMap(({ quaternion }) => quaternion)));
    const pitches = flight.map((_, i) => angles[3 * i + 1]!);
    const rolls = flight.map((_, i) => Math.abs(angles[3 * i + 2]!));
    expect(Math.max(...pitches)).toBeGreaterThan(85);
    expect(Math.min(...pitches)).toBeLessThan(-85);
    expect(rolls.filter((roll) => roll > 90).length).toBeGreaterThan(100);
    expect(Math.max(...flight.map(({ position }) => position[2]))).toBeGreaterThan(500);
    expect(Math.max(...flight.map(({ rates }) => Math.max(...rates.map(Math.abs))))).toBeLessThan(1.5);
  });
});
