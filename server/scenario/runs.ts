import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { AttitudeError } from '#shared/attitude/errors.ts';
import { errorRotation } from '#shared/attitude/rotations/error-rotation.ts';
import { pastBuilds, type Build } from './builds.ts';
import { FLIGHT_QUATERNION, type FlightSample } from './flight/simulate-flight.ts';
import { SeededRandom } from './random.ts';
import { RecordedLegs } from './recorded-legs.ts';

/** One past verification, as plain values: what a pipeline's unit sent against the flight's true attitude. */
export interface PastRun {
  readonly at: number;
  /** Name of the key. */
  readonly key: string;
  readonly label: string;
  readonly commit: string;
  readonly expected: Convention;
  /** What the unit's document states. */
  readonly actual: Convention;
  readonly tolerance: { readonly angle: number; readonly unit: 'deg' | 'rad' | 'arcsec' };
  readonly verdict: 'pass' | 'fail';
  readonly count: number;
  readonly failed: number;
  /** Angles in the tolerance's unit; the axis in FRD turns expected into actual. */
  readonly worst: { readonly index: number; readonly angle: number; readonly axisBody: readonly [number, number, number] };
  /** Percentiles by nearest rank. */
  readonly statistics: { readonly rms: number; readonly median: number; readonly p95: number; readonly max: number };
  /** The first 100 samples off by more than the tolerance. */
  readonly failures: readonly { readonly index: number; readonly angle: number }[];
  readonly durationUs: number;
}

const PER_RADIAN = { rad: 1, deg: 180 / Math.PI, arcsec: (180 * 3600) / Math.PI } as const;
/** A run takes every so manieth sample of a leg, beginning somewhere. */
const EVERY = 20;

/**
 * Six weeks of verification runs, oldest first, one or two a build. Every verdict and figure comes from comparing
 * simulated outputs; a build whose output the service would refuse (no rotation at all) has no run.
 */
export function pastRuns(now: number, flight = new RecordedLegs()): PastRun[] {
  return pastBuilds(now).flatMap((build) => {
    const random = new SeededRandom(build.seed + 1);
    const legs = random.chance(0.4) ? [random.pick(build.pipeline.legs), 'loop with vertical line'] : [random.pick(build.pipeline.legs)];
    return legs.flatMap((leg, i) => {
      const first = Math.floor(random.between(0, EVERY));
      const samples = flight.samples(leg).filter((_, index) => index % EVERY === first);
      const at = build.at + 8000 + i * Math.round(random.between(900, 3000));
      return at < now ? runOf(build, at, `${build.pipeline.sends.name}, ${leg}`, samples, flight) ?? [] : [];
    });
  }).sort((a, b) => a.at - b.at);
}

function runOf({ pipeline, commit, fault, seed }: Build, at: number, label: string, samples: readonly FlightSample[], flight: RecordedLegs): PastRun | null {
  const numbers = flight.sent(pipeline, samples, fault);
  const sent = read(numbers, pipeline.sends.convention);
  if (!sent) return null;
  const { tolerance } = pipeline;
  const perRadian = PER_RADIAN[tolerance.unit];
  const errors = samples.map(({ quaternion }, i) => errorRotation([...quaternion], [sent[4 * i]!, sent[4 * i + 1]!, sent[4 * i + 2]!, sent[4 * i + 3]!]));
  const angles = errors.map(({ angle }) => angle * perRadian);
  const sorted = angles.toSorted((a, b) => a - b);
  const rank = (share: number): number => sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)]!;
  const max = rank(1);
  const index = angles.indexOf(max);
  const failed = angles.filter((angle) => angle > tolerance.angle).length;
  return {
    at, key: pipeline.key, label, commit, tolerance,
    expected: FLIGHT_QUATERNION, actual: pipeline.sends.convention,
    verdict: failed > 0 ? 'fail' : 'pass', count: angles.length, failed,
    worst: { index, angle: max, axisBody: errors[index]!.axis },
    statistics: { rms: Math.sqrt(angles.reduce((sum, angle) => sum + angle * angle, 0) / angles.length), median: rank(0.5), p95: rank(0.95), max },
    failures: angles.flatMap((angle, i) => (angle > tolerance.angle ? [{ index: i, angle }] : [])).slice(0, 100),
    durationUs: Math.round(new SeededRandom(seed + 2).between(900, 1800) + angles.length * 3),
  };
}

/** Attitudes as quaternions of the flight's own convention, or null where the service would refuse them. */
function read(numbers: Float64Array, convention: Convention): Float64Array | null {
  try {
    return createConverter(convention, FLIGHT_QUATERNION).convert(numbers);
  } catch (error) {
    if (error instanceof AttitudeError) return null;
    throw error;
  }
}
