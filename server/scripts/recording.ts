import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { NUMBERS_PER_ATTITUDE } from '#shared/attitude/convention.ts';
import { simulateFlight, type FlightSample } from '../scenario/flight/simulate-flight.ts';
import { columnsOf, unitOutput } from '../scenario/unit-output.ts';
import { UNITS, type ScenarioUnit } from '../scenario/units.ts';

/**
 * Writes the scenario's flight as CSV: npm run recording [-- file [unit]]. Without a file it goes to the data folder.
 * One line of names with their units, then one line a sample, 50 a second. Attitude and rates at full precision:
 *
 * - time_s: seconds from the start
 * - q_w … q_z: attitude as in the preset aircraft-quaternion (NED, FRD, scalar first, body to reference)
 * - yaw_deg, pitch_deg, roll_deg: the same attitude as in the preset aircraft-euler-deg
 * - p_deg_s, q_deg_s, r_deg_s: body rates about forward, right and down
 * - north_m, east_m, up_m: position from the runway's threshold; airspeed_m_s: true airspeed
 *
 * With a unit (inertial-unit, autopilot, camera-gimbal, flight-simulator, ground-display) it is what that unit would
 * have recorded: time_s, then the attitude in the unit's own convention, as finely and as often as the unit writes.
 */
const [file = path.join(process.env['DEXTRAL_DATA_DIR'] ?? 'data', 'survey-flight.csv'), slug] = process.argv.slice(2);
const unit: ScenarioUnit | undefined = Object.values(UNITS).find((known) => known.slug === slug);
if (slug !== undefined && !unit) {
  console.error(`There is no unit "${slug}"; there are ${Object.values(UNITS).map((known) => known.slug).join(', ')}.`);
  process.exit(2);
}
const rateHz = unit?.samplesPerSecond ?? 50;
const samples = simulateFlight({ rateHz });
mkdirSync(path.dirname(path.resolve(file)), { recursive: true });
writeFileSync(file, `${(unit ? linesOfUnit(unit, samples) : linesOfFlight(samples)).join('\n')}\n`);
console.log(`${file}: ${samples.length} samples, ${(samples.length / rateHz / 60).toFixed(1)} minutes at ${rateHz} Hz`);

function linesOfFlight(flight: readonly FlightSample[]): string[] {
  const names = 'time_s,q_w,q_x,q_y,q_z,yaw_deg,pitch_deg,roll_deg,p_deg_s,q_deg_s,r_deg_s,north_m,east_m,up_m,airspeed_m_s';
  return [names, ...flight.map(({ time, quaternion, euler, rates, position, airspeed }) =>
    [time.toFixed(2), ...quaternion, ...euler, ...rates, ...position.map((metres) => metres.toFixed(3)), airspeed.toFixed(3)].join(','))];
}

function linesOfUnit({ convention, resolution }: ScenarioUnit, flight: readonly FlightSample[]): string[] {
  const numbers = unitOutput(convention, resolution, flight);
  const width = NUMBERS_PER_ATTITUDE[convention.representation];
  return [`time_s,${columnsOf(convention).join(',')}`, ...flight.map(({ time }, i) => [time.toFixed(2), ...numbers.subarray(i * width, (i + 1) * width)].join(','))];
}
