import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { simulateFlight } from '../scenario/flight.ts';

/**
 * Writes the scenario's flight as CSV: npm run recording [file]. One line of names, then one line a sample; numbers at
 * full precision. Attitude is aircraft-quaternion: NED to FRD, scalar first, body to reference.
 */
const file = path.resolve(process.argv[2] ?? path.join(process.env['DEXTRAL_DATA_DIR'] ?? 'data', 'petrel-flight.csv'));
const DEG = 180 / Math.PI;
const samples = simulateFlight();
const lines = samples.map(({ time, quaternion, rates, position, airspeed }) =>
  [time.toFixed(2), ...quaternion, ...rates.map((rate) => rate * DEG), ...position.map((metres) => metres.toFixed(2)), airspeed.toFixed(2)].join(','));
mkdirSync(path.dirname(file), { recursive: true });
writeFileSync(file, `time_s,q_w,q_x,q_y,q_z,p_deg_s,q_deg_s,r_deg_s,north_m,east_m,up_m,airspeed_m_s\n${lines.join('\n')}\n`);
console.log(`${file}: ${samples.length} samples, ${(samples.length / 50 / 60).toFixed(1)} minutes at 50 Hz`);
