#!/usr/bin/env node
// Breaks a converter on purpose in five ways, has the service verify each against the right answers, and prints what it says
// is wrong. Node 20 and nothing else.
//
//   node examples/diagnose-a-converter.mjs
//
// DEXTRAL_URL and DEXTRAL_KEY say where the service is and who calls; without them they are taken from the demo's
// demo.json (in DEXTRAL_DATA_DIR, or data/).
import { readFile } from 'node:fs/promises';
import path from 'node:path';

const RAD = Math.PI / 180;
const times = Array.from({ length: 300 }, (_, i) => i / 20);

/** A turn with climbs and banks: heading, pitch and bank in degrees. */
const attitudeAt = (t) => [(47 + 11 * t) % 360 - 180, 18 * Math.sin(0.9 * t), 34 * Math.sin(0.6 * t + 1)];

/** The right converter: yaw, pitch, roll in degrees to the quaternion of body to NED, scalar first. */
function quaternionOf([yaw, pitch, roll]) {
  const [cy, sy, cp, sp, cr, sr] = [yaw, pitch, roll].flatMap((angle) => [Math.cos((angle * RAD) / 2), Math.sin((angle * RAD) / 2)]);
  return [cr * cp * cy + sr * sp * sy, sr * cp * cy - cr * sp * sy, cr * sp * cy + sr * cp * sy, cr * cp * sy - sr * sp * cy];
}

/** Five slips that look right in level flight or pass a review. */
const SLIPS = [
  ['the scalar put last', (t) => { const [w, x, y, z] = quaternionOf(attitudeAt(t)); return [x, y, z, w]; }],
  ['the quaternion conjugated', (t) => { const [w, x, y, z] = quaternionOf(attitudeAt(t)); return [w, -x, -y, -z]; }],
  ['body axes forward, left, up', (t) => { const [yaw, pitch, roll] = attitudeAt(t); const [w, x, y, z] = quaternionOf([yaw, pitch, roll]); return [-x, w, z, -y]; }],
  ['north 5° off', (t) => { const [yaw, pitch, roll] = attitudeAt(t); return quaternionOf([yaw - 5, pitch, roll]); }],
  ['an answer 40 ms old', (t) => quaternionOf(attitudeAt(t - 0.04))],
];

const { url, key } = await whereAndWho();
for (const [slip, broken] of SLIPS) {
  const answer = await verify(times.map(broken), slip);
  const { outcome, remaining, explanations } = answer.diagnosis ?? { outcome: 'none', remaining: 0, explanations: [] };
  console.log(`${slip}: ${answer.verdict}, ${answer.failed} of ${answer.count} attitudes off, at most ${answer.worst.angle.toFixed(2)}°`);
  if (remaining === 0) console.log('  nothing that was tried explains it');
  else console.log(`  ${outcome === 'unique' ? 'it' : `the plainest of ${remaining} explanations`}: ${explanations[0].edits.join('; ')}`);
}

async function verify(attitudes, label) {
  const response = await fetch(`${url}/api/v1/verify`, {
    method: 'POST',
    headers: { Authorization: `Bearer ${key}`, 'Content-Type': 'application/json' },
    body: JSON.stringify({
      expected: { convention: { preset: 'aircraft-euler-deg' }, attitudes: times.map(attitudeAt) },
      actual: { convention: { preset: 'aircraft-quaternion' }, attitudes },
      tolerance: { angle: 0.1, unit: 'deg' }, times, diagnose: true, label: `Broken on purpose: ${label}`,
    }),
  }).catch((error) => fail(`${url} does not answer: ${error.cause?.message ?? error.message}`));
  return response.ok ? response.json() : fail(`The service answered ${response.status}:\n${await response.text()}`);
}

async function whereAndWho() {
  const { DEXTRAL_URL, DEXTRAL_KEY, DEXTRAL_DATA_DIR = 'data' } = process.env;
  if (DEXTRAL_URL && DEXTRAL_KEY) return { url: DEXTRAL_URL, key: DEXTRAL_KEY };
  const file = path.join(DEXTRAL_DATA_DIR, 'demo.json');
  const facts = JSON.parse(await readFile(file, 'utf8').catch(() => fail(`Set DEXTRAL_URL and DEXTRAL_KEY, or start the demo: there is no ${file}.`)));
  return { url: facts.url, key: facts.keys[0].secret };
}

function fail(message) {
  console.error(message);
  process.exit(1);
}
