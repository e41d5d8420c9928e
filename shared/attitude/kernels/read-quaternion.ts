import { scratch as S } from '../arithmetic/scratch.ts';
import { DEFECT, QUATERNION } from '../arithmetic/slots.ts';
import type { QuaternionConvention } from '../convention.ts';
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
 */
export function quaternionReader(convention: QuaternionConvention, repair: 'none' | 'nearest'): Reader {
  const scalar = convention.scalar === 'first' ? 0 : 3;
  const vector = convention.scalar === 'first' ? 1 : 0;

  function readOdd(w: number, x: number, y: number, z: number): number {
    const defect = normDefect(w, x, y, z);
    if (!(defect < Infinity) || (defect > REFUSED_DEFECT && repair === 'none')) return REFUSED;
    S[DEFECT] = defect;
    let scale = 1;
    const largest = Math.max(Math.abs(w), Math.abs(x), Math.abs(y), Math.abs(z));
    while (largest * scale > 2 ** 60) scale *= 2 ** -60;
    while (largest * scale < 2 ** -60) scale *= 2 ** 60;
    store(w * scale, x * scale, y * scale, z * scale);
    if (defect <= REPORTED_DEFECT) return FINE;
    normaliseQuaternion();
    return REPAIRED;
  }

  return (numbers, at) => {
    const w = numbers[at + scalar]!;
    const x = numbers[at + vector]!;
    const y = numbers[at + vector + 1]!;
    const z = numbers[at + vector + 2]!;
    if (!(Math.abs(Math.sqrt(w * w + x * x + y * y + z * z) - 1) <= REPORTED_DEFECT)) return readOdd(w, x, y, z);
    S[QUATERNION] = w;
    S[QUATERNION + 1] = 0;
    S[QUATERNION + 2] = x;
    S[QUATERNION + 3] = 0;
    S[QUATERNION + 4] = y;
    S[QUATERNION + 5] = 0;
    S[QUATERNION + 6] = z;
    S[QUATERNION + 7] = 0;
    return FINE;
  };
}

function store(...components: readonly number[]): void {
  components.forEach((component, i) => {
    S[QUATERNION + 2 * i] = component;
    S[QUATERNION + 2 * i + 1] = 0;
  });
}
