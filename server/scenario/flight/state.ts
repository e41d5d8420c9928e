import { AIRCRAFT } from './aircraft.ts';

/**
 * The simulation's state as one vector, so that one integrator serves all of it:
 * quaternion (scalar first, Hamilton, body to reference), body rates p, q, r in rad/s, velocity over ground in body
 * axes in m/s, position north, east, down of the field in m.
 */
export type State = Float64Array;
export const Q = 0;
export const RATE = 4;
export const VELOCITY = 7;
export const POSITION = 10;
export const STATE_SIZE = 13;

/** What the pilot's hands have reached: deflections in rad, throttle and brakes 0 to 1. */
export interface Controls {
  elevator: number;
  aileron: number;
  rudder: number;
  throttle: number;
  brakes: number;
}

/** Motion of the air at the aircraft: steady wind in NED and gusts in body axes, m/s; a rolling gust in rad/s. */
export interface Air {
  readonly wind: readonly [number, number, number];
  readonly gust: readonly [number, number, number];
  readonly rollingGust: number;
  /** kg/m³ */
  readonly density: number;
}

/** m/s², standard gravity (ISO 80000-3). */
export const GRAVITY = 9.80665;
export const WEIGHT = AIRCRAFT.mass * GRAVITY;

/** Writes C, row by row, with v_body = C v_ref, of the state's quaternion, which must be of norm 1. */
export function writeMatrix(state: Readonly<Float64Array>, c: Float64Array): void {
  const w = state[Q]!, x = state[Q + 1]!, y = state[Q + 2]!, z = state[Q + 3]!;
  c[0] = 1 - 2 * (y * y + z * z); c[1] = 2 * (x * y + w * z); c[2] = 2 * (x * z - w * y);
  c[3] = 2 * (x * y - w * z); c[4] = 1 - 2 * (x * x + z * z); c[5] = 2 * (y * z + w * x);
  c[6] = 2 * (x * z + w * y); c[7] = 2 * (y * z - w * x); c[8] = 1 - 2 * (x * x + y * y);
}

export const clamp = (value: number, low: number, high: number): number => (value < low ? low : value > high ? high : value);
export const length = (x: number, y: number, z = 0): number => Math.sqrt(x * x + y * y + z * z);
