import { AIRCRAFT, COEFFICIENTS, STALL } from './aircraft.ts';
import { clamp, length, RATE, VELOCITY, type Air, type Controls, type State } from './state.ts';

/** Air data that forces and pilot share. Angles of attack and sideslip as sines. */
export interface Flow {
  airspeed: number;
  sinAlpha: number;
  cosAlpha: number;
  sinBeta: number;
  /** Pa */
  dynamicPressure: number;
  /** 0 attached, 1 separated. */
  stalled: number;
}

export const stillAir = (): Flow => ({ airspeed: 0, sinAlpha: 0, cosAlpha: 1, sinBeta: 0, dynamicPressure: 0, stalled: 0 });

/** Writes the flow past the aircraft. @param c - C with v_body = C v_ref, row by row. */
export function writeFlow(state: Readonly<State>, c: Readonly<Float64Array>, air: Air, flow: Flow): void {
  const [wn, we, wd] = air.wind;
  const u = state[VELOCITY]! - (c[0]! * wn + c[1]! * we + c[2]! * wd) - air.gust[0];
  const v = state[VELOCITY + 1]! - (c[3]! * wn + c[4]! * we + c[5]! * wd) - air.gust[1];
  const w = state[VELOCITY + 2]! - (c[6]! * wn + c[7]! * we + c[8]! * wd) - air.gust[2];
  flow.airspeed = length(u, v, w);
  const inPlane = Math.max(length(u, w), 1e-3);
  flow.sinAlpha = w / inPlane;
  flow.cosAlpha = u / inPlane;
  flow.sinBeta = v / Math.max(flow.airspeed, 1e-3);
  flow.dynamicPressure = (air.density * flow.airspeed * flow.airspeed) / 2;
  const share = clamp((Math.abs(flow.sinAlpha) - STALL.begins) / (STALL.complete - STALL.begins), 0, 1);
  flow.stalled = share * share * (3 - 2 * share);
}

/**
 * Adds thrust and air forces (N, body axes) and moments (N m, about the centre of mass) to `sum`: X, Y, Z, L, M, N.
 *
 * Lift is linear in the angle of attack and goes over to that of a flat plate where the flow separates (the blend of
 * Beard & McLain, Small Unmanned Aircraft, sect. 4.2, with a cubic in place of their exponential; from memory).
 */
export function addAirForces(state: Readonly<State>, controls: Controls, air: Air, flow: Flow, sum: Float64Array): void {
  const { area, span, chord } = AIRCRAFT.wing;
  const { lift, drag, side, roll, pitch, yaw } = COEFFICIENTS;
  const { sinAlpha, cosAlpha, sinBeta: beta, stalled, dynamicPressure, airspeed } = flow;
  const p = state[RATE]! - air.rollingGust, q = state[RATE + 1]!, r = state[RATE + 2]!;
  const force = dynamicPressure * area;
  // Dynamic pressure times 1/2V: the dimensionless rates without a division by a speed that may be zero.
  const perRate = (air.density * airspeed * area) / 4;
  // arcsin by two terms of its series; beyond the stall the flat plate counts.
  const alpha = sinAlpha + (sinAlpha * sinAlpha * sinAlpha) / 6;

  const attached = lift.zero + lift.alpha * alpha;
  const plate = 2 * sinAlpha * Math.abs(sinAlpha) * cosAlpha;
  const liftCoefficient = (1 - stalled) * attached + stalled * plate;
  const dragCoefficient = drag.zero + (1 - stalled) * drag.induced * attached * attached + stalled * 2 * Math.abs(sinAlpha * sinAlpha * sinAlpha);
  const liftForce = force * (liftCoefficient + lift.elevator * controls.elevator) + perRate * lift.q * chord * q;
  const dragForce = force * dragCoefficient;

  const thrust = controls.throttle * AIRCRAFT.thrust.static * (air.density / 1.225) * Math.max(0, 1 - airspeed / AIRCRAFT.thrust.noThrustAt);
  sum[0]! += thrust + liftForce * sinAlpha - dragForce * cosAlpha;
  sum[1]! += force * (side.beta * beta + side.rudder * controls.rudder);
  sum[2]! += -liftForce * cosAlpha - dragForce * sinAlpha;
  sum[3]! += span * (force * (roll.beta * beta + roll.aileron * controls.aileron + roll.stalled * stalled) + perRate * span * (roll.p * p + roll.r * r));
  sum[4]! += chord * (force * (pitch.zero + pitch.alpha * sinAlpha + pitch.elevator * controls.elevator + pitch.stalled * stalled) + perRate * chord * pitch.q * q);
  sum[5]! += span * (force * (yaw.beta * beta + yaw.aileron * controls.aileron + yaw.rudder * controls.rudder) + perRate * span * (yaw.p * p + yaw.r * r));
}
