#!/usr/bin/env node
// Converts a recorded flight, quaternions of the inertial unit, to heading (0 to 360), pitch and roll in degrees for
// the ground display, and says how near gimbal lock it came. Node 20 and nothing else.
//
//   node examples/convert-recording.mjs recording.csv converted.csv
//
// DEXTRAL_URL and DEXTRAL_KEY say where the service is and who calls; without them they are taken from the demo's
// demo.json (in DEXTRAL_DATA_DIR, or data/).
import { readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';

const BATCH = 2000; // A JSON call carries at most 10,000 attitudes.
const TRIES = 5;

// A preset by its id, and a convention with every facet stated: the two ways to say what numbers mean.
const FROM = { preset: 'aircraft-quaternion' };
const TO = {
  representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic',
  unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'positive',
};

const [input, output] = process.argv.slice(2);
if (!input || !output) fail('Usage: convert-recording.mjs recording.csv converted.csv');

const { url, key } = await whereAndWho();
const [header, ...rows] = (await readFile(input, 'utf8')).trimEnd().split(/\r?\n/);
const names = header.split(',');
const [time, ...quaternion] = ['time_s', 'q_w', 'q_x', 'q_y', 'q_z'].map((name) => names.indexOf(name));
if (time < 0 || quaternion.includes(-1)) fail(`${input} must have the columns time_s, q_w, q_x, q_y, q_z.`);

const lines = ['time_s,yaw_deg,pitch_deg,roll_deg'];
const warned = {};
let calls = 0;
let nearest = null;
for (let start = 0; start < rows.length; start += BATCH) {
  const cells = rows.slice(start, start + BATCH).map((row) => row.split(','));
  const { attitudes, warnings } = await convert(cells.map((row) => quaternion.map((column) => Number(row[column]))));
  calls++;
  attitudes.forEach((angles, i) => lines.push([cells[i][time], ...angles].join(',')));
  for (const { code, count, worst } of warnings) {
    warned[code] = (warned[code] ?? 0) + count;
    if (worst.marginDeg !== undefined && !(nearest?.marginDeg <= worst.marginDeg)) nearest = { ...worst, time: cells[worst.index][time] };
  }
}
await writeFile(output, `${lines.join('\n')}\n`);

console.log(`${rows.length} attitudes converted to ${output} in ${calls} calls.`);
for (const [code, count] of Object.entries(warned)) console.log(`Warning ${code}: ${count} attitudes.`);
if (nearest) {
  const times = nearest.condition === null ? 'without bound' : `up to ${Math.round(nearest.condition)} times as large`;
  console.log(`Nearest to gimbal lock at ${nearest.time} s, ${nearest.marginDeg.toFixed(4)}° from it: an attitude error shows up ${times} in yaw and roll.`);
}

async function convert(attitudes, tried = 1) {
  const response = await fetch(`${url}/api/v1/convert`, {
    method: 'POST',
    headers: { Authorization: `Bearer ${key}`, 'Content-Type': 'application/json' },
    body: JSON.stringify({ from: FROM, to: TO, attitudes }),
  }).catch((error) => fail(`${url} does not answer: ${error.cause?.message ?? error.message}`));
  if (response.ok) return response.json();
  // Too many calls, or no room for one more at the moment: the service says when to come back.
  const pause = Number(response.headers.get('Retry-After'));
  if ([429, 503].includes(response.status) && pause > 0 && tried < TRIES) {
    await wait(pause * 1000);
    return convert(attitudes, tried + 1);
  }
  return fail(`The service answered ${response.status}:\n${await response.text()}`);
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
