import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { FLIGHT_QUATERNION, type FlightSample } from './flight/simulate-flight.ts';
import type { Resolution } from './units.ts';

/**
 * What a unit would have put on its output during the flight: every sample's attitude in a convention, as finely as the
 * unit writes numbers. @returns samples × numbers per attitude, one attitude after the other.
 */
export function unitOutput(convention: Convention, resolution: Resolution, samples: readonly FlightSample[]): Float64Array {
  const quaternions = new Float64Array(samples.length * 4);
  samples.forEach(({ quaternion }, i) => quaternions.set(quaternion, 4 * i));
  return createConverter(FLIGHT_QUATERNION, convention).convert(quaternions).map(roundingTo(resolution));
}

function roundingTo(resolution: Resolution): (number: number) => number {
  switch (resolution) {
    case 'float64': return (number) => number;
    case 'float32': return Math.fround;
    case 'fraction16': return (number) => Math.round(number * 32_767) / 32_767;
    default: return (number) => Math.round(number * 10 ** resolution.decimals) / 10 ** resolution.decimals;
  }
}

/** Names of the numbers of one attitude, in the order in which they are listed. */
export function columnsOf(convention: Convention): string[] {
  switch (convention.representation) {
    case 'euler': return convention.order.map((turn) => `angle_${turn}_${convention.sequence[turn - 1]!.toLowerCase()}_${convention.unit}`);
    case 'quaternion': return convention.scalar === 'first' ? ['q_w', 'q_x', 'q_y', 'q_z'] : ['q_x', 'q_y', 'q_z', 'q_w'];
    case 'dcm': return Array.from({ length: 9 }, (_, i) => `m_${i + 1}`);
    case 'axis-angle': return ['axis_x', 'axis_y', 'axis_z', `angle_${convention.unit}`];
    case 'rotation-vector': return ['x', 'y', 'z'].map((axis) => `${axis}_${convention.unit}`);
    default: return ['x', 'y', 'z'];
  }
}
