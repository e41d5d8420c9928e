import type { Convention } from '#shared/attitude/convention.ts';
import { elementary, frameRotation, multiply, ofQuaternion, toQuaternion, transpose, type Matrix } from './matrices.ts';

/**
 * The meaning of numbers, from the convention formulas and by full matrix products: a second opinion that shares no
 * code with the engine under test. `C` is v_FRD = C v_NED throughout.
 */
export interface Offset {
  readonly side: 'reference' | 'body';
  readonly axis: readonly [number, number, number];
  /** rad */
  readonly angle: number;
}

export interface Statement {
  readonly convention: Convention;
  readonly numbersAre?: 'half-angle' | 'double-angle' | 'vector-part';
  readonly offsets?: readonly Offset[];
  readonly lag?: number;
  readonly scale?: number;
}

const LETTERS: Readonly<Record<string, readonly number[]>> = {
  N: [1, 0, 0], S: [-1, 0, 0], E: [0, 1, 0], W: [0, -1, 0], F: [1, 0, 0], B: [-1, 0, 0], R: [0, 1, 0], L: [0, -1, 0], D: [0, 0, 1], U: [0, 0, -1],
};
/** Rows are the set's axes in NED or FRD. */
const axes = (letters: string): Matrix => [...letters].map((letter) => LETTERS[letter]!);

const rad = (value: number, unit: 'deg' | 'rad'): number => (unit === 'deg' ? (value * Math.PI) / 180 : value);

/** The rotation by a multiple of the angle, which is taken in [0, π]. */
function power(m: Matrix, exponent: number): Matrix {
  const [w, x, y, z] = toQuaternion(m);
  const length = Math.hypot(x, y, z);
  const half = Math.atan2(length, w);
  const s = length === 0 ? 0 : Math.sin(half * exponent) / length;
  return ofQuaternion(Math.cos(half * exponent), x * s, y * s, z * s);
}

/** v_body = M v_ref between the convention's own sets. */
function componentMatrix({ convention, numbersAre, scale = 1 }: Statement, listed: readonly number[]): Matrix {
  const multiple = numbersAre === 'half-angle' ? 0.5 : numbersAre === 'double-angle' ? 2 : 1;
  const n = convention.representation === 'axis-angle' ? [...listed.slice(0, 3), listed[3]! / scale] : listed.map((number) => number / scale);
  const sense = (turning: Matrix, maps: Convention extends infer _ ? 'body-to-reference' | 'reference-to-body' : never): Matrix => (maps === 'body-to-reference' ? transpose(turning) : turning);
  const about = (v: readonly number[], angle: number): Matrix => {
    const length = Math.hypot(...v) || 1;
    return ofQuaternion(Math.cos(angle / 2), ...(v.map((entry) => (entry / length) * Math.sin(angle / 2)) as [number, number, number]));
  };
  switch (convention.representation) {
    case 'euler': {
      const turns = [0, 1, 2].map((k) => elementary('XYZ'.indexOf(convention.sequence[k]!), rad(n[convention.order.indexOf((k + 1) as 1)]! * convention.signs[k]!, convention.unit)));
      return convention.motion === 'intrinsic' ? multiply(turns[2]!, turns[1]!, turns[0]!) : multiply(turns[0]!, turns[1]!, turns[2]!);
    }
    case 'quaternion': {
      if (numbersAre === 'vector-part') {
        const turning = ofQuaternion(Math.sqrt(Math.max(0, 1 - n[0]! ** 2 - n[1]! ** 2 - n[2]! ** 2)), n[0]!, n[1]!, n[2]!);
        return sense(convention.product === 'hamilton' ? turning : transpose(turning), convention.maps);
      }
      const [w, x, y, z] = (convention.scalar === 'first' ? n : [n[3], n[0], n[1], n[2]]) as [number, number, number, number];
      // As they stand: the numbers of twice the rotation hold an angle of up to a whole turn.
      const half = Math.atan2(Math.hypot(x, y, z), w) / multiple;
      const s = Math.sin(half) / (Math.hypot(x, y, z) || 1);
      const turning = ofQuaternion(Math.cos(half), x * s, y * s, z * s);
      return sense(convention.product === 'hamilton' ? turning : transpose(turning), convention.maps);
    }
    case 'dcm': {
      const rows = [n.slice(0, 3), n.slice(3, 6), n.slice(6, 9)];
      const m = convention.layout === 'row-major' ? rows : transpose(rows);
      const directed = convention.maps === 'body-to-reference' ? transpose(m) : m;
      return multiple === 1 ? directed : power(directed, 1 / multiple);
    }
    case 'rotation-vector': return sense(about(n, rad(Math.hypot(...n), convention.unit) / multiple), convention.maps);
    case 'axis-angle': return sense(about(n.slice(0, 3), rad(n[3]!, convention.unit) / multiple), convention.maps);
    case 'mrp': return sense(about(n, (4 * Math.atan(Math.hypot(...n))) / multiple), convention.maps);
    case 'gibbs': return sense(about(n, (2 * Math.atan(Math.hypot(...n))) / multiple), convention.maps);
  }
}

