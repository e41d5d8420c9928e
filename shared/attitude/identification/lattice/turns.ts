import { BODY_SETS, bodyPermutation, handedness, LOCAL_LEVEL_SETS, referencePermutation, type SignedPermutation } from '../../axes.ts';

/**
 * The 24 rotations of a cube: the signed permutations of determinant +1, each known by its index. A left-handed set is
 * known by the turn of its negative: (P_b, P_r) and (−P_b, −P_r) carry every attitude to the same component matrix, so
 * for identification the two are one.
 */
export const TURN_COUNT = 24;

const ORDERS = [[0, 1, 2], [0, 2, 1], [1, 0, 2], [1, 2, 0], [2, 0, 1], [2, 1, 0]] as const;

export const TURNS: readonly SignedPermutation[] = ORDERS.flatMap((column) =>
  [0, 1, 2, 3, 4, 5, 6, 7]
    .map((bits): SignedPermutation => ({ column, sign: [bits & 1 ? -1 : 1, bits & 2 ? -1 : 1, bits & 4 ? -1 : 1] }))
    .filter((permutation) => handedness(permutation) === 1));

const keyOf = ({ column, sign }: SignedPermutation): string => `${column.join('')}${sign.join('')}`;
const indexByKey = new Map(TURNS.map((turn, index) => [keyOf(turn), index]));

const negated = ({ column, sign: [x, y, z] }: SignedPermutation): SignedPermutation => ({ column, sign: [-x, -y, -z] });

/** Index of a signed permutation, or of its negative where it is left-handed. */
export const turnOf = (permutation: SignedPermutation): number => indexByKey.get(keyOf(handedness(permutation) === 1 ? permutation : negated(permutation)))!;

export const IDENTITY_TURN = turnOf({ column: [0, 1, 2], sign: [1, 1, 1] });

const multiplied = (a: SignedPermutation, b: SignedPermutation): SignedPermutation => ({
  column: [b.column[a.column[0]]!, b.column[a.column[1]]!, b.column[a.column[2]]!],
  sign: [a.sign[0] * b.sign[a.column[0]]!, a.sign[1] * b.sign[a.column[1]]!, a.sign[2] * b.sign[a.column[2]]!],
});

const PRODUCTS = Uint8Array.from(TURNS.flatMap((a) => TURNS.map((b) => turnOf(multiplied(a, b)))));
const INVERSES = Uint8Array.from(TURNS, (_, a) => TURNS.findIndex((__, b) => PRODUCTS[a * TURN_COUNT + b] === IDENTITY_TURN));

/** Index of the product a · b. */
export const product = (a: number, b: number): number => PRODUCTS[a * TURN_COUNT + b]!;
export const inverse = (a: number): number => INVERSES[a]!;

/** A turn as nine numbers, row by row. */
export function turnMatrix(index: number): Float64Array {
  const { column, sign } = TURNS[index]!;
  const matrix = new Float64Array(9);
  for (let row = 0; row < 3; row++) matrix[3 * row + column[row]!] = sign[row]!;
  return matrix;
}

/** Letters of the sets of one turn. */
export interface SetNames {
  readonly rightHanded: string;
  readonly leftHanded: string;
}

function namesByTurn(sets: readonly string[], permutationOf: (letters: string) => SignedPermutation): SetNames[] {
  const named = sets.map((letters) => ({ letters, permutation: permutationOf(letters) }));
  const find = (turn: number, hand: number): string => named.find(({ permutation }) => turnOf(permutation) === turn && handedness(permutation) === hand)!.letters;
  return TURNS.map((_, turn) => ({ rightHanded: find(turn, 1), leftHanded: find(turn, -1) }));
}

/** v_set = ±turn · v_NED. */
export const REFERENCE_SETS: readonly SetNames[] = namesByTurn(LOCAL_LEVEL_SETS, referencePermutation);
/** v_set = ±turn · v_FRD. */
export const BODY_SETS_BY_TURN: readonly SetNames[] = namesByTurn(BODY_SETS, bodyPermutation);
