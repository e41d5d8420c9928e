import { createConverter } from '#shared/attitude/converter.ts';
import { AttitudeError } from '#shared/attitude/errors.ts';
import { ATTITUDES_PER_CALL } from '#shared/api/limits.ts';
import { DAY, DAYS, HOUR, isWeekend, pastBuilds, type Build } from './builds.ts';
import type { Fault, Pipeline } from './pipelines.ts';
import { SeededRandom } from './random.ts';
import { RecordedLegs } from './recorded-legs.ts';

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

type Outcome = Pick<PastCall, 'status' | 'code' | 'attitudes' | 'warnings' | 'warningCodes'>;

const CONVERT = { method: 'POST', route: '/api/v1/convert' } as const;
const refused = (status: number, code: string): Outcome => ({ status, code, attitudes: 0, warnings: 0, warningCodes: [] });
const answered = (attitudes: number): Outcome => ({ status: 200, code: null, attitudes, warnings: 0, warningCodes: [] });

/** When the simulator's nightly job was started once per leg by mistake, in days ago. */
const LOOPING_NIGHT = 9;
/** When the laptop's key was revoked, and when its owner noticed. */
const LAPTOP = { key: 'Bench laptop', since: 41, revoked: 17, noticed: 15 } as const;

/**
 * About six weeks of calls that end at `now`, oldest first: builds in a working-day rhythm that convert the legs of the
 * flight, the mistakes of `pipelines.ts`, a night that ran into the limit, a laptop that went on with a revoked key, and
 * slips of the hand. What a conversion answered, warned of or refused is computed by really converting; only durations
 * and slips are drawn.
 */
export function pastCalls(now: number, flight = new RecordedLegs()): PastCall[] {
  const conversions = new Conversions(flight);
  const calls = [...pastBuilds(now).flatMap((build) => callsOf(build, conversions)), ...callsByHand(now)];
  return calls.filter(({ at }) => at < now).sort((a, b) => a.at - b.at);
}

function callsOf({ pipeline, at, daysAgo, fault, seed }: Build, conversions: Conversions): PastCall[] {
  const random = new SeededRandom(seed);
  const { key } = pipeline;
  const calls: PastCall[] = [];
  let clock = at;
  const call = (outcome: Outcome, what: { method: string; route: string } = CONVERT): void => {
    const durationUs = Math.round(random.between(700, 1500) + outcome.attitudes * random.between(1.3, 2.3));
    calls.push({ at: Math.round(clock), key, ...what, durationUs, ...outcome });
    clock += durationUs / 1000 + random.between(20, 900);
  };
  if (random.chance(0.35)) call(answered(0), { method: 'GET', route: '/api/v1/conventions' });
  for (const leg of pipeline.legs) {
    if (random.chance(0.008)) call(refused(422, random.pick(['missing-facet', 'count-mismatch', 'not-finite'])));
    for (const outcome of conversions.of(pipeline, leg, fault)) call(outcome);
  }
  if (key === 'Simulator nightly' && daysAgo === LOOPING_NIGHT) {
    for (let i = 0; i < 90; i++) call(refused(429, 'too-many-requests'));
  }
  return calls;
}

/** What people tried from a desk: a few attitudes at a time, and calls that nobody could be told from. */
function callsByHand(now: number): PastCall[] {
  const random = new SeededRandom(31_415);
  const today = Math.floor(now / DAY) * DAY;
  const calls: PastCall[] = [];
  for (let daysAgo = DAYS; daysAgo >= 0; daysAgo--) {
    const day = today - daysAgo * DAY;
    if (isWeekend(day)) continue;
    const call = (key: string | null, outcome: Outcome): void => {
      const at = Math.round(day + random.between(8, 17.5) * HOUR);
      calls.push({ at, key, ...CONVERT, durationUs: Math.round(random.between(500, 1900)), ...outcome });
    };
    if (random.chance(0.25)) call(null, refused(401, random.pick(['missing-key', 'invalid-key'])));
    if (daysAgo > LAPTOP.since || daysAgo < LAPTOP.noticed) continue;
    // More of them while the gimbal's scalar stood in the wrong place and people looked for the reason.
    for (let i = daysAgo <= 24 && daysAgo >= 18 ? 14 : 5; i > 0; i--) {
      if (daysAgo < LAPTOP.revoked) call(LAPTOP.key, refused(401, 'revoked-key'));
      else call(LAPTOP.key, random.chance(0.15) ? refused(422, random.pick(['missing-facet', 'invalid-facet', 'count-mismatch'])) : answered(Math.ceil(random.between(0, 12))));
    }
  }
  return calls;
}

/** What the service answers to each leg of each pipeline: converted once, then remembered. */
class Conversions {
  readonly #flight: RecordedLegs;
  readonly #known = new Map<string, readonly Outcome[]>();

  constructor(flight: RecordedLegs) {
    this.#flight = flight;
  }

  /** One outcome for each call that the leg takes. */
  of(pipeline: Pipeline, leg: string, fault: Fault | null): readonly Outcome[] {
    const name = JSON.stringify([pipeline.key, leg, fault?.says]);
    const known = this.#known.get(name);
    if (known) return known;
    const samples = this.#flight.samples(leg);
    const outcomes: Outcome[] = [];
    for (let start = 0; start < samples.length; start += ATTITUDES_PER_CALL) {
      const part = samples.slice(start, start + ATTITUDES_PER_CALL);
      outcomes.push(outcomeOf(pipeline, this.#flight.sent(pipeline, part, fault), part.length));
    }
    this.#known.set(name, outcomes);
    return outcomes;
  }
}

function outcomeOf({ sends, receives }: Pipeline, numbers: Float64Array, attitudes: number): Outcome {
  const converter = createConverter(sends.convention, receives.convention);
  try {
    converter.convert(numbers);
  } catch (error) {
    if (error instanceof AttitudeError) return refused(422, error.code);
    throw error;
  }
  const warnings = converter.warnings();
  return { ...answered(attitudes), warnings: warnings.reduce((sum, { count }) => sum + count, 0), warningCodes: warnings.map(({ code }) => code) };
}
