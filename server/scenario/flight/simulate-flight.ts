import { createConverter } from '#shared/attitude/converter.ts';
import type { EulerConvention, QuaternionConvention } from '#shared/attitude/convention.ts';
import { SeededRandom } from '../random.ts';
import { RigidBody } from './equations-of-motion.ts';
import { flightPlan, RUNWAY } from './flight-plan.ts';
import { stillAir, writeFlow } from './forces.ts';
import { Pilot, Steering, type Sight } from './pilot.ts';
import { POSITION, Q, RATE, VELOCITY, writeMatrix, type State } from './state.ts';
import { Weather } from './weather.ts';

/** Convention of `FlightSample.quaternion`: the preset aircraft-quaternion, with a sign that does not jump. */
export const FLIGHT_QUATERNION: QuaternionConvention = {
  representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'continuous',
};
/** Convention of `FlightSample.euler`: the preset aircraft-euler-deg. */
export const FLIGHT_EULER: EulerConvention = {
  representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed',
};

type Three = readonly [number, number, number];

/** One sample. Reference axes are north-east-down of a flat earth that does not turn; body axes forward-right-down. */
export interface FlightSample {
  /** Seconds from the start. */
  readonly time: number;
  /** Attitude in FLIGHT_QUATERNION: w, x, y, z with v_ref = R(q) v_body. Norm 1 to rounding. */
  readonly quaternion: readonly [number, number, number, number];
  /** The same attitude in FLIGHT_EULER: yaw, pitch, roll in degrees. */
  readonly euler: Three;
  /** Body rates p, q, r in deg/s: angular velocity of body axes relative to reference axes, about forward, right, down. */
  readonly rates: Three;
  /** Metres north and east of the runway's threshold, and above it, of the centre of mass. */
  readonly position: Three;
  /** Velocity over ground towards north, east, down in m/s. */
  readonly velocity: Three;
  /** True airspeed in m/s, gusts included. */
  readonly airspeed: number;
  /** Name of the part of the flight. */
  readonly leg: string;
}

export interface FlightOptions {
  /** Samples a second, a divisor of 200; 50 when absent. */
  readonly rateHz?: number;
  /** Seed of the weather; the scenario's own when absent. */
  readonly seed?: number;
  /** Ends after so many seconds of the flight; the whole flight when absent. */
  readonly seconds?: number;
}

/** Steps of the integration a second. */
const STEPS_PER_SECOND = 200;
/** A leg that does not end is a mistake in the plan. */
const LONGEST_LEG = 400;
const DEG = 180 / Math.PI;

/**
 * The scenario's flight: a light twin flown by a simulated pilot from standstill to standstill through light turbulence:
 * take-off, climb, three survey lines with procedure turns, a steep turn, a stall, a wing-over, a loop in which a
 * vertical line is held (at gimbal lock for all that a 3-2-1 display can tell), a spiral descent and a landing.
 *
 * Six degrees of freedom; attitude, rates, velocity and position come out of one integration and belong together.
 * The state is computed with + − × ÷ √ alone: the same options give the same doubles on every engine.
 * @throws RangeError for a rate that does not divide 200; Error if a leg of the plan does not end.
 */
export function simulateFlight({ rateHz = 50, seed = 31, seconds: until = Infinity }: FlightOptions = {}): FlightSample[] {
  const stepsPerSample = STEPS_PER_SECOND / rateHz;
  if (!Number.isInteger(stepsPerSample) || stepsPerSample < 1) throw new RangeError(`${rateHz} samples a second do not divide ${STEPS_PER_SECOND}.`);
  const body = new RigidBody();
  const { state } = body;
  placeOnRunway(state);
  const weather = new Weather(new SeededRandom(seed));
  const pilot = new Pilot();
  const steering = new Steering();
  const c = new Float64Array(9);
  const flow = stillAir();
  const seconds = 1 / STEPS_PER_SECOND;
  const samples: Omit<FlightSample, 'euler'>[] = [];

  let steps = 0;
  for (const leg of flightPlan()) {
    for (let into = 0; steps * seconds < until; into++, steps++) {
      writeMatrix(state, c);
      const air = weather.at(-state[POSITION + 2]!, flow.airspeed, leg.turbulence, seconds);
      writeFlow(state, c, air, flow);
      const sight = look(state, c, flow, body.wheelsBearing);
      if (leg.done(sight, into * seconds)) break;
      if (into * seconds > LONGEST_LEG) throw new Error(`The leg "${leg.name}" does not end.`);
      if (steps % stepsPerSample === 0) samples.push(sampleOf(state, sight, samples.length / rateHz, leg.name));
      pilot.act(leg.steer(sight, seconds, steering), sight, seconds);
      body.step(pilot.controls, air, seconds);
    }
  }
  return withAngles(samples);
}

function placeOnRunway(state: State): void {
  // Heading 240° from the runway's direction (cos ψ, sin ψ): the half angle's cosine is negative beyond 180°.
  const [cosine, sine] = RUNWAY;
  const half = Math.sqrt((1 - cosine) / 2);
  state[Q] = sine / (2 * half);
  state[Q + 3] = half;
  state[POSITION + 2] = -1.44;
}

const look = (state: State, c: Float64Array, flow: Sight['flow'], wheelsBearing: number): Sight => {
  const u = state[VELOCITY]!, v = state[VELOCITY + 1]!, w = state[VELOCITY + 2]!;
  return {
    c, flow, wheelsBearing,
    p: state[RATE]!, q: state[RATE + 1]!, r: state[RATE + 2]!,
    north: state[POSITION]!, east: state[POSITION + 1]!, height: -state[POSITION + 2]!,
    velocity: [c[0]! * u + c[3]! * v + c[6]! * w, c[1]! * u + c[4]! * v + c[7]! * w, c[2]! * u + c[5]! * v + c[8]! * w],
  };
};

const sampleOf = (state: State, sight: Sight, time: number, leg: string): Omit<FlightSample, 'euler'> => ({
  time, leg,
  quaternion: [state[Q]!, state[Q + 1]!, state[Q + 2]!, state[Q + 3]!],
  rates: [sight.p * DEG, sight.q * DEG, sight.r * DEG],
  position: [sight.north, sight.east, sight.height],
  velocity: sight.velocity,
  airspeed: sight.flow.airspeed,
});

function withAngles(samples: readonly Omit<FlightSample, 'euler'>[]): FlightSample[] {
  const quaternions = new Float64Array(samples.length * 4);
  samples.forEach(({ quaternion }, i) => quaternions.set(quaternion, 4 * i));
  const angles = createConverter(FLIGHT_QUATERNION, FLIGHT_EULER).convert(quaternions);
  return samples.map((sample, i) => ({ ...sample, euler: [angles[3 * i]!, angles[3 * i + 1]!, angles[3 * i + 2]!] }));
}
