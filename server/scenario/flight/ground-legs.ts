import type { Leg, Place } from './legs.ts';
import type { Sight } from './pilot.ts';
import { clamp } from './state.ts';

/** The runway's direction as a unit vector (north, east), and how far a place is to the right of its centre line. */
const toTheRight = (runway: Place, sight: Sight): number => sight.east * runway[0] - sight.north * runway[1];
const noseRight = (runway: Place, { c }: Sight): number => c[1]! * runway[0] - c[0]! * runway[1];

/** Pedals that keep the roll on the centre line. */
const pedalsFor = (runway: Place, sight: Sight): number =>
  clamp(-2.2 * noseRight(runway, sight) - 0.03 * toTheRight(runway, sight) - 1.2 * sight.r, -0.35, 0.35);

/** Stands with the brakes on: engines idle before the flight, and the recorder's last seconds after it. */
export const stand = (name: string, forSeconds: number): Leg => ({
  name, turbulence: 1,
  steer: () => ({ rates: [0, 0, 0], throttle: 0, brakes: 1 }),
  done: (_sight, into) => into > forSeconds,
});

export function takeOff(runway: Place): Leg {
  return {
    name: 'take-off', turbulence: 1,
    steer(sight, seconds, steering) {
      if (sight.height > 4) return { rates: steering.rates(sight, clamp(-noseRight(runway, sight), -0.15, 0.15), 0.09, seconds), throttle: 1 };
      const pitchingUp = sight.flow.airspeed > 40 ? clamp(0.9 * (0.14 + sight.c[2]!), -0.05, 0.07) : 0;
      return { rates: [-0.8 * sight.c[5]!, pitchingUp, -noseRight(runway, sight)], throttle: 1, pedals: pedalsFor(runway, sight) * (sight.wheelsBearing > 0 ? 1 : 0) };
    },
    done: (sight) => sight.height > 60,
  };
}

/** Down the glide path to the aiming point, 300 m past the threshold, until the flare. */
export function approach(runway: Place, { speed, slope }: { speed: number; slope: number }): Leg {
  return {
    name: 'approach', turbulence: 1,
    steer(sight, seconds, steering) {
      const before = 300 - (sight.north * runway[0] + sight.east * runway[1]);
      const [vn, ve] = sight.velocity;
      const wantedDrift = clamp(-toTheRight(runway, sight) / 12, -8, 8);
      const drift = ve * runway[0] - vn * runway[1];
      const climb = clamp(-slope + (0.16 * (slope * before + 2 - sight.height)) / speed, -0.14, 0.04);
      return { rates: steering.rates(sight, clamp(0.035 * (wantedDrift - drift), -0.35, 0.35), climb, seconds), speed };
    },
    done: (sight) => sight.height < 9,
  };
}

/** Rounds out over the runway until the wheels bear. */
export function flare(runway: Place): Leg {
  return {
    name: 'flare', turbulence: 1,
    steer(sight, seconds, steering) {
      const sink = -(0.5 + 0.24 * Math.max(0, sight.height - 1.4));
      const [p, q, r] = steering.rates(sight, clamp(-0.8 * noseRight(runway, sight), -0.06, 0.06), sink / Math.max(sight.flow.airspeed, 25), seconds);
      return { rates: [p, q, r - 0.4 * noseRight(runway, sight)], throttle: 0 };
    },
    done: (sight) => sight.wheelsBearing >= 2,
  };
}

export function rollOut(runway: Place): Leg {
  return {
    name: 'roll-out', turbulence: 1,
    steer: (sight) => ({
      rates: [-0.8 * sight.c[5]!, sight.wheelsBearing < 3 ? -0.05 : 0, 0], throttle: 0,
      brakes: sight.wheelsBearing >= 3 ? 0.6 : 0, pedals: pedalsFor(runway, sight),
    }),
    done: (sight) => Math.abs(sight.velocity[0]) + Math.abs(sight.velocity[1]) < 0.4,
  };
}
