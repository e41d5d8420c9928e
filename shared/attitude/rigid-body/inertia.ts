/** Row by row: the moments of inertia on the diagonal, the negative products beside it, kg m². */
export type InertiaMatrix = readonly [readonly [number, number, number], readonly [number, number, number], readonly [number, number, number]];

/** Why no body can have an inertia matrix. */
export interface InertiaFault {
  /** Row and column of the number at fault, where there is one. */
  readonly at?: readonly [number, number];
  readonly message: string;
}

/** Relative to the largest moment: numbers that differ by less are the same on a data sheet. */
const SLACK = 1e-9;

/**
 * What is wrong with an inertia matrix, or null. It must be symmetric and positive definite, and no principal moment may
 * exceed the sum of the other two: I1 + I2 − I3 is twice an integral of a square over the mass (Goldstein,
 * Classical Mechanics, sect. 5.3, from memory). Equality, a flat plate, is allowed.
 */
export function inertiaFault(inertia: InertiaMatrix): InertiaFault | null {
  const scale = Math.max(...inertia.flat().map(Math.abs));
  for (let i = 0; i < 3; i++) for (let j = 0; j < i; j++) {
    if (Math.abs(inertia[i]![j]! - inertia[j]![i]!) > SLACK * scale) return { at: [i, j], message: `is ${inertia[i]![j]}, but row ${j} has ${inertia[j]![i]} in its place ${i}: an inertia matrix is symmetric` };
  }
  const principal = principalMoments(inertia);
  const [least, middle, largest] = principal;
  if (!(least > SLACK * scale)) return { message: `has a principal moment of ${least}; all three must be greater than 0` };
  if (largest - least - middle > SLACK * scale) return { message: `has the principal moments ${principal.join(', ')}: the largest exceeds the sum of the other two, which no distribution of mass can have` };
  return null;
}

/** Eigenvalues of a symmetric matrix, least first, by Jacobi's rotations. Accuracy: a few units in the last place of the largest. */
export function principalMoments(inertia: InertiaMatrix): [number, number, number] {
  const a = inertia.map((row) => [...row]) as [number, number, number][];
  for (let sweep = 0; sweep < 30; sweep++) {
    const off = Math.hypot(a[0]![1], a[0]![2], a[1]![2]);
    if (off <= 1e-17 * Math.max(...a.flat().map(Math.abs))) break;
    for (const [p, q] of [[0, 1], [0, 2], [1, 2]] as const) rotate(a, p, q);
  }
  return [a[0]![0], a[1]![1], a[2]![2]].sort((x, y) => x - y) as [number, number, number];
}

/** Makes a[p][q] zero. */
function rotate(a: [number, number, number][], p: 0 | 1, q: 1 | 2): void {
  const apq = a[p]![q];
  if (apq === 0) return;
  const theta = (a[q]![q] - a[p]![p]) / (2 * apq);
  const t = (theta >= 0 ? 1 : -1) / (Math.abs(theta) + Math.hypot(theta, 1));
  const c = 1 / Math.hypot(t, 1);
  const s = t * c;
  for (let k = 0; k < 3; k++) {
    const [kp, kq] = [a[k]![p], a[k]![q]];
    a[k]![p] = c * kp - s * kq;
    a[k]![q] = s * kp + c * kq;
  }
  for (let k = 0; k < 3; k++) {
    const [pk, qk] = [a[p]![k as 0]!, a[q]![k as 0]!];
    a[p]![k as 0] = c * pk - s * qk;
    a[q]![k as 0] = s * pk + c * qk;
  }
}

/** Whether the x-z plane is a plane of symmetry, as of an ordinary aircraft: Ixy = Iyz = 0. */
export function isSymmetricAircraft(inertia: InertiaMatrix): boolean {
  const scale = Math.max(...inertia.flat().map(Math.abs));
  return Math.abs(inertia[0][1]) <= SLACK * scale && Math.abs(inertia[1][2]) <= SLACK * scale;
}
