import { CONTROL_LIMITS } from './aircraft.ts';
import type { Flow } from './forces.ts';
import { clamp, GRAVITY, type Controls } from './state.ts';

/** What the pilot sees: the aircraft's motion, as numbers without angles. */
export interface Sight {
  /** C with v_body = C v_ref, row by row: nose, right wing and belly in NED; columns are north, east and down in body axes. */
  readonly c: Readonly<Float64Array>;
  readonly p: number;
  readonly q: number;
  readonly r: number;
  readonly flow: Readonly<Flow>;
  /** m, of the centre of mass, north and east of the runway's threshold and above it. */
  readonly north: number;
  readonly east: number;
  readonly height: number;
  /** Velocity over ground, m/s. */
  readonly velocity: readonly [number, number, number];
  readonly wheelsBearing: number;
}

/** What a leg asks for: body rates, and either a speed to hold or a throttle setting. */
export interface Command {
  readonly rates: readonly [p: number, q: number, r: number];
  readonly speed?: number;
  readonly throttle?: number;
  readonly brakes?: number;
  /** Pedals pushed further on the ground, where the rudder alone does not steer. */
  readonly pedals?: number;
}

/** Dynamic pressure at which the gains below are meant, Pa. */
const REFERENCE_PRESSURE = 2150;

/** Hands and feet: turns wanted rates and speed into deflections, which follow with the lag of the machinery. */
export class Pilot {
  readonly controls: Controls = { elevator: 0, aileron: 0, rudder: 0, throttle: 0, brakes: 1 };
  #elevatorTrim = 0;
  #throttleTrim = 0.4;

  act({ rates: [p, q, r], speed, throttle, brakes = 0, pedals = 0 }: Command, sight: Sight, seconds: number): void {
    const { controls } = this;
    const gain = clamp(REFERENCE_PRESSURE / Math.max(sight.flow.dynamicPressure, 1), 0.4, 4);
    const airborne = sight.wheelsBearing === 0;
    const pitching = q - sight.q;
    this.#elevatorTrim = airborne || q > 0.01 ? clamp(this.#elevatorTrim + 0.9 * gain * pitching * seconds, -0.3, 0.3) : this.#elevatorTrim * (1 - 0.2 * seconds);
    const elevator = 0.38 * gain * pitching + this.#elevatorTrim;
    const aileron = 0.29 * Math.sqrt(gain) * p + 0.12 * gain * (p - sight.p);
    const rudder = 0.45 * gain * (r - sight.r) + (airborne ? 0.25 * sight.flow.sinBeta : 0) + pedals;
    const surface = seconds / CONTROL_LIMITS.surfaceLag;
    controls.elevator += surface * (clamp(elevator, -CONTROL_LIMITS.elevator, CONTROL_LIMITS.elevator) - controls.elevator);
    controls.aileron += surface * (clamp(aileron, -CONTROL_LIMITS.aileron, CONTROL_LIMITS.aileron) - controls.aileron);
    controls.rudder += surface * (clamp(rudder, -CONTROL_LIMITS.rudder, CONTROL_LIMITS.rudder) - controls.rudder);

    let power = throttle ?? 0;
    if (speed !== undefined) {
      const short = speed - sight.flow.airspeed;
      if (Math.abs(short) < 4) this.#throttleTrim = clamp(this.#throttleTrim + 0.008 * short * seconds, 0, 1);
      power = this.#throttleTrim + 0.09 * short;
    }
    controls.throttle += (seconds / CONTROL_LIMITS.engineLag) * (clamp(power, 0, 1) - controls.throttle);
    controls.brakes += (seconds / 0.5) * (brakes - controls.brakes);
  }
}

/** Flies by bank and climb: the outer loop of every ordinary leg. */
export class Steering {
  #slowAlpha = 0.05;

  /**
   * Body rates that bring the aircraft to a bank and a path, turning without slip.
   * @param bank - Sine of the bank wanted, right wing down positive, below 1 in size.
   * @param climb - Sine of the climb angle wanted.
   */
  rates(sight: Sight, bank: number, climb: number, seconds: number): [number, number, number] {
    const { c, flow } = sight;
    // Down in body axes: (−sin θ, sin φ cos θ, cos φ cos θ).
    const sinPitch = -c[2]!, cosPitch = Math.max(Math.sqrt(c[5]! * c[5]! + c[8]! * c[8]!), 0.05);
    const sinBank = c[5]! / cosPitch, cosBank = c[8]! / cosPitch;
    this.#slowAlpha += (seconds / 0.7) * (clamp(flow.sinAlpha * cosBank, -0.1, 0.22) - this.#slowAlpha);

    const wantedCos = Math.sqrt(1 - bank * bank);
    const rollRate = clamp(1.3 * (cosBank > 0 ? bank * cosBank - wantedCos * sinBank : Math.sign(bank * cosBank - wantedCos * sinBank)), -0.24, 0.24);
    // Never pulls into a stall: what is left of the angle of attack limits the pull.
    const pitchRate = Math.min(clamp(0.9 * (climb + this.#slowAlpha - sinPitch), -0.2, 0.2), Math.max(3 * (0.2 - flow.sinAlpha), -0.25));
    // The turn that goes with the bank; fades out where the bank is too steep for one.
    const turnRate = flow.airspeed > 25 ? (clamp((cosBank - 0.1) / 0.4, 0, 1) * GRAVITY * sinBank) / (Math.max(cosBank, 0.1) * flow.airspeed) : 0;
    // p, q, r of Euler rates, 3-2-1: Stevens, Lewis & Johnson, Aircraft Control and Simulation, sect. 1.4 (from memory).
    return [
      rollRate - turnRate * sinPitch,
      pitchRate * cosBank + turnRate * cosPitch * sinBank,
      -pitchRate * sinBank + turnRate * cosPitch * cosBank,
    ];
  }
}
