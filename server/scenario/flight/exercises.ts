import type { Leg } from './legs.ts';
import type { Sight } from './pilot.ts';
import { clamp } from './state.ts';

/** Exercises are flown in smooth air. */
const SMOOTH = 0.12;

/** A pull that does not stall the wing: eases off as the angle of attack nears the limit. */
const easedPull = (wanted: number, { flow }: Sight): number => wanted * clamp((0.225 - flow.sinAlpha) / 0.05, 0, 1);

/** Power off, height held until the wing stalls and drops; then nose down, power on. */
export function stall(): Leg {
  let stalledFor = 0;
  return {
    name: 'stall', turbulence: SMOOTH,
    steer(sight, seconds, steering) {
      if (stalledFor < 1.6) {
        if (sight.flow.stalled > 0.35) stalledFor += seconds;
        const [p, q, r] = steering.rates(sight, 0, 0, seconds);
        // Held back with idle power, heading kept with the feet alone.
        return { rates: [p * 0.2, sight.flow.airspeed < 47 ? 0.055 : q, r], throttle: 0 };
      }
      return { rates: steering.rates(sight, 0, sight.flow.airspeed < 46 ? -0.22 : 0, seconds), throttle: 1 };
    },
    done: (sight) => stalledFor >= 1.6 && sight.flow.airspeed > 56 && sight.velocity[2] < 1,
  };
}

/** Up to a steep climb, over the wing past the vertical bank, and out the other way. */
export function wingOver(): Leg {
  let stage: 'pull' | 'over' | 'out' = 'pull';
  return {
    name: 'wing-over', turbulence: SMOOTH,
    steer(sight, seconds, steering) {
      const noseUp = -sight.c[2]!;
      if (stage === 'pull' && noseUp > 0.76) stage = 'over';
      if (stage === 'over' && noseUp < -0.25) stage = 'out';
      if (stage === 'pull') return { rates: [-0.8 * sight.c[5]!, easedPull(0.28, sight), 0], throttle: 1 };
      if (stage === 'over') {
        // Rolls on until the right wing points well below the horizon and the belly looks up a little.
        return { rates: [clamp(1.2 * (sight.c[8]! + 0.2), -0.3, 0.45), easedPull(0.16, sight), 0.03], throttle: 0.7 };
      }
      return { rates: steering.rates(sight, 0, 0.02, seconds), speed: 70 };
    },
    done: (sight) => stage === 'out' && Math.abs(sight.c[5]!) < 0.05 && Math.abs(sight.c[2]!) < 0.12 && sight.velocity[2] < 3,
  };
}

/**
 * A loop with a vertical line held in it: pull to nose straight up, hold it there for a while, pull through inverted and
 * vertically down, and out. The wings are kept in the plane of the loop. For as long as the line is held, yaw and roll of
 * the 3-2-1 angles say next to nothing, while p, q and r stay small.
 */
export function loopWithVerticalLine(heldFor: number): Leg {
  let stage: 'pull' | 'line' | 'over' | 'out' = 'pull';
  let held = 0;
  /** Horizontal direction of the right wing, which the loop keeps: north and east. */
  let wing: readonly [number, number] | null = null;
  return {
    name: 'loop with vertical line', turbulence: SMOOTH,
    steer(sight, seconds, steering) {
      const { c } = sight;
      if (!wing) {
        const size = Math.sqrt(c[0]! * c[0]! + c[1]! * c[1]!);
        wing = [-c[1]! / size, c[0]! / size];
      }
      // The wing's direction in body axes; its cross product with the right wing (0, 1, 0) is the turn that is missing.
      const wx = c[0]! * wing[0] + c[1]! * wing[1], wz = c[6]! * wing[0] + c[7]! * wing[1];
      const p = clamp(2.2 * wz, -0.4, 0.4), r = clamp(-2.2 * wx, -0.3, 0.3);
      const noseUp = -c[2]!, bellyForward = c[8]!;
      if (stage === 'pull') {
        // Slows towards the vertical, where the belly's vertical component is the angle left.
        const left = Math.max(bellyForward, 0);
        if (noseUp > 0.99 && left < 0.02) stage = 'line';
        return { rates: [p, easedPull(noseUp > 0.8 ? Math.min(0.34, 0.03 + 1.6 * left) : 0.34, sight), r], throttle: 1 };
      }
      if (stage === 'line') {
        held += seconds;
        if (held > heldFor) stage = 'over';
        return { rates: [p, clamp(4 * bellyForward, -0.2, 0.2), r], throttle: 1 };
      }
      if (stage === 'over') {
        if (noseUp < -0.2 && bellyForward > 0) stage = 'out';
        return { rates: [p, easedPull(0.45, sight), r], throttle: noseUp > 0 ? 0.8 : 0 };
      }
      return noseUp < -0.1
        ? { rates: [p, easedPull(0.34, sight), r], throttle: 0.2 }
        : { rates: steering.rates(sight, 0, 0, seconds), speed: 75 };
    },
    done: (sight) => stage === 'out' && Math.abs(sight.c[2]!) < 0.1 && sight.velocity[2] < 3,
  };
}
