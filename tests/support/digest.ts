import { createConverter } from '#shared/attitude/converter.ts';
import { CONVENTIONS, type ConventionName } from './named-conventions.ts';
import { Random } from './random.ts';

/**
 * Digests of what the core answers: the same bits on every engine and machine, or another digest.
 * Runs unchanged in Node and in a browser; the random attitudes come from integer arithmetic.
 */
export function digests(count: number): Record<string, string> {
  const names = Object.keys(CONVENTIONS) as ConventionName[];
  const random = new Random(20_261);
  const quaternions = new Float64Array(4 * count);
  for (let i = 0; i < count; i++) quaternions.set(random.rotation(), 4 * i);
  const answers: Record<string, string> = {};
  for (const from of names) {
    const input = createConverter(CONVENTIONS.quaternion, CONVENTIONS[from]).convert(quaternions);
    for (const to of names) answers[`${from} → ${to}`] = digest(createConverter(CONVENTIONS[from], CONVENTIONS[to]).convert(input));
  }

  // Every multiple of 15°, lock included, and as radians; and matrices and quaternions to be repaired.
  const multiples: number[] = [];
  for (let yaw = -180; yaw < 180; yaw += 15) for (let pitch = -90; pitch <= 90; pitch += 15) for (let roll = -180; roll < 180; roll += 15) multiples.push(yaw, pitch, roll);
  const turned = multiples.map((angle) => angle * (Math.PI / 180));
  const bent = createConverter(CONVENTIONS.quaternion, CONVENTIONS.dcm).convert(quaternions.subarray(0, 4 * Math.min(count, 500))).map((element) => element + random.between(-1e-3, 1e-3));
  const scaled = quaternions.map((component, k) => component * 2 ** ((k >> 2) % 900 - 450));
  for (const to of names) {
    if (to === 'gibbs') continue; // half turns are among them
    answers[`multiples of 15° → ${to}`] = digest(createConverter(CONVENTIONS['euler deg'], CONVENTIONS[to]).convert(Float64Array.from(multiples)));
    answers[`multiples of 15° in radians → ${to}`] = digest(createConverter(CONVENTIONS['euler rad'], CONVENTIONS[to]).convert(Float64Array.from(turned)));
    answers[`bent matrices → ${to}`] = digest(createConverter(CONVENTIONS.dcm, CONVENTIONS[to], { repair: 'nearest' }).convert(bent));
    answers[`quaternions of any norm → ${to}`] = digest(createConverter(CONVENTIONS.quaternion, CONVENTIONS[to], { repair: 'nearest' }).convert(scaled));
  }
  return answers;
}

/** 64 bits over the bits of the numbers: two lanes of MurmurHash3's mixing (Appleby, public domain), in integers. */
export function digest(numbers: Float64Array): string {
  const bytes = new DataView(new ArrayBuffer(8));
  let [a, b] = [0x9747b28c, 0x5bd1e995];
  for (const number of numbers) {
    bytes.setFloat64(0, number);
    a = mixed(a, bytes.getUint32(0));
    b = mixed(b, bytes.getUint32(4));
    a = Math.imul(a ^ b, 0x85ebca6b);
    b = Math.imul(b ^ (a >>> 15), 0xc2b2ae35);
  }
  return (a >>> 0).toString(16).padStart(8, '0') + (b >>> 0).toString(16).padStart(8, '0');
}

function mixed(hash: number, word: number): number {
  let k = Math.imul(word, 0xcc9e2d51);
  k = Math.imul((k << 15) | (k >>> 17), 0x1b873593);
  const h = hash ^ k;
  return (Math.imul((h << 13) | (h >>> 19), 5) + 0xe6546b64) | 0;
}

/** Attitudes of each kind that the pinned digests cover. */
export const DIGESTED = 100_000;
