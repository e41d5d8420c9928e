#!/usr/bin/env node
// Converts a recorded flight from quaternions to yaw, pitch and roll in degrees, in batches, with Node and nothing else.
//
//   node examples/convert-recording.mjs recording.csv converted.csv
//
// DEXTRAL_URL and DEXTRAL_KEY say where the service is and who calls; without them they are taken from the demo's
// demo.json (in DEXTRAL_DATA_DIR, or data/).
import { readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';

const BATCH = 5000; // A JSON call carries at most 10,000 attitudes.
const [input, output] = process.argv.slice(2);
if (!input || !output) fail('Usage: convert-recording.mjs recording.csv converted.csv');

const { url, key } = await whereAndWho();
const [header, ...rows] = (await readFile(input, 'utf8')).trimEnd().split('\n');
const names = header.split(',');
const columns = ['q_w', 'q_x', 'q_y', 'q_z'].map((name) => names.indexOf(name));
const time = names.indexOf('time_s');
if (time < 0 || columns.includes(-1)) fail(`${input} must have the columns time_s, q_w, q_x, q_y, q_z.`);

const lines = ['time_s,yaw_deg,pitch_deg,roll_deg'];
let warned = 0;
let nearest = null;
for (let start = 0; start < rows.length; start += BATCH) {
  const cells = rows.slice(start, start + BATCH).map((row) => row.split(','));
  const { attitudes, warnings } = await convert(cells.map((row) => columns.map((column) => Number(row[column]))));
  attitudes.forEach((angles, i) => lines.push([cells[i][time], ...angles].join(',')));
  for (const { code, count, worst } of warnings) {
    if (!code.endsWith('gimbal-lock')) continue;
    warned += count;
    if (!nearest || worst.marginDeg < nearest.marginDeg) nearest = { ...worst, time: cells[worst.index][time] };
  }
}
await writeFile(output, `${lines.join('\n')}\n`);
console.log(`${rows.length} attitudes converted to ${output}.`);
console.log(nearest
  ? `${warned} near gimbal lock; nearest at ${nearest.time} s, ${nearest.marginDeg.toFixed(3)}° from it: an attitude error shows up to ${nearest.condition === null ? 'any number of' : nearest.condition.toFixed(0)} times as large in yaw and roll.`
  : 'None near gimbal lock.');

async function convert(attitudes) {
  const response = await fetch(`${url}/api/v1/convert`, {
    method: 'POST',
    headers: { Authorization: `Bearer ${key}`, 'Content-Type': 'application/json' },
    body: JSON.stringify({ from: { preset: 'aircraft-quaternion' }, to: { preset: 'aircraft-euler-deg' }, attitudes }),
  });
  const answer = await response.json();
  if (!response.ok) fail(`${answer.status} ${answer.code}: ${answer.detail}`);
  return answer;
}

async function whereAndWho() {
  if (process.env.DEXTRAL_URL && process.env.DEXTRAL_KEY) return { url: process.env.DEXTRAL_URL, key: process.env.DEXTRAL_KEY };
  const facts = JSON.parse(await readFile(path.join(process.env.DEXTRAL_DATA_DIR ?? 'data', 'demo.json'), 'utf8'));
  return { url: facts.url, key: facts.keys.find(({ role }) => role === 'engineer').secret };
}

function fail(message) {
  console.error(message);
  process.exit(1);
}
