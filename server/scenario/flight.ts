import type { Quaternion } from '#shared/attitude/geometry/quaternion.ts';
import { multiply, normalise } from '#shared/attitude/geometry/quaternion.ts';
import { FLIGHT_PLAN, type Leg } from './flight-plan.ts';
import { SeededRandom } from './random.ts';

/** One sample of the recording. Attitude as in the preset aircraft-quaternion (NED, FRD, scalar first, body to reference). */
export interface FlightSample {
  /** Seconds from the start. */
  readonly time: number;
  readonly quaternion: Quaternion;
  /** Body rates p, q, r in rad/s: of the body relative to NED, about forward, right, down. */
  readonly rates: readonly [number, number, number];
  /** Metres north and east of the field, and above it. */
  readonly position: readonly [number, number, number];
  /** Metres per second. */
  readonly airspeed: number;
}

export interface FlightOptions {
  /** Samples a second; 50 when absent. */
  readonly rateHz?: number;
  readonly seed?: number;
}

const GRAVITY = 9.80665;
/** Steps of the integration between two samples. */
const STEPS = 4;
/** First-order lags of the aircraft's response, in seconds. */
const ROLL_LAG = 0.9;
const PITCH_LAG = 1.4;
const RATE_LAG = 0.35;

/**
 * The Petrel's survey flight: an aircraft that follows its plan by rolling and pitching with first-order lags in
 * co-ordinated turns, in light turbulence, and flies one loop as an exercise, through the vertical. The attitude is
 * integrated from the body rates (constant over a step, so that the recorded rates and attitudes belong together).
 * Deterministic: the same options give the same flight on every machine of one engine.
 */
export function simulateFlight({ rateHz = 50, seed = 4711 }: FlightOptions = {}): FlightSample[] {
  const random = new SeededRandom(seed);
  const step = 1 / (rateHz * STEPS);
  const samples: FlightSample[] = [];
  const first = FLIGHT_PLAN[0]!;
  const state: State = { q: fromAngles(first.heading ?? 0, 0, 0), rates: [0, 0, 0], position: [0, 0, 0], airspeed: 0, gust: [0, 0, 0] };
  for (const leg of FLIGHT_PLAN) {
    const count = Math.round(leg.seconds * rateHz);
    for (let i = 0; i < count; i++) {
      samples.push({ time: samples.length / rateHz, quaternion: [...state.q], rates: [...state.rates], position: [...state.position], airspeed: state.airspeed });
      for (let n = 0; n < STEPS; n++) advance(state, leg, step, random);
    }
  }
  return samples;
}

interface State {
  q: Quaternion;
  rates: [number, number, number];
  position: [number, number, number];
  airspeed: number;
  gust: [number, number, number];
}

function advance(state: State, leg: Leg, step: number, random: SeededRandom): void {
  const [yaw, pitch, roll] = anglesOf(state.q);
  const wanted = leg.loop === true ? loopRates(leg) : turnRates(state, leg, yaw, pitch, roll);
  for (let axis = 0; axis < 3; axis++) {
    // Turbulence as filtered noise on the rates: a gust lasts about a second.
    state.gust[axis]! += (-state.gust[axis]! / 1.1) * step + leg.turbulence * [0.05, 0.025, 0.012][axis]! * random.normal() * Math.sqrt(step);
    state.rates[axis]! += ((wanted[axis]! + state.gust[axis]! - state.rates[axis]!) / RATE_LAG) * step;
  }
  state.q = turned(state.q, state.rates, step);
  state.airspeed += ((leg.airspeed - state.airspeed) / 4) * step;
  const [w, x, y, z] = state.q;
  const nose = [w * w + x * x - y * y - z * z, 2 * (x * y + w * z), 2 * (x * z - w * y)] as const;
  state.position[0] += nose[0] * state.airspeed * step;
  state.position[1] += nose[1] * state.airspeed * step;
  state.position[2] = Math.max(0, state.position[2] - nose[2] * state.airspeed * step);
}

/** Body rates that roll and pitch towards the leg's attitude, and turn co-ordinatedly. */
function turnRates(state: State, leg: Leg, yaw: number, pitch: number, roll: number): [number, number, number] {
  const bank = leg.heading === undefined ? leg.bank : Math.max(-leg.bank, Math.min(leg.bank, 1.1 * angleBetween(leg.heading, yaw)));
  const rollRate = (bank - roll) / ROLL_LAG;
  const pitchRate = (leg.pitch - pitch) / PITCH_LAG;
  const turnRate = state.airspeed > 15 ? (GRAVITY * Math.tan(roll)) / state.airspeed : 0;
  // p, q, r of Euler rates, 3-2-1: Stevens, Lewis & Johnson, Aircraft Control and Simulation, sect. 1.4 (from memory).
  return [
    rollRate - turnRate * Math.sin(pitch),
    pitchRate * Math.cos(roll) + turnRate * Math.cos(pitch) * Math.sin(roll),
    -pitchRate * Math.sin(roll) + turnRate * Math.cos(pitch) * Math.cos(roll),
  ];
}

/** A steady pull: one whole turn about the right wing over the leg. */
const loopRates = (leg: Leg): [number, number, number] => [0, (2 * Math.PI) / leg.seconds, 0];

/** The attitude after turning with constant body rates for a while: q exp(ω t / 2). */
function turned(q: Readonly<Quaternion>, [p, r, s]: readonly [number, number, number], time: number): Quaternion {
  const rate = Math.hypot(p, r, s);
  if (rate === 0) return [...q];
  const half = (rate * time) / 2;
  const scale = Math.sin(half) / rate;
  return normalise(multiply(q, [Math.cos(half), p * scale, r * scale, s * scale]));
}

const fromAngles = (yaw: number, pitch: number, roll: number): Quaternion =>
  multiply(multiply([Math.cos(yaw / 2), 0, 0, Math.sin(yaw / 2)], [Math.cos(pitch / 2), 0, Math.sin(pitch / 2), 0]), [Math.cos(roll / 2), Math.sin(roll / 2), 0, 0]);

function anglesOf([w, x, y, z]: Readonly<Quaternion>): [number, number, number] {
  return [
    Math.atan2(2 * (x * y + w * z), w * w + x * x - y * y - z * z),
    Math.asin(Math.max(-1, Math.min(1, 2 * (w * y - x * z)))),
    Math.atan2(2 * (y * z + w * x), w * w - x * x - y * y + z * z),
  ];
}

const angleBetween = (to: number, from: number): number => Math.atan2(Math.sin(to - from), Math.cos(to - from));
