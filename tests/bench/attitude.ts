/**
 * Times the numerical core beside general-purpose libraries, in one run on the same attitudes: `npm run bench`.
 *
 * Rows are conversions of 1e5 random attitudes, typed arrays in, typed arrays out; the figures are nanoseconds an
 * attitude, the least of the rounds (the machine has other things to do). `three` and `quaternion` are called for each
 * attitude as their documentation shows. SciPy's vectorised Rotation is timed by python3, where it is installed.
 * Only the core is correctly rounded; the others are exact to double precision at best.
 */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import Quaternion from 'quaternion';
import * as THREE from 'three';
import { createConverter } from '#shared/attitude/converter.ts';
import { CONVENTIONS, type ConventionName } from '../support/named-conventions.ts';
import { Random } from '../support/random.ts';

const COUNT = 100_000;
const ROUNDS = 15;

type Row = 'e→q' | 'e→C' | 'q→e' | 'C→e' | 'q→C' | 'C→q';
type Run = () => void;
const ROWS: Record<Row, { from: ConventionName; to: ConventionName; goal: number }> = {
  'e→q': { from: 'euler rad', to: 'quaternion', goal: 200 },
  'e→C': { from: 'euler rad', to: 'dcm', goal: 200 },
  'q→e': { from: 'quaternion', to: 'euler rad', goal: 200 },
  'C→e': { from: 'dcm', to: 'euler rad', goal: 200 },
  'q→C': { from: 'quaternion', to: 'dcm', goal: 200 },
  'C→q': { from: 'dcm', to: 'quaternion', goal: 300 },
};
const rows = Object.keys(ROWS) as Row[];

const random = new Random(1);
const quaternions = new Float64Array(4 * COUNT);
for (let i = 0; i < COUNT; i++) quaternions.set(random.rotation(), 4 * i);
const angles = createConverter(CONVENTIONS.quaternion, CONVENTIONS['euler rad']).convert(quaternions);
const matrices = createConverter(CONVENTIONS.quaternion, CONVENTIONS.dcm).convert(quaternions);
const inputs: Partial<Record<ConventionName, Float64Array>> = { quaternion: quaternions, 'euler rad': angles, dcm: matrices };

function coreRuns(): Record<Row, Run> {
  const run = (row: Row): Run => {
    const { from, to } = ROWS[row];
    const converter = createConverter(CONVENTIONS[from], CONVENTIONS[to]);
    const input = inputs[from]!;
    const output = converter.convert(input);
    return () => void converter.convert(input, output);
  };
  return Object.fromEntries(rows.map((row) => [row, run(row)])) as Record<Row, Run>;
}

function threeRuns(): Record<Row, Run> {
  const [euler, quaternion, matrix] = [new THREE.Euler(0, 0, 0, 'ZYX'), new THREE.Quaternion(), new THREE.Matrix4()];
  const [three, four, nine] = [new Float64Array(3 * COUNT), new Float64Array(4 * COUNT), new Float64Array(9 * COUNT)];
  const each = (body: (i: number) => void): Run => () => { for (let i = 0; i < COUNT; i++) body(i); };
  const loadAngles = (i: number): void => void euler.set(angles[3 * i + 2]!, angles[3 * i + 1]!, angles[3 * i]!, 'ZYX');
  const loadQuaternion = (i: number): void => void quaternion.set(quaternions[4 * i + 1]!, quaternions[4 * i + 2]!, quaternions[4 * i + 3]!, quaternions[4 * i]!);
  const loadMatrix = (i: number): void => {
    const m = 9 * i;
    matrix.set(
      matrices[m]!, matrices[m + 3]!, matrices[m + 6]!, 0, matrices[m + 1]!, matrices[m + 4]!, matrices[m + 7]!, 0,
      matrices[m + 2]!, matrices[m + 5]!, matrices[m + 8]!, 0, 0, 0, 0, 1,
    );
  };
  const storeAngles = (i: number): void => { three[3 * i] = euler.z; three[3 * i + 1] = euler.y; three[3 * i + 2] = euler.x; };
  const storeQuaternion = (i: number): void => { four[4 * i] = quaternion.w; four[4 * i + 1] = quaternion.x; four[4 * i + 2] = quaternion.y; four[4 * i + 3] = quaternion.z; };
  const storeMatrix = (i: number): void => { for (let row = 0; row < 3; row++) for (let column = 0; column < 3; column++) nine[9 * i + 3 * row + column] = matrix.elements[4 * row + column]!; };
  return {
    'e→q': each((i) => { loadAngles(i); quaternion.setFromEuler(euler); storeQuaternion(i); }),
    'e→C': each((i) => { loadAngles(i); matrix.makeRotationFromEuler(euler); storeMatrix(i); }),
    'q→e': each((i) => { loadQuaternion(i); euler.setFromQuaternion(quaternion, 'ZYX'); storeAngles(i); }),
    'C→e': each((i) => { loadMatrix(i); euler.setFromRotationMatrix(matrix, 'ZYX'); storeAngles(i); }),
    'q→C': each((i) => { loadQuaternion(i); matrix.makeRotationFromQuaternion(quaternion); storeMatrix(i); }),
    'C→q': each((i) => { loadMatrix(i); quaternion.setFromRotationMatrix(matrix); storeQuaternion(i); }),
  };
}

