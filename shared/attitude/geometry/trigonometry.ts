import type { AngleUnit } from '../convention.ts';

export const PI = Math.PI;
const RAD_PER_DEG = PI / 180;

/** [sin, cos] of an angle. Degrees are reduced in degrees, so that multiples of 90° come out exact. */
export function sinCos(angle: number, unit: AngleUnit): readonly [number, number] {
  if (unit === 'rad') return [Math.sin(angle), Math.cos(angle)];
  const turns = Math.round(angle / 90);
  // Both terms are multiples of the last bit of `angle` within reach of a double: the difference is exact below 2^53°.
  const rest = Math.abs(angle) < 2 ** 46 ? angle - turns * 90 : angle % 90;
  const quadrant = Math.abs(angle) < 2 ** 46 ? ((turns % 4) + 4) % 4 : ((Math.trunc((angle % 360) / 90) % 4) + 4) % 4;
  const s = Math.abs(rest) === 30 ? Math.sign(rest) / 2 : Math.sin(rest * RAD_PER_DEG);
  const c = Math.cos(rest * RAD_PER_DEG);
  switch (quadrant) {
    case 0: return [s, c];
    case 1: return [c, -s];
    case 2: return [-s, -c];
    default: return [-c, s];
  }
}

/** An angle in radians, in the unit asked for. */
export const inUnit = (radians: number, unit: AngleUnit): number => (unit === 'rad' ? radians : radians / RAD_PER_DEG);

/** atan2 in the unit asked for; exact at multiples of a right angle in degrees. */
export function arcTangent(y: number, x: number, unit: AngleUnit): number {
  if (unit === 'deg') {
    if (y === 0) return x < 0 ? 180 : 0;
    if (x === 0) return y > 0 ? 90 : -90;
    if (y === x) return x > 0 ? 45 : -135;
    if (y === -x) return x > 0 ? -45 : 135;
  }
  return inUnit(Math.atan2(y, x), unit);
}
