const AXES = ['forward', 'right', 'down'] as const;
/** What a turn about an axis of FRD does to the aircraft: positive, then negative. */
const TURNS = [['rolled right', 'rolled left'], ['pitched up', 'pitched down'], ['turned right', 'turned left']] as const;
/** What too high an angular velocity about an axis of FRD does: positive, then negative. */
const TURNING = [['rolls right', 'rolls left'], ['pitches up', 'pitches down'], ['turns right', 'turns left']] as const;
/** A component beside the largest that is worth a word. */
const NOTABLE = 0.25;

/**
 * The plain sentence for an error rotation: "2.00° about the right axis: the actual attitude is pitched up from the expected one".
 *
 * @param angle - in `unit`. @param axis - unit axis in FRD, carrying expected into actual.
 */
export function errorSentence(angle: number, unit: string, [x, y, z]: readonly [number, number, number]): string {
  if (angle === 0) return 'The actual attitude is the expected one.';
  const parts = [x, y, z].map((component, i) => ({ component, i })).filter(({ component }) => Math.abs(component) >= NOTABLE).sort((a, b) => Math.abs(b.component) - Math.abs(a.component));
  const [largest] = parts;
  const pure = Math.abs(largest!.component) > 0.999;
  const about = pure ? `the ${AXES[largest!.i]} axis` : `the axis (${[x, y, z].map((component) => component.toFixed(3)).join(', ')}) in forward, right, down`;
  const turns = parts.map(({ component, i }) => TURNS[i]![component > 0 ? 0 : 1]).join(' and ');
  return `${Number(angle.toPrecision(4))} ${unit} about ${about}: the actual attitude is ${turns} from the expected one.`;
}

/**
 * The plain sentence for an error of an angular velocity: "3 deg/s about the down axis: the actual rate turns right beside the expected one".
 *
 * @param size - in `unit`. @param axis - unit direction in FRD of actual less expected.
 */
export function rateErrorSentence(size: number, unit: string, [x, y, z]: readonly [number, number, number]): string {
  if (size === 0) return 'The actual rate is the expected one.';
  const parts = [x, y, z].map((component, i) => ({ component, i })).filter(({ component }) => Math.abs(component) >= NOTABLE).sort((a, b) => Math.abs(b.component) - Math.abs(a.component));
  const [largest] = parts;
  const about = Math.abs(largest!.component) > 0.999 ? `the ${AXES[largest!.i]} axis` : `the axis (${[x, y, z].map((component) => component.toFixed(3)).join(', ')}) in forward, right, down`;
  return `${Number(size.toPrecision(4))} ${unit} about ${about}: beside the expected rate the actual one ${parts.map(({ component, i }) => TURNING[i]![component > 0 ? 0 : 1]).join(' and ')}.`;
}
