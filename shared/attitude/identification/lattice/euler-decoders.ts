import { handedness, type SignedPermutation } from '../../axes.ts';
import { MOTIONS, ORDERS, SEQUENCES, type AngleSigns, type AngleUnit, type ListingOrder, type Motion, type Sequence } from '../../convention.ts';
import type { Decoder, Reader, Statement } from './decoder.ts';
import { turnOf } from './turns.ts';

/**
 * All Euler conventions in 24 decoders a unit. With R_k the frame rotations of the convention formulas and p = ±1:
 *
 * - three different axes: M = R1(p·z) R2(y) R3(x); first = third: M = R3(p·z) R1(y) R3(x);
 * - for a turn Q, Q R_k(a) Qᵀ is the rotation about Q e_k, so every sequence and every pair of signs is one of these
 *   with both axis sets relabelled by the same turn; what is left of the signs is p;
 * - extrinsic A-B-C with (a, b, c) is intrinsic C-B-A with (c, b, a), which the order of listing absorbs;
 * - Mᵀ is the same form with the list read the other way round, so only lists with x before z need reading.
 */
const SIGN_CHOICES: readonly AngleSigns[] = [1, -1].flatMap((a) => [1, -1].flatMap((b) => [1, -1].map((c) => [a, b, c] as unknown as AngleSigns)));

/** Places in the list of x, y, z. */
const PLACES = [[0, 1, 2], [0, 2, 1], [1, 0, 2]] as const;

type Kind = 'three' | 'two';

function eulerReader(kind: Kind, unit: AngleUnit, [px, py, pz]: readonly [number, number, number], parity: 1 | -1): Reader {
  const radians = unit === 'deg' ? Math.PI / 180 : 1;
  return {
    width: 3,
    scalable: true,
    read(numbers, count, factor, m) {
      const scale = radians * factor;
      for (let i = 0; i < count; i++) {
        const x = numbers[3 * i + px]! * scale, y = numbers[3 * i + py]! * scale, z = parity * numbers[3 * i + pz]! * scale;
        const cx = Math.cos(x), sx = Math.sin(x), cy = Math.cos(y), sy = Math.sin(y), cz = Math.cos(z), sz = Math.sin(z);
        const at = 9 * i;
        if (kind === 'three') {
          m[at] = cy * cx; m[at + 1] = cy * sx; m[at + 2] = -sy;
          m[at + 3] = sz * sy * cx - cz * sx; m[at + 4] = sz * sy * sx + cz * cx; m[at + 5] = sz * cy;
          m[at + 6] = cz * sy * cx + sz * sx; m[at + 7] = cz * sy * sx - sz * cx; m[at + 8] = cz * cy;
        } else {
          m[at] = cz * cx - sz * cy * sx; m[at + 1] = cz * sx + sz * cy * cx; m[at + 2] = sz * sy;
          m[at + 3] = -sz * cx - cz * cy * sx; m[at + 4] = cz * cy * cx - sz * sx; m[at + 5] = cz * sy;
          m[at + 6] = sy * sx; m[at + 7] = -sy * cx; m[at + 8] = cy;
        }
      }
      return true;
    },
  };
}

/** Where a statement falls: which decoder, and by which turn of both sets. */
interface Placement {
  readonly kind: Kind;
  readonly places: readonly [number, number, number];
  readonly transposed: boolean;
  readonly parity: 1 | -1;
  readonly turn: number;
}

function placementOf(sequence: Sequence, motion: Motion, order: ListingOrder, signs: AngleSigns): Placement {
  // Intrinsic rotations first, middle, last: axis, place in the list, sign.
  const applied = [0, 1, 2].map((k) => ({ axis: 'XYZ'.indexOf(sequence[k]!), place: order.indexOf((k + 1) as 1 | 2 | 3), sign: signs[k]! }));
  const [first, middle, last] = (motion === 'intrinsic' ? applied : applied.reverse()) as [typeof applied[0], typeof applied[0], typeof applied[0]];
  const kind: Kind = first.axis === last.axis ? 'two' : 'three';
  const transposed = first.place > last.place;
  // The reader's x is the first of the two outer angles in the list; transposing turns the factors round and negates angles.
  const [x, z] = transposed ? [last, first] : [first, last];
  const sense = transposed ? -1 : 1;
  const column: [number, number, number] = [0, 0, 0];
  const sign: [number, number, number] = [1, 1, 1];
  const send = (from: number, to: number, s: number): void => { column[to] = from; sign[to] = s; };
  let parity: 1 | -1;
  if (kind === 'three') {
    // e3 → x's axis, e2 → y's, e1 → z's; the sign of the last is the parity that makes the turn proper.
    send(2, x.axis, sense * x.sign);
    send(1, middle.axis, sense * middle.sign);
    send(0, z.axis, sense * z.sign);
    parity = handedness({ column, sign });
    sign[z.axis] = sense * z.sign * parity;
  } else {
    // e3 → the outer axis, e1 → the middle one, e2 → what is left, with the sign that makes the turn proper.
    const rest = 3 - x.axis - middle.axis;
    send(2, x.axis, sense * x.sign);
    send(0, middle.axis, sense * middle.sign);
    send(1, rest, 1);
    sign[rest] = handedness({ column, sign });
    parity = (x.sign * z.sign) as 1 | -1;
  }
  return { kind, places: [x.place, middle.place, z.place], transposed, parity, turn: turnOf({ column, sign } as SignedPermutation) };
}

const keyOf = (kind: Kind, places: readonly number[], parity: number, transposed: boolean): string => `${kind}${places.join('')}${parity}${transposed}`;

function eulerDecodersIn(unit: AngleUnit): Decoder[] {
  const statements = new Map<string, Statement[]>();
  for (const sequence of SEQUENCES) for (const motion of MOTIONS) for (const order of ORDERS) for (const signs of SIGN_CHOICES) {
    const { kind, places, parity, transposed, turn } = placementOf(sequence, motion, order, signs);
    const key = keyOf(kind, places, parity, transposed);
    const statement: Statement = { facets: { representation: 'euler', sequence, motion, unit, order, signs, range: 'signed' }, left: turn, right: turn };
    statements.set(key, [...(statements.get(key) ?? []), statement]);
  }
  return (['three', 'two'] as const).flatMap((kind) => PLACES.flatMap((places) => ([1, -1] as const).flatMap((parity) => {
    const reader = eulerReader(kind, unit, places, parity);
    return [false, true].map((transposed): Decoder => ({ reader, transposed, statements: statements.get(keyOf(kind, places, parity, transposed))! }));
  })));
}

export const EULER_DECODERS: readonly Decoder[] = [...eulerDecodersIn('deg'), ...eulerDecodersIn('rad')];
