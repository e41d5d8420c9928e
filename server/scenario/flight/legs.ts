import type { Command, Sight, Steering } from './pilot.ts';
import { clamp, length } from './state.ts';

/** A part of the flight: what the pilot does, and when it is over. Keeps state of its own: make a new one for every flight. */
export interface Leg {
  readonly name: string;
  /** 1 on an ordinary day; exercises are flown in smooth air. */
  readonly turbulence: number;
  steer(sight: Sight, seconds: number, steering: Steering): Command;
  done(sight: Sight, secondsIntoLeg: number): boolean;
}

/** Metres north and east of the runway's threshold. */
export type Place = readonly [north: number, east: number];

interface Level {
  readonly height: number;
  readonly speed: number;
}

/** Sine of the climb that brings the aircraft to a height, gently. */
const climbTo = (height: number, sight: Sight, steepest = 0.12): number =>
  clamp((0.12 * (height - sight.height)) / Math.max(sight.flow.airspeed, 30), -0.1, steepest);

/** Bank that brings the track over ground onto a direction (a unit vector). */
function bankFor([north, east]: Place, sight: Sight, most: number): number {
  const [vn, ve] = sight.velocity;
  const speed = Math.max(length(vn, ve), 1);
  const ahead = (vn * north + ve * east) / speed, aside = (vn * east - ve * north) / speed;
  const turn = ahead > 0 ? aside : Math.sign(aside);
  return clamp((turn * speed) / 45, -most, most);
}

/** Follows the straight line between two places, ends past the second. */
export function line(name: string, from: Place, to: Place, { height, speed, bank = 0.42, steepest }: Level & { bank?: number; steepest?: number }): Leg {
  const distance = length(to[0] - from[0], to[1] - from[1]);
  const along: Place = [(to[0] - from[0]) / distance, (to[1] - from[1]) / distance];
  return {
    name, turbulence: 1,
    steer(sight, seconds, steering) {
      // Where to steer: along the line, turned towards it in proportion to the distance from it.
      const off = (sight.east - from[1]) * along[0] - (sight.north - from[0]) * along[1];
      const back = clamp(-off / 450, -1.2, 1.2);
      const size = Math.sqrt(1 + back * back);
      const course: Place = [(along[0] - back * along[1]) / size, (along[1] + back * along[0]) / size];
      return { rates: steering.rates(sight, bankFor(course, sight, bank), climbTo(height, sight, steepest), seconds), speed };
    },
    done: (sight) => (sight.north - to[0]) * along[0] + (sight.east - to[1]) * along[1] > 0,
  };
}

/** Turns by an angle (degrees) or until a height is reached, with a fixed bank: its sine, right positive. */
export function turn(name: string, bank: number, { speed, height, by = Infinity, climb, turbulence = 1 }: Level & { by?: number; climb?: number; turbulence?: number }): Leg {
  let turned = 0;
  return {
    name, turbulence,
    steer(sight, seconds, steering) {
      // Heading rate from the body rates: (q sin φ + r cos φ) / cos θ.
      turned += ((sight.q * sight.c[5]! + sight.r * sight.c[8]!) / Math.max(1 - sight.c[2]! * sight.c[2]!, 0.1)) * seconds;
      return { rates: steering.rates(sight, bank, climb ?? climbTo(height, sight), seconds), speed };
    },
    done: (sight) => Math.abs(turned) * 57.29577951308232 > by || (climb !== undefined && (climb < 0 ? sight.height < height : sight.height > height)),
  };
}

/** Wings level for a while. */
export function level(name: string, forSeconds: number, { height, speed }: Level, turbulence = 0.3): Leg {
  return {
    name, turbulence,
    steer: (sight, seconds, steering) => ({ rates: steering.rates(sight, 0, climbTo(height, sight), seconds), speed }),
    done: (_sight, into) => into > forSeconds,
  };
}
