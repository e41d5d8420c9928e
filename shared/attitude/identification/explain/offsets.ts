import type { AngleUnit } from '../../convention.ts';
import { rotationVectorOf } from '../fit/small-matrix.ts';
import type { ConstantOffset } from '../identification.ts';

const PER_UNIT: Readonly<Record<AngleUnit, number>> = { deg: Math.PI / 180, rad: 1 };
/** Standard deviations within which an axis is taken for one of the frame's own. */
const AXIS_DEVIATIONS = 4;

/** A fitted offset in plain terms. */
export interface OffsetTerms {
  readonly axis: readonly [number, number, number];
  /** rad; signed where the axis is one of the frame's own, which then stands in its positive sense. */
  readonly angle: number;
  readonly alongAxis: 0 | 1 | 2 | null;
}

/** @param deviation - standard deviation of a component of the offset's rotation vector, rad. */
export function offsetTerms(t: Float64Array, deviation: number): OffsetTerms {
  const v = rotationVectorOf(t);
  const largest = Math.abs(v[0]) >= Math.abs(v[1]) && Math.abs(v[0]) >= Math.abs(v[2]) ? 0 : Math.abs(v[1]) >= Math.abs(v[2]) ? 1 : 2;
  const across = Math.hypot(...v.filter((_, i) => i !== largest));
  if (across <= AXIS_DEVIATIONS * Math.max(deviation, 1e-9)) {
    return { axis: [largest === 0 ? 1 : 0, largest === 1 ? 1 : 0, largest === 2 ? 1 : 0], angle: v[largest], alongAxis: largest };
  }
  const angle = Math.hypot(...v);
  return { axis: [v[0] / angle, v[1] / angle, v[2] / angle], angle, alongAxis: null };
}

export const presentOffset = (side: ConstantOffset['side'], { axis, angle }: OffsetTerms, unit: AngleUnit): ConstantOffset => ({ side, axis, angle: angle / PER_UNIT[unit], unit });

const SIDE_AXES = { reference: ['north', 'east', 'down'], body: ['forward', 'right', 'down'] } as const;

export function offsetSentence(side: ConstantOffset['side'], { axis, angle, alongAxis }: OffsetTerms, named: string | null): string {
  const degrees = `${Number(((angle * 180) / Math.PI).toPrecision(4))}°`;
  if (side === 'reference' && named) return `the reference is turned by ${degrees} about (${listed(axis)}) in ${named}`;
  if (side === 'reference' && alongAxis === 2) return `the north reference is off by ${degrees} about down`;
  const about = alongAxis === null ? `the axis (${listed(axis)}) in ${SIDE_AXES[side].join(', ')}` : SIDE_AXES[side][alongAxis]!;
  return side === 'reference' ? `the reference is turned by ${degrees} about ${about}` : `the box is mounted ${degrees} off about ${about}`;
}

const listed = (axis: readonly number[]): string => axis.map((component) => component.toFixed(3)).join(', ');
