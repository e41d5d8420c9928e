import type { InertiaMatrix } from './inertia.ts';

type Vector = readonly [number, number, number];

/** Motion of a rigid body at one moment, components in right-handed body axes with their origin at the centre of mass. */
export interface BodyMotion {
  /** m/s, of the centre of mass relative to an inertial frame. */
  readonly velocity: Vector;
  /** rad/s, relative to an inertial frame. */
  readonly angularVelocity: Vector;
  /** m/s² and rad/s²: time derivatives of the components as they stand, which is how body axes see them. */
  readonly velocityDerivative: Vector;
  readonly angularVelocityDerivative: Vector;
}

export interface ForceAndMoment {
  /** N, the sum of all external forces, weight among them. */
  readonly force: Vector;
  /** N m, about the centre of mass. */
  readonly moment: Vector;
}

/**
 * Newton's and Euler's equations in body axes: F = m (v̇ + ω × v), M = I ω̇ + ω × (I ω).
 * Source: Etkin & Reid, Dynamics of Flight, ch. 4 (from memory). Accuracy: plain double precision.
 *
 * @param mass - kg. @param inertia - kg m² about the centre of mass, in the same axes.
 */
export function newtonEuler(mass: number, inertia: InertiaMatrix, { velocity, angularVelocity, velocityDerivative, angularVelocityDerivative }: BodyMotion): ForceAndMoment {
  const turning = cross(angularVelocity, velocity);
  const gyroscopic = cross(angularVelocity, times(inertia, angularVelocity));
  const angular = times(inertia, angularVelocityDerivative);
  return {
    force: [0, 1, 2].map((k) => mass * (velocityDerivative[k]! + turning[k]!) + 0) as unknown as Vector,
    moment: [0, 1, 2].map((k) => angular[k]! + gyroscopic[k]! + 0) as unknown as Vector,
  };
}

const cross = (a: Vector, b: Vector): Vector => [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
const times = (m: InertiaMatrix, v: Vector): Vector => m.map((row) => row[0] * v[0] + row[1] * v[1] + row[2] * v[2]) as unknown as Vector;
