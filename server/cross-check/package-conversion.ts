import Quaternion from 'quaternion';
import { bodyPermutation, handedness, referencePermutation, type SignedPermutation } from '#shared/attitude/axes.ts';
import type { Convention } from '#shared/attitude/convention.ts';

/**
 * What numbers mean, by the quaternion package in plain double precision: its own constructors and products, between
 * NED (or the named frame) and FRD. Good to about 1e-15 rad; null for a matrix between sets of different handedness, which
 * no quaternion expresses.
 */
export function quaternionBehind(convention: Convention, numbers: readonly number[]): Quaternion | null {
  const [reference, body] = [referencePermutation(convention.reference), bodyPermutation(convention.body)];
  const sign = handedness(reference);
  if (handedness(body) !== sign) return null;
  const own = between(convention, numbers);
  // v_NED = Sᵀ v_ref = Sᵀ R v_body = Sᵀ R T v_FRD.
  return quaternionOfAxes(reference, sign).conjugate().mul(own).mul(quaternionOfAxes(body, sign));
}

/** Angle of the rotation between two attitudes, rad. */
export function angleBetweenQuaternions(a: Quaternion, b: Quaternion): number {
  const { w, x, y, z } = a.conjugate().mul(b);
  return 2 * Math.atan2(Math.hypot(x, y, z), Math.abs(w));
}

function quaternionOfAxes({ column, sign }: SignedPermutation, scale: number): Quaternion {
  return Quaternion.fromMatrix([0, 1, 2].map((row) => [0, 1, 2].map((j) => (column[row] === j ? sign[row]! * scale : 0))) as never).normalize();
}

const AXES: readonly [number, number, number][] = [[1, 0, 0], [0, 1, 0], [0, 0, 1]];

function between(convention: Convention, n: readonly number[]): Quaternion {
  const angle = (value: number, unit: 'deg' | 'rad'): number => (unit === 'deg' ? (value * Math.PI) / 180 : value);
  const sensed = (maps: 'body-to-reference' | 'reference-to-body', q: Quaternion): Quaternion => (maps === 'body-to-reference' ? q : q.conjugate());
  switch (convention.representation) {
    case 'euler': return [1, 2, 3].reduce((before, turn) => {
      const turned = Quaternion.fromAxisAngle(AXES['XYZ'.indexOf(convention.sequence[turn - 1]!)]!, angle(n[convention.order.indexOf(turn as 1 | 2 | 3)]! * convention.signs[turn - 1]!, convention.unit));
      return convention.motion === 'intrinsic' ? before.mul(turned) : turned.mul(before);
    }, new Quaternion(1, 0, 0, 0));
    case 'quaternion': {
      const scale = Math.max(...n.map(Math.abs));
      const [w, x, y, z] = (convention.scalar === 'first' ? n : [n[3]!, n[0]!, n[1]!, n[2]!]).map((value) => value / scale);
      const q = new Quaternion(w!, x!, y!, z!).normalize();
      return (convention.maps === 'body-to-reference') === (convention.product === 'hamilton') ? q : q.conjugate();
    }
    case 'dcm': {
      const listed = [n.slice(0, 3), n.slice(3, 6), n.slice(6, 9)];
      const byColumns = (convention.layout === 'column-major') !== (convention.maps === 'reference-to-body');
      return Quaternion.fromMatrix((byColumns ? [0, 1, 2].map((i) => listed.map((row) => row[i]!)) : listed) as never).normalize();
    }
    case 'rotation-vector': {
      const length = Math.hypot(...n);
      return length === 0 ? new Quaternion(1, 0, 0, 0) : sensed(convention.maps, Quaternion.fromAxisAngle(n.map((value) => value / length) as never, angle(length, convention.unit)));
    }
    case 'axis-angle': return n[3] === 0 ? new Quaternion(1, 0, 0, 0) : sensed(convention.maps, Quaternion.fromAxisAngle(n.slice(0, 3).map((value) => value / Math.hypot(n[0]!, n[1]!, n[2]!)) as never, angle(n[3]!, convention.unit)));
    case 'mrp': {
      const square = n.reduce((sum, value) => sum + value * value, 0);
      return sensed(convention.maps, new Quaternion(1 - square, 2 * n[0]!, 2 * n[1]!, 2 * n[2]!).normalize());
    }
    case 'gibbs': return sensed(convention.maps, new Quaternion(1, n[0]!, n[1]!, n[2]!).normalize());
  }
}
