import { scratch as S } from '../arithmetic/scratch.ts';
import { MATRIX, QUATERNION } from '../arithmetic/slots.ts';
import type { ComponentMap, ElementMap } from './frames.ts';

const before = new Float64Array(18);

/** QUATERNION between other axes, in place; its norm grows by √terms. Exact for one term and for two. */
export function relabelQuaternion({ terms, index, sign }: ComponentMap): void {
  for (let i = 0; i < 8; i++) before[i] = S[QUATERNION + i]!;
  if (terms === 1) {
    for (let i = 0; i < 4; i++) {
      S[QUATERNION + 2 * i] = sign[i]! * before[2 * index[i]!]!;
      S[QUATERNION + 2 * i + 1] = sign[i]! * before[2 * index[i]! + 1]!;
    }
    return;
  }
  for (let i = 0; i < 4; i++) {
    let hi = 0;
    let lo = 0;
    for (let term = 0; term < terms; term++) {
      const at = i * terms + term;
      const place = 2 * index[at]!;
      const a = sign[at]! * before[place]!;
      const s = hi + a;
      const bb = s - hi;
      lo += hi - (s - bb) + (a - bb) + sign[at]! * before[place + 1]!;
      hi = s;
    }
    const s = hi + lo;
    S[QUATERNION + 2 * i] = s;
    S[QUATERNION + 2 * i + 1] = lo - (s - hi);
  }
}

/** MATRIX between other axes, in place. */
export function relabelMatrix({ index, sign }: ElementMap): void {
  for (let i = 0; i < 18; i++) before[i] = S[MATRIX + i]!;
  for (let k = 0; k < 9; k++) {
    S[MATRIX + 2 * k] = sign[k]! * before[2 * index[k]!]!;
    S[MATRIX + 2 * k + 1] = sign[k]! * before[2 * index[k]! + 1]!;
  }
}
