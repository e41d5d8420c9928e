/**
 * The survey aircraft as a rigid body with linear aerodynamics: a light twin with figures of its own, each of the size
 * that is usual for its class. SI units throughout. Body axes forward, right, down (FRD) with origin in the centre of mass.
 *
 * Controls are positive for what the pilot wants: elevator nose up, aileron right wing down, rudder nose right.
 */
export const AIRCRAFT = {
  /** kg */
  mass: 2100,
  /** kg m²: Ixx, Iyy, Izz and Ixz of the inertia matrix [[Ixx, 0, −Ixz], [0, Iyy, 0], [−Ixz, 0, Izz]]. */
  inertia: { xx: 4200, yy: 4100, zz: 7800, xz: 220 },
  /** m², m, m */
  wing: { area: 19, span: 13.6, chord: 1.45 },
  /** N at rest at sea level; it falls linearly to none at `noThrustAt` m/s. */
  thrust: { static: 9000, noThrustAt: 140 },
} as const;

/** Coefficients per radian, rates made dimensionless by chord/2V or span/2V. */
export const COEFFICIENTS = {
  lift: { zero: 0.3, alpha: 5, q: 4, elevator: -0.35 },
  drag: { zero: 0.028, induced: 0.041 },
  side: { beta: -0.5, rudder: -0.19 },
  roll: { beta: -0.085, p: -0.48, r: 0.12, aileron: 0.18, stalled: -0.02 },
  pitch: { zero: 0.03, alpha: -0.9, q: -14, elevator: 1.2, stalled: -0.12 },
  yaw: { beta: 0.075, p: -0.04, r: -0.11, aileron: -0.008, rudder: 0.066 },
} as const;

/** sin α where the flow begins to separate and where it has: about 14° and 19°. */
export const STALL = { begins: 0.24, complete: 0.33 } as const;

/** Largest deflections in rad, and the first-order lags of surfaces and engines in s. */
export const CONTROL_LIMITS = { elevator: 0.42, aileron: 0.38, rudder: 0.42, surfaceLag: 0.08, engineLag: 0.9 } as const;

export interface Wheel {
  /** Where the tyre meets level ground when unloaded, from the centre of mass, body axes, m. */
  readonly at: readonly [number, number, number];
  /** N/m and N s/m */
  readonly spring: number;
  readonly damper: number;
  readonly steers: boolean;
  readonly brakes: boolean;
}

export const WHEELS: readonly Wheel[] = [
  { at: [2.5, 0, 1.5], spring: 60_000, damper: 9000, steers: true, brakes: false },
  { at: [-0.5, 1.9, 1.5], spring: 110_000, damper: 16_000, steers: false, brakes: true },
  { at: [-0.5, -1.9, 1.5], spring: 110_000, damper: 16_000, steers: false, brakes: true },
];
