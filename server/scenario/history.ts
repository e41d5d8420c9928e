import { SeededRandom } from './random.ts';

/** One past API call of the scenario, as plain values. */
export interface PastCall {
  readonly at: number;
  /** Name of the key, or null for a call without one. */
  readonly key: string | null;
  readonly method: string;
  readonly route: string;
  readonly status: number;
  readonly code: string | null;
  readonly durationUs: number;
  readonly attitudes: number;
  readonly warnings: number;
  readonly warningCodes: readonly string[];
}

const DAY = 86_400_000;
const CONVERT = '/api/v1/convert';

/** What a pipeline sends, and how often things go wrong in it. */
interface Pipeline {
  readonly key: string;
  readonly callsADay: number;
  readonly batch: readonly [number, number];
  /** Hour of day (UTC) at which its calls gather. */
  readonly hour: number;
  readonly spread: number;
  readonly weekends: boolean;
  readonly from: number;
  readonly until: number;
}

const PIPELINES: readonly Pipeline[] = [
  { key: 'Autopilot pipeline', callsADay: 40, batch: [200, 2000], hour: 13, spread: 3, weekends: false, from: 44, until: 0 },
  { key: 'Integration rig', callsADay: 22, batch: [500, 5000], hour: 10, spread: 2.5, weekends: false, from: 43, until: 0 },
  { key: 'Gimbal pipeline', callsADay: 18, batch: [50, 800], hour: 15, spread: 2, weekends: false, from: 40, until: 0 },
  { key: 'Simulator nightly', callsADay: 12, batch: [8000, 10_000], hour: 2, spread: 0.6, weekends: true, from: 38, until: 0 },
  { key: 'Bench laptop', callsADay: 6, batch: [1, 12], hour: 14, spread: 3, weekends: false, from: 41, until: 15 },
];

/**
 * About six weeks of calls that end at `now`, oldest first: a working-day rhythm, runs that pass near gimbal lock on
 * the days of the pull-up exercise, a week in which the gimbal's supplier sent its scalar last as first so that the
 * pipeline's norm checks refused it, a laptop that went on with a revoked key, and the odd mistake.
 */
export function pastCalls(now: number): PastCall[] {
  const random = new SeededRandom(20_260_119);
  const today = Math.floor(now / DAY) * DAY;
  const calls: PastCall[] = [];
  for (let daysAgo = 44; daysAgo >= 0; daysAgo--) {
    const day = today - daysAgo * DAY;
    const weekend = [0, 6].includes(new Date(day).getUTCDay());
    for (const pipeline of PIPELINES) {
      if (daysAgo > pipeline.from || daysAgo < pipeline.until || (weekend && !pipeline.weekends)) continue;
      const count = Math.round(pipeline.callsADay * random.between(0.6, 1.3));
      for (let i = 0; i < count; i++) {
        const at = Math.round(day + (pipeline.hour + pipeline.spread * random.normal() * 0.6) * 3_600_000);
        const call = callOf(random, pipeline, daysAgo, at);
        if (at < now) calls.push(call);
      }
    }
    if (!weekend && random.chance(0.3)) {
      const at = Math.round(day + random.between(8, 17) * 3_600_000);
      if (at < now) calls.push(refused(random, at, null, 401, random.pick(['missing-key', 'invalid-key'])));
    }
  }
  return calls.sort((a, b) => a.at - b.at);
}

function callOf(random: SeededRandom, pipeline: Pipeline, daysAgo: number, at: number): PastCall {
  if (pipeline.key === 'Bench laptop' && daysAgo < 17) return refused(random, at, pipeline.key, 401, 'revoked-key');
  const scalarWeek = pipeline.key === 'Gimbal pipeline' && daysAgo <= 24 && daysAgo >= 19;
  if (random.chance(scalarWeek ? 0.45 : 0.012)) return refused(random, at, pipeline.key, 422, scalarWeek ? 'not-a-rotation' : random.pick(['missing-facet', 'count-mismatch', 'not-finite']));
  if (random.chance(0.04)) return { at, key: pipeline.key, method: 'GET', route: '/api/v1/conventions', status: 200, code: null, durationUs: Math.round(random.between(700, 2500)), attitudes: 0, warnings: 0, warningCodes: [] };
  const attitudes = Math.round(random.between(...pipeline.batch));
  const nearLock = pipeline.key !== 'Bench laptop' && random.chance(daysAgo % 9 === 4 ? 0.35 : 0.03);
  const warnings = nearLock ? Math.ceil(random.between(1, attitudes * 0.01 + 3)) : 0;
  return {
    at, key: pipeline.key, method: 'POST', route: CONVERT, status: 200, code: null,
    durationUs: Math.round(900 + attitudes * random.between(1.2, 2.4)),
    attitudes, warnings, warningCodes: nearLock ? (random.chance(0.2) ? ['near-gimbal-lock', 'severe-gimbal-lock'] : ['near-gimbal-lock']) : [],
  };
}

function refused(random: SeededRandom, at: number, key: string | null, status: number, code: string): PastCall {
  return { at, key, method: 'POST', route: CONVERT, status, code, durationUs: Math.round(random.between(400, 1600)), attitudes: 0, warnings: 0, warningCodes: [] };
}
