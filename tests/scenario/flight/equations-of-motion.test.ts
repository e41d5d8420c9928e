import { describe, expect, it } from 'vitest';
import { AIRCRAFT } from '#server/scenario/flight/aircraft.ts';
import { RigidBody } from '#server/scenario/flight/equations-of-motion.ts';
import { GRAVITY, POSITION, Q, RATE, VELOCITY, writeMatrix } from '#server/scenario/flight/state.ts';

const NO_AIR = { wind: [0, 0, 0], gust: [0, 0, 0], rollingGust: 0, density: 0 } as const;
const HANDS_OFF = { elevator: 0, aileron: 0, rudder: 0, throttle: 0, brakes: 0 };
const HIGH = -5000;

function thrown(rates: readonly number[], velocity: readonly number[]): RigidBody {
  const body = new RigidBody();
  body.state.set([1, 0, 0, 0], Q);
  body.state.set(rates, RATE);
  body.state.set(velocity, VELOCITY);
  body.state.set([0, 0, HIGH], POSITION);
  return body;
}

const run = (body: RigidBody, seconds: number) => {
  for (let i = 0; i < seconds * 200; i++) body.step(HANDS_OFF, NO_AIR, 1 / 200);
};

describe('the rigid body without air', () => {
  it('falls as Galileo says, whatever it does about its own axes', () => {
    const body = thrown([0.7, -0.4, 1.1], [50, 3, -2]);
    run(body, 8);
    const { state } = body;
    expect(state[POSITION]).toBeCloseTo(50 * 8, 6);
    expect(state[POSITION + 1]).toBeCloseTo(3 * 8, 6);
    expect(state[POSITION + 2]).toBeCloseTo(HIGH - 2 * 8 + (GRAVITY * 8 * 8) / 2, 6);
  });

  it('keeps its angular momentum in space and its energy of rotation (Euler’s equations, free of torque)', () => {
    const body = thrown([0.7, -0.4, 1.1], [50, 0, 0]);
    const before = { momentum: momentumInSpace(body), energy: rotationEnergy(body) };
    run(body, 20);
    const after = momentumInSpace(body);
    before.momentum.forEach((component, axis) => expect(after[axis]! / 10_000).toBeCloseTo(component / 10_000, 7));
    expect(rotationEnergy(body) / before.energy).toBeCloseTo(1, 8);
    // It did tumble: the rates are not what they were.
    expect(Math.abs(body.state[RATE]! - 0.7) + Math.abs(body.state[RATE + 1]! + 0.4)).toBeGreaterThan(0.1);
  });

  it('turns by exactly the angle of a steady roll', () => {
    const body = thrown([0, 0.3, 0], [0, 0, 0]);
    run(body, 10);
    expect(body.state[Q]).toBeCloseTo(Math.cos(1.5), 12);
    expect(body.state[Q + 2]).toBeCloseTo(Math.sin(1.5), 12);
  });
});

function angularMomentum({ state }: RigidBody): number[] {
  const { xx, yy, zz, xz } = AIRCRAFT.inertia;
  const [p, q, r] = [state[RATE]!, state[RATE + 1]!, state[RATE + 2]!];
  return [xx * p - xz * r, yy * q, zz * r - xz * p];
}

function momentumInSpace(body: RigidBody): number[] {
  const c = new Float64Array(9);
  writeMatrix(body.state, c);
  const h = angularMomentum(body);
  return [0, 1, 2].map((axis) => c[axis]! * h[0]! + c[3 + axis]! * h[1]! + c[6 + axis]! * h[2]!);
}

const rotationEnergy = (body: RigidBody): number => angularMomentum(body).reduce((sum, h, axis) => sum + (h * body.state[RATE + axis]!) / 2, 0);
