import { WHEELS } from './aircraft.ts';
import { length, POSITION, RATE, VELOCITY, type Controls, type State } from './state.ts';

/** Friction of a rolling tyre, of a braked one, and of one pushed sideways. */
const ROLLING = 0.02;
const BRAKED = 0.35;
const SIDEWAYS = 0.7;
/** Below this speed, m/s, friction fades with speed, so that a standing aircraft stands. */
const CREEP = 0.1;
/** The nose wheel follows the rudder pedals. */
const STEERING = 0.35;

/**
 * Adds the forces and moments of the wheels on level ground (down = 0) to `sum`: X, Y, Z, L, M, N in body axes.
 * Each wheel is a spring and a damper along the vertical with friction in the plane of the ground.
 * @returns How many wheels bear weight.
 */
export function addGroundForces(state: Readonly<State>, c: Readonly<Float64Array>, controls: Controls, sum: Float64Array): number {
  if (state[POSITION + 2]! < -4) return 0;
  let bearing = 0;
  const level = Math.max(length(c[0]!, c[1]!), 1e-6);
  for (const { at: [x, y, z], spring, damper, steers, brakes } of WHEELS) {
    const depth = state[POSITION + 2]! + c[2]! * x + c[5]! * y + c[8]! * z;
    if (depth <= 0) continue;
    const p = state[RATE]!, q = state[RATE + 1]!, r = state[RATE + 2]!;
    const u = state[VELOCITY]! + q * z - r * y, v = state[VELOCITY + 1]! + r * x - p * z, w = state[VELOCITY + 2]! + p * y - q * x;
    const north = c[0]! * u + c[3]! * v + c[6]! * w, east = c[1]! * u + c[4]! * v + c[7]! * w, down = c[2]! * u + c[5]! * v + c[8]! * w;
    const load = spring * depth + damper * down * Math.min(1, depth / 0.02);
    if (load <= 0) continue;
    bearing++;
    // Direction in which the wheel rolls: the nose's, turned by the steering.
    const steer = steers ? STEERING * controls.rudder : 0;
    const turned = Math.sqrt(1 + steer * steer);
    const rollNorth = (c[0]! / level - (steer * c[1]!) / level) / turned, rollEast = (c[1]! / level + (steer * c[0]!) / level) / turned;
    const along = north * rollNorth + east * rollEast, across = -north * rollEast + east * rollNorth;
    const resists = -(ROLLING + (brakes ? BRAKED * controls.brakes : 0)) * load * (along / Math.sqrt(along * along + CREEP * CREEP));
    const holds = -SIDEWAYS * load * (across / Math.sqrt(across * across + CREEP * CREEP));
    const forceNorth = resists * rollNorth - holds * rollEast, forceEast = resists * rollEast + holds * rollNorth;
    const fx = c[0]! * forceNorth + c[1]! * forceEast - c[2]! * load;
    const fy = c[3]! * forceNorth + c[4]! * forceEast - c[5]! * load;
    const fz = c[6]! * forceNorth + c[7]! * forceEast - c[8]! * load;
    sum[0]! += fx; sum[1]! += fy; sum[2]! += fz;
    sum[3]! += y * fz - z * fy; sum[4]! += z * fx - x * fz; sum[5]! += x * fy - y * fx;
  }
  return bearing;
}
