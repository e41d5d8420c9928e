import { elementary, multiply, type Matrix } from './matrices.ts';
import type { Noise } from './noise.ts';

/** C at a time in seconds, v_FRD = C v_NED. */
export type Motion = (t: number) => Matrix;

const DEG = Math.PI / 180;
/** Heading, pitch and bank, rad. */
export const attitude = (yaw: number, pitch: number, roll: number): Matrix => multiply(elementary(0, roll), elementary(1, pitch), elementary(2, yaw));

/** Sums of sines: smooth, and other at every seed. */
function wander(noise: Noise, amplitude: number, slowest: number, fastest: number): (t: number) => number {
  const terms = [0, 1, 2].map(() => ({ size: amplitude * noise.between(0.3, 0.7), rate: noise.between(slowest, fastest), phase: noise.between(0, 2 * Math.PI) }));
  return (t) => terms.reduce((sum, { size, rate, phase }) => sum + size * Math.sin(rate * t + phase), 0);
}

export type MotionKind =
  | 'varied' | 'flight' | 'small' | 'singleAxis' | 'slantedAxis' | 'levelOneHeading' | 'levelAllHeadings' | 'steadyTurn' | 'sixFaces' | 'oneAttitude' | 'noRoll' | 'noPitch' | 'tumble';

export const MOTION_KINDS: readonly MotionKind[] = ['varied', 'flight', 'small', 'singleAxis', 'slantedAxis', 'levelOneHeading', 'levelAllHeadings', 'steadyTurn', 'sixFaces', 'oneAttitude', 'noRoll', 'noPitch', 'tumble'];

/** @param amplitude - rad, of small motions. */
export function motion(kind: MotionKind, noise: Noise, amplitude = 1 * DEG): Motion {
  const heading = noise.between(-180, 180) * DEG;
  const [pitch, roll] = [noise.between(-40, 40) * DEG, noise.between(-60, 60) * DEG];
  switch (kind) {
    case 'varied': {
      const [p, r, h] = [wander(noise, 0.8, 0.1, 0.5), wander(noise, 1.2, 0.1, 0.6), wander(noise, 1, 0.05, 0.3)];
      return (t) => attitude(heading + 0.15 * t + h(t), p(t), r(t));
    }
    case 'tumble': {
      const [p, r, h] = [wander(noise, 3, 0.1, 0.5), wander(noise, 3, 0.1, 0.6), wander(noise, 3, 0.05, 0.3)];
      return (t) => attitude(heading + h(t), p(t), r(t));
    }
    case 'flight': {
      const [p, r, h] = [wander(noise, 0.12, 0.1, 0.5), wander(noise, 0.4, 0.1, 0.4), wander(noise, 0.6, 0.03, 0.15)];
      return (t) => attitude(heading + h(t), 0.05 + p(t), r(t));
    }
    case 'small': {
      const [p, r, h] = [wander(noise, amplitude, 0.5, 3), wander(noise, amplitude, 0.5, 3), wander(noise, amplitude, 0.5, 3)];
      return (t) => attitude(heading + h(t), pitch + p(t), roll + r(t));
    }
    case 'singleAxis': {
      const angle = wander(noise, 1, 0.1, 0.5);
      const axis = noise.integer(0, 2);
      return (t) => attitude(axis === 2 ? angle(t) : 0, axis === 1 ? angle(t) : 0, axis === 0 ? angle(t) : 0);
    }
    case 'slantedAxis': {
      const angle = wander(noise, 1, 0.1, 0.5);
      const [before, after] = [attitude(heading, pitch, roll), attitude(roll, pitch, heading)];
      return (t) => multiply(after, elementary(2, angle(t)), before);
    }
    case 'levelOneHeading': return () => attitude(heading, 0, 0);
    case 'levelAllHeadings': return (t) => attitude(heading + 0.3 * t + 0.5 * Math.sin(0.2 * t), 0, 0);
    case 'steadyTurn': return (t) => attitude(heading + 0.05 * t, 0.05, 25 * DEG);
    case 'sixFaces': {
      const faces = [attitude(0, 0, 0), attitude(0, 0, Math.PI), attitude(0, 0, Math.PI / 2), attitude(0, 0, -Math.PI / 2), attitude(0, Math.PI / 2, 0), attitude(0, -Math.PI / 2, 0)];
      return (t) => faces[Math.floor(Math.abs(t) * 5) % 6]!;
    }
    case 'oneAttitude': return () => attitude(heading, pitch, roll);
    case 'noRoll': {
      const [p, h] = [wander(noise, 0.6, 0.1, 0.5), wander(noise, 1, 0.05, 0.3)];
      return (t) => attitude(heading + h(t), p(t), 0);
    }
    case 'noPitch': {
      const [r, h] = [wander(noise, 0.6, 0.1, 0.5), wander(noise, 1, 0.05, 0.3)];
      return (t) => attitude(heading + h(t), 0, r(t));
    }
  }
}
