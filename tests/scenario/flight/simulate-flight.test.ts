import { describe, expect, it } from 'vitest';
import { simulateFlight, type FlightSample } from '#server/scenario/flight/simulate-flight.ts';

const flight = simulateFlight();
const DEG = Math.PI / 180;
const during = (leg: string) => flight.filter((sample) => sample.leg === leg);
const dot = (a: readonly number[], b: readonly number[]) => a.reduce((sum, value, k) => sum + value * b[k]!, 0);
const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
/** Angle between the nose and the vertical, degrees, from the quaternion alone. */
const marginOf = ({ quaternion: [w, x, y, z] }: FlightSample) => Math.asin(Math.min(1, Math.hypot(w * w + x * x - y * y - z * z, 2 * (x * y + w * z)))) / DEG;

describe('the simulated flight', () => {
  it('lasts more than twelve minutes at 50 Hz, from standstill to standstill', () => {
    expect(flight.length).toBeGreaterThan(12 * 60 * 50);
    expect(flight.every(({ time }, i) => time === i / 50)).toBe(true);
    for (const { velocity, rates } of [flight[200]!, flight.at(-1)!]) {
      expect(Math.hypot(...velocity)).toBeLessThan(0.05);
      expect(Math.hypot(...rates)).toBeLessThan(0.5);
    }
  });

  it('is the same for the same seed, another for another, and the same at another sample rate', () => {
    const slow = simulateFlight({ rateHz: 10, seconds: 60 });
    expect(slow).toHaveLength(600);
    expect(slow.every(({ quaternion }, i) => quaternion.every((value, k) => value === flight[5 * i]!.quaternion[k]))).toBe(true);
    expect(simulateFlight({ rateHz: 10, seconds: 60, seed: 7 })[599]!.quaternion).not.toEqual(slow[599]!.quaternion);
    expect(() => simulateFlight({ rateHz: 30 })).toThrow(RangeError);
  });

  it('is made with + − × ÷ √ alone, so that every engine computes these doubles', () => {
    expect(flight[20_000]!.quaternion).toEqual([0.13171824271903262, 0.017745119185214243, 0.0010277605562143415, -0.9911278217204639]);
    expect(flight.at(-1)!.position).toEqual([-428.5346291808593, -742.2669977766508, 1.4253342456212716]);
  });

  it('has attitudes and body rates that belong together', () => {
    // The rotation from one sample to the next but one, against Simpson's rule over the three rates. The rule is
    // good to 0.02 deg/s wherever the rates are smooth; they are not while the wheels touch down.
    const landed = during('roll-out')[0]!.time;
    let worst = 0;
    let worstAtTouchdown = 0;
    let sum = 0;
    for (let i = 1; i < flight.length - 1; i++) {
      const touchdown = Math.abs(flight[i]!.time - landed) < 0.2;
      const off = Math.hypot(...rateDifference(flight[i - 1]!, flight[i]!, flight[i + 1]!));
      sum += off * off;
      if (touchdown) worstAtTouchdown = Math.max(worstAtTouchdown, off);
      else worst = Math.max(worst, off);
    }
    expect(worst).toBeLessThan(0.03);
    expect(worstAtTouchdown).toBeLessThan(0.7);
    expect(Math.sqrt(sum / flight.length)).toBeLessThan(0.005);
  });

  it('has velocities and positions that belong together', () => {
    let worst = 0;
    for (let i = 1; i < flight.length - 1; i++) {
      const [before, now, after] = [flight[i - 1]!, flight[i]!, flight[i + 1]!];
      const moved = [0, 1, 2].map((axis) => ((after.position[axis]! - before.position[axis]!) * 50) / 2);
      const meant = [0, 1, 2].map((axis) => ((before.velocity[axis]! + 4 * now.velocity[axis]! + after.velocity[axis]!) / 6) * (axis === 2 ? -1 : 1));
      worst = Math.max(worst, ...moved.map((value, axis) => Math.abs(value - meant[axis]!)));
    }
    expect(worst).toBeLessThan(0.01);
  });

  it('gives unit quaternions whose sign does not jump, and the angles of the same attitude', () => {
    let norm = 0;
    let step = 1;
    let apart = 0;
    flight.forEach(({ quaternion: q, euler: [yaw, pitch, roll] }, i) => {
      norm = Math.max(norm, Math.abs(Math.hypot(...q) - 1));
      step = Math.min(step, dot(q, flight[Math.max(0, i - 1)]!.quaternion));
      // q_z(yaw) q_y(pitch) q_x(roll), multiplied out: Stevens, Lewis & Johnson, sect. 1.4 (from memory).
      const [cy, sy, cp, sp, cr, sr] = [yaw, pitch, roll].flatMap((angle) => [Math.cos((angle * DEG) / 2), Math.sin((angle * DEG) / 2)]) as [number, number, number, number, number, number];
      const rebuilt = [cy * cp * cr + sy * sp * sr, cy * cp * sr - sy * sp * cr, cy * sp * cr + sy * cp * sr, sy * cp * cr - cy * sp * sr];
      apart = Math.max(apart, 1 - Math.abs(dot(rebuilt, q)));
    });
    expect(norm).toBeLessThan(1e-15);
    expect(step).toBeGreaterThan(0.999);
    expect(apart).toBeLessThan(1e-14);
  });

  it('turns as the handbook says: rate of turn = 1091 tan(bank) / airspeed in knots', () => {
    // Pilot's Handbook of Aeronautical Knowledge, FAA-H-8083-25, chapter 5 (from memory).
    const steady = during('steep turn').slice(400, -50);
    const bank = mean(steady.map(({ euler }) => euler[2]));
    const knots = mean(steady.map(({ airspeed }) => airspeed)) * (3600 / 1852);
    const headings = steady.map(({ euler }) => euler[0]);
    const turned = headings.slice(1).reduce((sum, yaw, i) => sum + ((((yaw - headings[i]!) % 360) + 540) % 360) - 180, 0);
    const rate = turned / (steady.at(-1)!.time - steady[0]!.time);
    expect(bank).toBeGreaterThan(50);
    expect(rate / ((1091 * Math.tan(bank * DEG)) / knots)).toBeCloseTo(1, 2);
  });

  it('holds the vertical in its loop: once within 0.01° of lock, where angles run wild and p, q, r stay small', () => {
    const held = during('loop with vertical line').filter((sample) => marginOf(sample) < 1);
    const pitches = flight.map(({ euler }) => euler[1]);
    expect(held.length).toBeGreaterThan(60);
    expect(Math.min(...flight.map(marginOf))).toBeLessThan(0.01);
    expect(Math.max(...pitches)).toBeGreaterThan(89.9);
    expect(Math.min(...pitches)).toBeLessThan(-85);
    expect(Math.max(...held.map(({ rates }) => Math.hypot(...rates)))).toBeLessThan(20);
    const yaws = held.map(({ euler }) => euler[0]);
    expect(Math.max(...yaws) - Math.min(...yaws)).toBeGreaterThan(90);
    // Elsewhere it stays clear of lock.
    expect(flight.filter(({ leg }) => leg !== 'loop with vertical line').every((sample) => marginOf(sample) > 20)).toBe(true);
  });

  it('stalls where a stall is flown, and lands on the runway, gently enough', () => {
    const stall = during('stall');
    expect(Math.min(...stall.map(({ airspeed }) => airspeed))).toBeLessThan(36);
    expect(Math.max(...stall.map(({ position }) => position[2])) - Math.min(...stall.map(({ position }) => position[2]))).toBeGreaterThan(60);
    const touchdown = during('roll-out')[0]!;
    const [north, east] = touchdown.position;
    const along = -0.5 * north - 0.8660254037844386 * east;
    expect(along).toBeGreaterThan(0);
    expect(along).toBeLessThan(900);
    expect(Math.abs(0.8660254037844386 * north - 0.5 * east)).toBeLessThan(10);
    expect(during('flare').at(-1)!.velocity[2]).toBeLessThan(2.5);
    expect(flight.every(({ position }) => position[2] > 1)).toBe(true);
  });
});

/** Mean body rate between the outer two samples by their attitudes, less the same by their rates; deg/s. */
function rateDifference(before: FlightSample, now: FlightSample, after: FlightSample): [number, number, number] {
  const [a0, a1, a2, a3] = before.quaternion;
  const [b0, b1, b2, b3] = after.quaternion;
  const w = a0 * b0 + a1 * b1 + a2 * b2 + a3 * b3;
  const v = [a0 * b1 - a1 * b0 - a2 * b3 + a3 * b2, a0 * b2 - a2 * b0 - a3 * b1 + a1 * b3, a0 * b3 - a3 * b0 - a1 * b2 + a2 * b1];
  const size = Math.hypot(...v);
  const scale = size === 0 ? 2 : (2 * Math.atan2(size, w)) / size;
  return v.map((value, axis) => (value * scale) / DEG / (after.time - before.time) - (before.rates[axis]! + 4 * now.rates[axis]! + after.rates[axis]!) / 6) as [number, number, number];
}