function packageRuns(): Partial<Record<Row, Run>> {
  const [three, four, nine] = [new Float64Array(3 * COUNT), new Float64Array(4 * COUNT), new Float64Array(9 * COUNT)];
  const each = (body: (i: number) => void): Run => () => { for (let i = 0; i < COUNT; i++) body(i); };
  const given = (i: number): Quaternion => new Quaternion(quaternions[4 * i]!, quaternions[4 * i + 1]!, quaternions[4 * i + 2]!, quaternions[4 * i + 3]!);
  const turned = (i: number): Quaternion => Quaternion.fromEulerLogical(angles[3 * i + 2]!, angles[3 * i + 1]!, angles[3 * i]!, 'XYZ');
  return {
    'e→q': each((i) => { const q = turned(i); four[4 * i] = q.w; four[4 * i + 1] = q.x; four[4 * i + 2] = q.y; four[4 * i + 3] = q.z; }),
    'e→C': each((i) => nine.set(turned(i).toMatrix(false) as number[], 9 * i)),
    'q→e': each((i) => three.set(given(i).toEuler('ZYX') as number[], 3 * i)),
    'q→C': each((i) => nine.set(given(i).toMatrix(false) as number[], 9 * i)),
    'C→q': each((i) => { const q = Quaternion.fromMatrix(Array.from(matrices.subarray(9 * i, 9 * i + 9)) as Parameters<typeof Quaternion.fromMatrix>[0]); four[4 * i] = q.w; four[4 * i + 1] = q.x; four[4 * i + 2] = q.y; four[4 * i + 3] = q.z; }),
  };
}

const least = new Map<string, number>();
function time(library: string, runs: Partial<Record<Row, Run>>): void {
  for (const row of rows) {
    const run = runs[row];
    if (!run) continue;
    const began = performance.now();
    run();
    const key = `${library} ${row}`;
    least.set(key, Math.min(least.get(key) ?? Infinity, ((performance.now() - began) * 1e6) / COUNT));
  }
}

/** SciPy's figures for the same attitudes, or nothing where it is not installed. */
function scipy(): string | null {
  const folder = mkdtempSync(join(tmpdir(), 'bench-'));
  for (const [name, data] of [['q', quaternions], ['e', angles], ['m', matrices]] as const) writeFileSync(join(folder, name), data);
  const script = `
import sys, time, numpy as np, scipy
from scipy.spatial.transform import Rotation as R
n = ${COUNT}
q = np.fromfile('${folder}/q').reshape(n, 4)[:, [1, 2, 3, 0]].copy()
e = np.fromfile('${folder}/e').reshape(n, 3)
m = np.fromfile('${folder}/m').reshape(n, 3, 3).transpose(0, 2, 1).copy()
runs = {'e→q': lambda: R.from_euler('ZYX', e).as_quat(), 'e→C': lambda: R.from_euler('ZYX', e).as_matrix(),
  'q→e': lambda: R.from_quat(q).as_euler('ZYX'), 'C→e': lambda: R.from_matrix(m).as_euler('ZYX'),
  'q→C': lambda: R.from_quat(q).as_matrix(), 'C→q': lambda: R.from_matrix(m).as_quat()}
for name, run in runs.items():
  best = 1e9
  for _ in range(${ROUNDS}):
    t = time.perf_counter(); run(); best = min(best, time.perf_counter() - t)
  print(name, best * 1e9 / n)
print('version', scipy.__version__)
`;
  const { status, stdout } = spawnSync('python3', ['-c', script], { encoding: 'utf8', env: { ...process.env, PYTHONIOENCODING: 'utf8' } });
  rmSync(folder, { recursive: true });
  if (status !== 0) return null;
  for (const line of stdout.trim().split('\n')) {
    const [row, figure] = line.split(' ') as [string, string];
    if (row === 'version') return figure;
    least.set(`SciPy ${row}`, Number(figure));
  }
  return null;
}

const libraries = { core: coreRuns(), three: threeRuns(), quaternion: packageRuns() };
for (let round = 0; round < ROUNDS; round++) for (const [name, runs] of Object.entries(libraries)) time(name, runs);
const version = scipy();

const cell = (key: string): string => (least.has(key) ? least.get(key)!.toFixed(0) : '–').padStart(10);
const ratio = (row: Row, library: string): string => (least.has(`${library} ${row}`) ? `${(least.get(`${library} ${row}`)! / least.get(`core ${row}`)!).toFixed(2)}×` : '–').padStart(10);
console.log(`ns an attitude, least of ${ROUNDS} rounds of ${COUNT}; node ${process.version}${version ? `, SciPy ${version}` : ', SciPy not installed'}`);
console.log(`${'row'.padEnd(5)}${'core'.padStart(10)}${'goal'.padStart(10)}${'three'.padStart(10)}${'quaternion'.padStart(12)}${'SciPy'.padStart(10)}   speed of the core against three, quaternion, SciPy`);
for (const row of rows) console.log(`${row.padEnd(5)}${cell(`core ${row}`)}${String(ROWS[row].goal).padStart(10)}${cell(`three ${row}`)}  ${cell(`quaternion ${row}`)}${cell(`SciPy ${row}`)}   ${ratio(row, 'three')}${ratio(row, 'quaternion')}${ratio(row, 'SciPy')}`);

// What the same batch costs as JSON, there and back.
const nested = Array.from({ length: COUNT }, (_, i) => Array.from(angles.subarray(3 * i, 3 * i + 3)));
const text = JSON.stringify(nested);
const answer = Array.from({ length: COUNT }, (_, i) => Array.from(quaternions.subarray(4 * i, 4 * i + 4)));
let json = Infinity;
for (let round = 0; round < 5; round++) {
  const began = performance.now();
  JSON.parse(text);
  JSON.stringify(answer);
  json = Math.min(json, ((performance.now() - began) * 1e6) / COUNT);
}
console.log(`JSON: ${json.toFixed(0)} ns to read three angles and write four components of each; the core's e→q takes ${cell('core e→q').trim()}`);