const offsetOn = (side: Offset['side'], offsets: readonly Offset[] = []): Matrix => {
  const offset = offsets.find((each) => each.side === side);
  return frameRotation(offset?.axis ?? [0, 0, 1], offset?.angle ?? 0);
};

/** C that the numbers of a box mean by a statement: what is left when offsets and scale are taken out. */
export function meaning(statement: Statement, numbers: readonly number[]): Matrix {
  const { convention, offsets } = statement;
  const standard = multiply(transpose(axes(convention.body)), componentMatrix(statement, numbers), axes(convention.reference));
  return multiply(transpose(offsetOn('body', offsets)), standard, transpose(offsetOn('reference', offsets)));
}

/** The numbers that a box following a statement lists for C. */
export function listed(statement: Statement, c: Matrix): number[] {
  const { convention, numbersAre, offsets, scale = 1 } = statement;
  const apart = multiply(offsetOn('body', offsets), c, offsetOn('reference', offsets));
  const m = multiply(axes(convention.body), apart, transpose(axes(convention.reference)));
  const multiple = numbersAre === 'half-angle' ? 0.5 : numbersAre === 'double-angle' ? 2 : 1;
  const directed = convention.representation === 'euler' ? m
    : ('maps' in convention && convention.maps === 'body-to-reference') !== (convention.representation === 'quaternion' && convention.product === 'shuster') ? transpose(m) : m;
  if (convention.representation === 'dcm') {
    const n = multiple === 1 ? directed : power(directed, multiple);
    return (convention.layout === 'row-major' ? n : transpose(n)).flat();
  }
  if (convention.representation === 'euler') return anglesOf(convention, m).map((angle) => angle * scale);
  const [w, x, y, z] = toQuaternion(directed);
  const length = Math.hypot(x, y, z);
  const angle = 2 * Math.atan2(length, w) * multiple;
  const axis = length === 0 ? [0, 0, 0] : [x / length, y / length, z / length];
  const along = (size: number): number[] => axis.map((entry) => entry * size * scale);
  switch (convention.representation) {
    case 'quaternion': {
      if (numbersAre === 'vector-part') return along(Math.sin(angle / 2));
      const v = along(Math.sin(angle / 2));
      const scalar = Math.cos(angle / 2) * scale;
      return convention.scalar === 'first' ? [scalar, ...v] : [...v, scalar];
    }
    case 'rotation-vector': return along(convention.unit === 'deg' ? (angle * 180) / Math.PI : angle);
    case 'axis-angle': return [...(length === 0 ? [1, 0, 0] : axis), (convention.unit === 'deg' ? (angle * 180) / Math.PI : angle) * scale];
    case 'mrp': return along(Math.tan(angle / 4));
    case 'gibbs': return along(Math.tan(angle / 2));
  }
}

/** Angles by the geometry of the axes: outer ones by atan2 of what is left when the earlier ones are undone. */
function anglesOf(convention: Extract<Convention, { representation: 'euler' }>, m: Matrix): number[] {
  const { sequence, motion, order, signs, unit } = convention;
  const axesOrder = [...sequence].map((letter) => 'XYZ'.indexOf(letter));
  const [i, j, k] = (motion === 'intrinsic' ? axesOrder : axesOrder.reverse()) as [number, number, number];
  let angles: number[];
  if (i === k) {
    const other = 3 - i - j;
    const e = (j - i + 3) % 3 === 1 ? 1 : -1;
    const middle = Math.atan2(Math.hypot(m[i]![j]!, m[i]![other]!), m[i]![i]!);
    const first = Math.atan2(m[i]![j]!, -e * m[i]![other]!);
    const last = lastAngle(m, i, first, j, middle, k);
    angles = [first, middle, last];
  } else {
    // M = R_k(c) R_j(b) R_i(a): row k of M is e_k turned by b and a.
    const e = (j - i + 3) % 3 === 1 ? 1 : -1;
    const middle = Math.atan2(e * m[k]![i]!, Math.hypot(m[k]![j]!, m[k]![k]!));
    const first = Math.atan2(-e * m[k]![j]!, m[k]![k]!);
    angles = [first, middle, lastAngle(m, i, first, j, middle, k)];
  }
  const applied = motion === 'intrinsic' ? angles : [...angles].reverse();
  return [0, 1, 2].map((place) => {
    const turn = order[place]! - 1;
    const angle = applied[turn]! * signs[turn]!;
    return unit === 'deg' ? (angle * 180) / Math.PI : angle;
  });
}

function lastAngle(m: Matrix, i: number, first: number, j: number, middle: number, k: number): number {
  const left = multiply(m, transpose(multiply(elementary(j, middle), elementary(i, first))));
  const p = (k + 1) % 3, q = (k + 2) % 3;
  return Math.atan2(left[p]![q]!, left[p]![p]!);
}
