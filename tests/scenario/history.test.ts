import { beforeAll, describe, expect, it } from 'vitest';
import { ATTITUDES_PER_CALL } from '#shared/api/limits.ts';
import { PROBLEMS, type ProblemCode } from '#shared/api/problems.ts';
import { pastCalls, type PastCall } from '#server/scenario/history.ts';
import { PIPELINES } from '#server/scenario/pipelines.ts';
import { KEYS } from '#server/scenario/programme.ts';
import { RecordedLegs } from '#server/scenario/recorded-legs.ts';
import { pastRuns, type PastRun } from '#server/scenario/runs.ts';

const DAY = 86_400_000;
/** A Tuesday, 11:45 UTC. */
const NOW = Date.UTC(2026, 0, 13, 11, 45);
const daysAgo = (at: number) => Math.floor(NOW / DAY) - Math.floor(at / DAY);

let flight: RecordedLegs;
let calls: PastCall[];
let runs: PastRun[];
beforeAll(() => {
  flight = new RecordedLegs();
  calls = pastCalls(NOW, flight);
  runs = pastRuns(NOW, flight);
}, 30_000);

describe('the past calls', () => {
  it('are some thousands in six weeks, oldest first, none in the future, and the same every time', () => {
    expect(calls.length).toBeGreaterThan(3000);
    expect(daysAgo(calls[0]!.at)).toBeGreaterThanOrEqual(42);
    expect(calls.at(-1)!.at).toBeLessThan(NOW);
    expect(calls.every(({ at }, i) => i === 0 || at >= calls[i - 1]!.at)).toBe(true);
    expect(pastCalls(NOW, flight)).toEqual(calls);
  }, 20_000);

  it('are what the service could have answered', () => {
    for (const { status, code, attitudes, warnings, warningCodes, durationUs, at } of calls) {
      expect(Number.isInteger(at) && Number.isInteger(durationUs) && durationUs > 0).toBe(true);
      expect(attitudes).toBeLessThanOrEqual(ATTITUDES_PER_CALL);
      if (code === null) expect(status).toBe(200);
      else expect([PROBLEMS[code as ProblemCode].status, attitudes, warnings]).toEqual([status, 0, 0]);
      expect(warnings > 0).toBe(warningCodes.length > 0);
    }
  });

  it('use keys only while these exist, and a revoked one to no avail', () => {
    for (const { key: name, at, code } of calls) {
      if (name === null) continue;
      const key = KEYS.find((known) => known.name === name)!;
      expect(at).toBeGreaterThan(NOW - key.issuedDaysAgo * DAY - DAY);
      if (key.revokedDaysAgo !== undefined && daysAgo(at) < key.revokedDaysAgo) expect(code).toBe('revoked-key');
    }
  });

  it('rest at the weekend but for the nightly job', () => {
    const weekend = calls.filter(({ at }) => [0, 6].includes(new Date(at).getUTCDay()));
    expect(weekend.length).toBeGreaterThan(50);
    expect(new Set(weekend.map(({ key }) => key))).toEqual(new Set(['Simulator nightly']));
  });

  it('hold refusals of every kind that a programme meets', () => {
    const codes = new Set(calls.map(({ status, code }) => `${status} ${code}`));
    for (const expected of ['401 missing-key', '401 invalid-key', '401 revoked-key', '422 missing-facet', '422 not-a-rotation', '429 too-many-requests']) expect(codes).toContain(expected);
    const refusedShare = calls.filter(({ status }) => status >= 400).length / calls.length;
    expect(refusedShare).toBeGreaterThan(0.02);
    expect(refusedShare).toBeLessThan(0.1);
  });

  it('count the warnings that the flight’s loop really causes', () => {
    // An angle-giving unit is warned of within 1° of lock: counted here from the quaternions alone.
    const near = flight.samples('loop with vertical line').filter(({ quaternion: [w, x, y, z] }) => Math.hypot(w * w + x * x - y * y - z * z, 2 * (x * y + w * z)) < Math.sin(Math.PI / 180)).length;
    const warned = calls.filter(({ key, warningCodes }) => key === 'Autopilot pipeline' && warningCodes.includes('near-gimbal-lock'));
    expect(near).toBeGreaterThan(50);
    expect(warned.some(({ warnings }) => warnings === near)).toBe(true);
    // Sixteen-bit fractions are no unit quaternions: refused until the gimbal wrote floats.
    expect(calls.filter(({ key, code }) => key === 'Gimbal pipeline' && code === 'not-a-rotation').every(({ at }) => daysAgo(at) >= 38)).toBe(true);
  });
});

describe('the past runs', () => {
  it('fail while their pipeline’s mistake lasts, and pass otherwise', () => {
    for (const { key, at, verdict, worst } of runs) {
      const faults = PIPELINES.find((pipeline) => pipeline.key === key)!.faults;
      const faulty = faults.some(({ from, until }) => daysAgo(at) <= from && daysAgo(at) >= until);
      if (faulty) expect(verdict, `${key} ${worst.angle}`).toBe('fail');
      else if (key !== 'Ground display build') expect(verdict, `${key} ${worst.angle}`).toBe('pass');
    }
    for (const { key, faults } of PIPELINES) {
      for (const { says } of faults.filter(({ really }) => really.convention)) expect(runs.some((run) => run.key === key && run.verdict === 'fail'), says).toBe(true);
    }
  });

  it('name the worst error and its statistics consistently', () => {
    for (const { worst, statistics: { rms, median, p95, max }, tolerance, count, failed, verdict, commit } of runs) {
      expect(worst.angle).toBe(max);
      expect(median).toBeLessThanOrEqual(p95);
      expect(p95).toBeLessThanOrEqual(max);
      expect(rms).toBeLessThanOrEqual(max * (1 + 1e-12));
      expect(Math.hypot(...worst.axisBody)).toBeCloseTo(1, 12);
      expect(verdict).toBe(failed > 0 ? 'fail' : 'pass');
      expect(failed > 0).toBe(max > tolerance.angle);
      expect(count).toBeGreaterThan(5);
      expect(commit).toMatch(/^[0-9a-f]{40}$/);
    }
  });

  it('find the half turn that north-east-down read as east-north-up makes', () => {
    // ENU ↔ NED is a half turn about the horizontal line from south-west to north-east, whatever the attitude.
    const failed = runs.filter(({ key, verdict }) => key === 'Inertial unit acceptance' && verdict === 'fail');
    expect(failed.length).toBeGreaterThan(0);
    for (const { statistics, tolerance } of failed) {
      expect(tolerance.unit).toBe('arcsec');
      expect(statistics.median / 3600).toBeCloseTo(180, 4);
    }
  });
});
