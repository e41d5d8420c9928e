import { AttitudeError } from './errors.ts';

/** Named frames: related to nothing but themselves, since relating them takes a position or an epoch. All right-handed. */
export const NAMED_FRAMES = ['ECEF', 'GCRF', 'ICRF', 'EME2000', 'TEME'] as const;

/** Rows of a signed permutation: row i has `sign[i]` in column `column[i]` and zeros elsewhere. */
export interface SignedPermutation {
  readonly column: readonly [number, number, number];
  readonly sign: readonly [number, number, number];
}

/** Each letter as a signed unit vector of the standard set: NED for reference axes, FRD for body axes. */
const REFERENCE_LETTERS: Readonly<Record<string, readonly [number, number]>> = { N: [0, 1], S: [0, -1], E: [1, 1], W: [1, -1], D: [2, 1], U: [2, -1] };
const BODY_LETTERS: Readonly<Record<string, readonly [number, number]>> = { F: [0, 1], B: [0, -1], R: [1, 1], L: [1, -1], D: [2, 1], U: [2, -1] };

function parse(letters: Readonly<Record<string, readonly [number, number]>>, text: string): SignedPermutation | null {
  if (text.length !== 3) return null;
  const parts = [...text].map((letter) => (Object.hasOwn(letters, letter) ? letters[letter]! : null));
  const [x, y, z] = parts;
  if (!x || !y || !z || new Set([x[0], y[0], z[0]]).size !== 3) return null;
  return { column: [x[0], y[0], z[0]], sign: [x[1], y[1], z[1]] };
}

/** All 48 sets that the letters make: every order of the three pairs, every choice within each. */
function allSets(pairs: readonly (readonly [string, string])[]): string[] {
  const orders = [[0, 1, 2], [0, 2, 1], [1, 0, 2], [1, 2, 0], [2, 0, 1], [2, 1, 0]];
  return orders.flatMap((order) => [0, 1, 2, 3, 4, 5, 6, 7].map((choice) => order.map((pair, i) => pairs[pair]![(choice >> i) & 1]).join('')));
}

/** The 48 local-level reference sets. */
export const LOCAL_LEVEL_SETS: readonly string[] = allSets([['N', 'S'], ['E', 'W'], ['D', 'U']]);
/** The 48 body sets. */
export const BODY_SETS: readonly string[] = allSets([['F', 'B'], ['R', 'L'], ['D', 'U']]);

export const isNamedFrame = (text: string): boolean => (NAMED_FRAMES as readonly string[]).includes(text);
export const isReferenceAxes = (text: string): boolean => isNamedFrame(text) || parse(REFERENCE_LETTERS, text) !== null;
export const isBodyAxes = (text: string): boolean => parse(BODY_LETTERS, text) !== null;

const IDENTITY: SignedPermutation = { column: [0, 1, 2], sign: [1, 1, 1] };

/**
 * S with v_set = S v_standard, where the standard is NED for a local-level set and the frame itself for a named one.
 * @throws AttitudeError `invalid-convention`.
 */
export function referencePermutation(text: string): SignedPermutation {
  const permutation = isNamedFrame(text) ? IDENTITY : parse(REFERENCE_LETTERS, text);
  if (!permutation) throw new AttitudeError('invalid-convention', `"${text}" is no set of reference axes.`);
  return permutation;
}

/** S with v_set = S v_FRD. @throws AttitudeError `invalid-convention`. */
export function bodyPermutation(text: string): SignedPermutation {
  const permutation = parse(BODY_LETTERS, text);
  if (!permutation) throw new AttitudeError('invalid-convention', `"${text}" is no set of body axes.`);
  return permutation;
}

/** +1 for a right-handed set, −1 for a left-handed one: the determinant of its signed permutation. */
export function handedness({ column: [a, b, c], sign }: SignedPermutation): 1 | -1 {
  const even = (b - a) * (c - a) * (c - b) > 0;
  return (even ? 1 : -1) * sign[0] * sign[1] * sign[2] > 0 ? 1 : -1;
}

/** P with v_to = P v_from, for two sets given by their permutations: to · fromᵀ. */
export function between(from: SignedPermutation, to: SignedPermutation): SignedPermutation {
  const column = [0, 1, 2].map((i) => from.column.indexOf(to.column[i]!)) as [number, number, number];
  const sign = [0, 1, 2].map((i) => to.sign[i]! * from.sign[column[i]!]!) as [number, number, number];
  return { column, sign };
}

/**
 * P_r with v_to = P_r v_from for two sets of reference axes.
 * @throws AttitudeError `unrelated-frames` where either is a named frame and they differ.
 */
export function betweenReferences(from: string, to: string): SignedPermutation {
  if (from !== to && (isNamedFrame(from) || isNamedFrame(to))) {
    throw new AttitudeError('unrelated-frames', `${from} and ${to} cannot be related without a position or an epoch.`);
  }
  return between(referencePermutation(from), referencePermutation(to));
}

/** P_b with v_to = P_b v_from for two sets of body axes. */
export const betweenBodies = (from: string, to: string): SignedPermutation => between(bodyPermutation(from), bodyPermutation(to));
