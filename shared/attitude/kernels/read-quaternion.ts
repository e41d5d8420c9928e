import { scratch as S } from '../arithmetic/scratch.ts';
import { DEFECT, QUATERNION } from '../arithmetic/slots.ts';
import type { QuaternionConvention } from '../convention.ts';
import type { ComponentMap } from './frames.ts';
import { relabelQuaternion } from './relabel.ts';
import { normaliseQuaternion } from './rotation.gen.ts';
import { FINE, REFUSED, REFUSED_DEFECT, REPAIRED, REPORTED_DEFECT, type Reader } from './status.ts';

/** Norm of a quaternion less one, by size; Infinity for zero, NaN for what is not finite. In plain double precision. */
export function normDefect(w: number, x: number, y: number, z: number): number {
  const largest = Math.max(Math.abs(w), Math.abs(x), Math.abs(y), Math.abs(z));
  if (largest === 0) return Infinity;
  const scale = largest > 1e100 || largest < 1e-100 ? largest : 1;
  const [a, b, c, d] = [w / scale, x / scale, y / scale, z / scale];
  return Math.abs(scale * Math.sqrt(a * a + b * b + c * c + d * d) - 1);
}

/**
 * Reads a quaternion as QUATERNION, exactly: it stands for q/|q| and is never rounded to norm 1 first. One that is
 * repaired is left as q/|q| in double-double, so that it leaves with norm 1 in its own convention too.
 * @param map - the relabelling to the axes wanted; where it only moves components, they are read in their new places.
 */
export function quaternionReader(convention: QuaternionConvention, repair: 'none' | 'nearest', map: ComponentMap): Reader {
  const offsets = convention.scalar === 'first' ? [0, 1, 2, 3] : [3, 0, 1, 2];
  const moved = map.terms === 1;
  const [place0, place1, place2, place3] = [0, 1, 2, 3].map((i) => offsets[moved ? map.index[i]! : i]!) as [number, number, number, number];
  const signs = moved ? map.sign : Float64Array.of(1, 1, 1, 1);

  function readOdd(w: number, x: number, y: number, z: number): number {
    const defect = normDefect(w, x, y, z);
    if (!(defect < Infinity) || (defect > REFUSED_DEFECT && repair === 'none')) return REFUSED;
    S[DEFECT] = defect;
    let scale = 1;
    const largest = Math.max(Math.abs(w), Math.abs(x), Math.abs(y), Math.abs(z));
    while (largest * scale > 2 ** 60) scale *= 2 ** -60;
    while (largest * scale < 2 ** -60) scale *= 2 ** 60;
    store(w * scale, x * scale, y * scale, z * scale);
    if (defect > REPORTED_DEFECT) normaliseQuaternion();
    if (!moved) relabelQuaternion(map);
    return defect > REPORTED_DEFECT ? REPAIRED : FINE;
  }

  return (numbers, at) => {
    const w = numbers[at + place0]! * signs[0]!;
    const x = numbers[at + place1]! * signs[1]!;
    const y = numbers[at + place2]! * signs[2]!;
    const z = numbers[at + place3]! * signs[3]!;
    if (!(Math.abs(Math.sqrt(w * w + x * x + y * y + z * z) - 1) <= REPORTED_DEFECT)) return readOdd(w, x, y, z);
    S[QUATERNION] = w;
    S[QUATERNION + 1] = 0;
    S[QUATERNION + 2] = x;
    S[QUATERNION + 3] = 0;
    S[QUATERNION + 4] = y;
    S[QUATERNION + 5] = 0;
    S[QUATERNION + 6] = z;
    S[QUATERNION + 7] = 0;
    if (!moved) relabelQuaternion(map);
    return FINE;
  };
}

function store(...components: readonly number[]): void {
  components.forEach((component, i) => {
    S[QUATERNION + 2 * i] = component;
    S[QUATERNION + 2 * i + 1] = 0;
  });
}
