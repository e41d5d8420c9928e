import { describe, expect, it } from 'vitest';
import { ROLES } from '#shared/api/roles.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { NUMBERS_PER_ATTITUDE, type Convention } from '#shared/attitude/convention.ts';
import { FLIGHT_QUATERNION, simulateFlight } from '#server/scenario/flight/simulate-flight.ts';
import { PIPELINES } from '#server/scenario/pipelines.ts';
import { KEYS, PEOPLE } from '#server/scenario/programme.ts';
import { columnsOf, unitOutput } from '#server/scenario/unit-output.ts';
import { UNITS } from '#server/scenario/units.ts';

const units = Object.values(UNITS);

describe('the programme', () => {
  it('has people in every role, each with an address that nobody can have', () => {
    for (const role of ROLES) expect(PEOPLE.some((person) => person.role === role)).toBe(true);
    // RFC 2606 reserves .example.
    for (const { email } of PEOPLE) expect(email).toMatch(/^[a-z.]+@[a-z]+\.example$/);
    expect(new Set(PEOPLE.map(({ email }) => email)).size).toBe(PEOPLE.length);
  });

  it('gives every key an owner and every pipeline a key', () => {
    for (const { owner, role } of KEYS) expect(PEOPLE.find(({ email }) => email === owner)?.role).toBe(role);
    for (const pipeline of PIPELINES) {
      const key = KEYS.find(({ name }) => name === pipeline.key);
      expect(key, pipeline.key).toBeDefined();
      expect(key!.issuedDaysAgo).toBeGreaterThanOrEqual(pipeline.since);
    }
    for (const role of ['engineer', 'integrator'] as const) expect(KEYS.some((key) => key.published && key.role === role)).toBe(true);
  });

  it('has units whose conventions all differ', () => {
    expect(new Set(units.map(({ convention }) => JSON.stringify(convention))).size).toBe(units.length);
    expect(new Set(units.map(({ slug }) => slug)).size).toBe(units.length);
  });
});

describe('the output of a unit', () => {
  const flight = simulateFlight({ seconds: 40, rateHz: 10 });

  it('is the flight in the unit’s convention, as finely as the unit writes numbers', () => {
    for (const { convention, resolution, name } of units) {
      const numbers = unitOutput(convention, resolution, flight);
      const width = NUMBERS_PER_ATTITUDE[convention.representation];
      expect(numbers).toHaveLength(flight.length * width);
      expect(columnsOf(convention)).toHaveLength(width);
      const back = createConverter(convention, FLIGHT_QUATERNION).convert(numbers);
      const coarsest = typeof resolution === 'object' ? 2e-4 : resolution === 'float32' ? 2e-7 : 2e-15;
      const worst = Math.max(...flight.map(({ quaternion: [w, x, y, z] }, i) => {
        const [a, b, c, d] = back.slice(4 * i, 4 * i + 4) as unknown as [number, number, number, number];
        // Vector part of q* back, twice its length: the small angle between the two attitudes.
        return 2 * Math.hypot(w * b - x * a - y * d + z * c, w * c - y * a - z * b + x * d, w * d - z * a - x * c + y * b);
      }));
      expect(worst, name).toBeLessThan(coarsest);
      if (resolution !== 'float64') expect(worst, name).toBeGreaterThan(coarsest / 100);
    }
  });

  it('says what its document says: the same attitude by hand for each unit', () => {
    // Nose due east, level, wings level. The NED matrix v_ref = R v_body then has columns nose (0, 1, 0), right (−1, 0, 0), down (0, 0, 1).
    const half = Math.SQRT1_2;
    const east = [{ ...flight[0]!, quaternion: [half, 0, 0, half] as const }];
    const said = (convention: Convention) => [...unitOutput(convention, 'float32', east)].map((number) => Math.round(number * 1e4) / 1e4 + 0);
    expect(said(UNITS.inertialUnit.convention)).toEqual([0.7071, 0, 0, 0.7071]);
    expect(said(UNITS.autopilot.convention)).toEqual([0, 0, 1.5708]);
    // East-north-up against forward-left-up: the axes coincide.
    expect(said(UNITS.cameraGimbal.convention)).toEqual([0, 0, 0, 1]);
    // Body x (right) is south, y (up) is up, z (forward) is east; each is a column in east, up, north, written one after the other.
    expect(said(UNITS.flightSimulator.convention)).toEqual([0, 0, -1, 0, 1, 0, 1, 0, 0]);
    expect(said(UNITS.groundDisplay.convention)).toEqual([90, 0, 0]);
  });
});
