import { AIRCRAFT, WHEELS } from './aircraft.ts';
import { addAirForces, stillAir, writeFlow } from './forces.ts';
import { addGroundForces } from './landing-gear.ts';
import { GRAVITY, POSITION, Q, RATE, STATE_SIZE, VELOCITY, writeMatrix, type Air, type Controls, type State } from './state.ts';

const { xx, yy, zz, xz } = AIRCRAFT.inertia;
const determinant = xx * zz - xz * xz;

/**
 * Integrates the six degrees of freedom of a rigid body over a flat earth that does not turn, by the classical
 * Runge–Kutta method of fourth order; controls and air stand still over the step.
 * Only + − × ÷ √ are used, so that every engine and processor computes the same flight, bit for bit.
 * Source of the equations: Stevens, Lewis & Johnson, Aircraft Control and Simulation, sect. 1.7 (from memory).
 */
export class RigidBody {
  readonly state: State = new Float64Array(STATE_SIZE);
  readonly #slopes = [1, 2, 3, 4].map(() => new Float64Array(STATE_SIZE));
  readonly #trial = new Float64Array(STATE_SIZE);
  readonly #matrix = new Float64Array(9);
  readonly #sum = new Float64Array(6);
  readonly #flow = stillAir();
  /** How many wheels bore weight at the last look. */
  wheelsBearing = WHEELS.length;

  step(controls: Controls, air: Air, seconds: number): void {
    const [k1, k2, k3, k4] = this.#slopes as [Float64Array, Float64Array, Float64Array, Float64Array];
    const { state } = this;
    this.#slope(state, controls, air, k1);
    this.#slope(this.#ahead(k1, seconds / 2), controls, air, k2);
    this.#slope(this.#ahead(k2, seconds / 2), controls, air, k3);
    this.#slope(this.#ahead(k3, seconds), controls, air, k4);
    for (let i = 0; i < STATE_SIZE; i++) state[i]! += (seconds / 6) * (k1[i]! + 2 * (k2[i]! + k3[i]!) + k4[i]!);
    normalise(state);
  }

  #ahead(slope: Float64Array, seconds: number): Float64Array {
    for (let i = 0; i < STATE_SIZE; i++) this.#trial[i] = this.state[i]! + seconds * slope[i]!;
    normalise(this.#trial);
    return this.#trial;
  }

  #slope(s: Readonly<State>, controls: Controls, air: Air, slope: Float64Array): void {
    const c = this.#matrix, sum = this.#sum;
    writeMatrix(s, c);
    writeFlow(s, c, air, this.#flow);
    sum.fill(0);
    addAirForces(s, controls, air, this.#flow, sum);
    this.wheelsBearing = addGroundForces(s, c, controls, sum);

    const w = s[Q]!, x = s[Q + 1]!, y = s[Q + 2]!, z = s[Q + 3]!;
    const p = s[RATE]!, q = s[RATE + 1]!, r = s[RATE + 2]!;
    const u = s[VELOCITY]!, v = s[VELOCITY + 1]!, down = s[VELOCITY + 2]!;
    // q̇ = q (0, ω) / 2
    slope[Q] = (-x * p - y * q - z * r) / 2;
    slope[Q + 1] = (w * p + y * r - z * q) / 2;
    slope[Q + 2] = (w * q + z * p - x * r) / 2;
    slope[Q + 3] = (w * r + x * q - y * p) / 2;
    // I ω̇ = M − ω × I ω
    const hx = xx * p - xz * r, hy = yy * q, hz = zz * r - xz * p;
    const mx = sum[3]! - (q * hz - r * hy), my = sum[4]! - (r * hx - p * hz), mz = sum[5]! - (p * hy - q * hx);
    slope[RATE] = (zz * mx + xz * mz) / determinant;
    slope[RATE + 1] = my / yy;
    slope[RATE + 2] = (xz * mx + xx * mz) / determinant;
    // v̇ = F/m + C g − ω × v
    slope[VELOCITY] = sum[0]! / AIRCRAFT.mass + GRAVITY * c[2]! - (q * down - r * v);
    slope[VELOCITY + 1] = sum[1]! / AIRCRAFT.mass + GRAVITY * c[5]! - (r * u - p * down);
    slope[VELOCITY + 2] = sum[2]! / AIRCRAFT.mass + GRAVITY * c[8]! - (p * v - q * u);
    slope[POSITION] = c[0]! * u + c[3]! * v + c[6]! * down;
    slope[POSITION + 1] = c[1]! * u + c[4]! * v + c[7]! * down;
    slope[POSITION + 2] = c[2]! * u + c[5]! * v + c[8]! * down;
  }
}

function normalise(s: Float64Array): void {
  const norm = Math.sqrt(s[Q]! * s[Q]! + s[Q + 1]! * s[Q + 1]! + s[Q + 2]! * s[Q + 2]! + s[Q + 3]! * s[Q + 3]!);
  for (let i = Q; i < Q + 4; i++) s[i]! /= norm;
}
