import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { simulateFlight } from '../scenario/flight/simulate-flight.ts';

/**
 * Writes the scenario's flight as CSV: npm run recording [-- file]. Without a file it goes to the data folder.
 * One line of names with their units, then one line a sample, 50 a second. Attitude and rates at full precision:
 *
 * - time_s: seconds from the start
 * - q_w … q_z: attitude as in the preset aircraft-quaternion (NED, FRD, scalar first, body to reference)
 * - yaw_deg, pitch_deg, roll_deg: the same attitude as in the preset aircraft-euler-deg
 * - p_deg_s, q_deg_s, r_deg_s: body rates about forward, right and down
 * - north_m, east_m, up_m: position from the runway's threshold; airspeed_m_s: true airspeed
 */
const NAMES = 'time_s,q_w,q_x,q_y,q_z,yaw_deg,pitch_deg,roll_deg,p_deg_s,q_deg_s,r_deg_s,north_m,east_m,up_m,airspeed_m_s';

const file = path.resolve(process.argv[2] ?? path.join(process.env['DEXTRAL_DATA_DIR'] ?? 'data', 'survey-flight.csv'));
const samples = simulateFlight();
const lines = samples.map(({ time, quaternion, euler, rates, position, airspeed }) =>
  [time.toFixed(2), ...quaternion, ...euler, ...rates, ...position.map((metres) => metres.toFixed(3)), airspeed.toFixed(3)].join(','));
mkdirSync(path.dirname(file), { recursive: true });
writeFileSync(file, `${NAMES}\n${lines.join('\n')}\n`);
console.log(`${file}: ${samples.length} samples, ${(samples.length / 50 / 60).toFixed(1)} minutes at 50 Hz`);
