import type { AttitudeWarning } from '#shared/attitude/warnings.ts';
import type { Meter } from '../meter.ts';

/** Counts the attitudes warned of, and notes the codes. */
export function meterWarnings(meter: Meter, warnings: readonly AttitudeWarning[]): void {
  for (const { code, count } of warnings) {
    meter.warnings += count;
    meter.warningCodes.push(code);
  }
}
