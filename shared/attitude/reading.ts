import { isNamedFrame } from './axes.ts';
import { createConverter } from './converter.ts';
import type { Convention, DcmConvention } from './convention.ts';

/** Where the nose points so nearly up or down that its heading says nothing. */
const VERTICAL = 0.05;
const DEG_PER_RAD = 180 / Math.PI;

/**
 * The plain sentence for an attitude, from where nose and right wing point: "nose 030.0° true, 10.0° up, right wing
 * 20.0° down". It is made from the directions themselves, by way of no convention, so that it can be checked against
 * the aircraft. To a tenth of a degree.
 *
 * @param numbers - One attitude in the convention.
 * @throws AttitudeError as createConverter and its convert do.
 */
export function readingOf(convention: Convention, numbers: readonly number[]): string {
  const named = isNamedFrame(convention.reference);
  const standard: DcmConvention = { representation: 'dcm', reference: named ? convention.reference : 'NED', body: 'FRD', maps: 'body-to-reference', layout: 'row-major' };
  const m = createConverter(convention, standard, { warnWithinDeg: 0, repair: 'nearest' }).convert(Float64Array.from(numbers));
  return named ? inFrame(convention.reference, m) : overGround(m);
}

/** Columns of m: nose, right wing and belly in NED. */
function overGround(m: Float64Array): string {
  const [noseNorth, wingNorth] = [m[0]!, m[1]!];
  const [noseEast, wingEast] = [m[3]!, m[4]!];
  const [noseDown, wingDown, bellyDown] = [m[6]!, m[7]!, m[8]!];
  const level = Math.hypot(noseNorth, noseEast);
  const elevation = Math.atan2(-noseDown, level) * DEG_PER_RAD;
  if (90 - Math.abs(elevation) < VERTICAL) {
    return `nose straight ${elevation > 0 ? 'up' : 'down'}, right wing towards ${bearing(wingNorth, wingEast)} true`;
  }
  const roll = Math.atan2(wingDown, bellyDown) * DEG_PER_RAD;
  const nose = `nose ${bearing(noseNorth, noseEast)} true, ${upOrDown(elevation, 'level')}`;
  if (Math.abs(roll) > 179.95) return `${nose}, inverted`;
  const wing = Math.abs(roll) < 0.05 ? 'wings level' : `right wing ${Math.abs(roll).toFixed(1)}° ${roll > 0 ? 'down' : 'up'}`;
  return Math.abs(roll) > 90.05 ? `${nose}, ${wing} past the vertical (inverted)` : `${nose}, ${wing}`;
}

function inFrame(frame: string, m: Float64Array): string {
  const vector = (column: number) => `(${[m[column]!, m[3 + column]!, m[6 + column]!].map((component) => (Math.abs(component) < 5e-5 ? 0 : component).toFixed(4)).join(', ')})`;
  return `in ${frame}: nose ${vector(0)}, right wing ${vector(1)}, belly ${vector(2)}`;
}

function bearing(north: number, east: number): string {
  const degrees = (Math.atan2(east, north) * DEG_PER_RAD + 360) % 360;
  const rounded = degrees.toFixed(1);
  return `${(rounded === '360.0' ? '0.0' : rounded).padStart(5, '0')}°`;
}

const upOrDown = (degrees: number, level: string): string => (Math.abs(degrees) < 0.05 ? level : `${Math.abs(degrees).toFixed(1)}° ${degrees > 0 ? 'up' : 'down'}`);
