import { MAPS, QUATERNION_PRODUCTS, type QuaternionConvention } from '../../convention.ts';
import type { Decoder, NumbersAre, Reader, Statement } from './decoder.ts';
import { writeRotation } from './rotation-of-quaternion.ts';
import { IDENTITY_TURN, inverse, product, turnOf } from './turns.ts';

/**
 * Numbers that are a quaternion have one norm throughout; a scale common to all of them changes no attitude. More
 * spread than this about the first one's norm, and they are no quaternions.
 */
const NORM_SLACK = 0.05;

type Scalar = QuaternionConvention['scalar'];
type Multiple = 0.5 | 1 | 2;

/** M = R(q), q as listed, or q of which the listed one is the quaternion of half or twice the rotation. */
function quaternionReader(scalar: Scalar, multiple: Multiple): Reader {
  const [pw, px, py, pz] = scalar === 'first' ? [0, 1, 2, 3] as const : [3, 0, 1, 2] as const;
  return {
    width: 4,
    scalable: false,
    norm: (numbers) => Math.hypot(numbers[0]!, numbers[1]!, numbers[2]!, numbers[3]!),
    read(numbers, count, _factor, m) {
      const first = Math.hypot(numbers[0]!, numbers[1]!, numbers[2]!, numbers[3]!);
      if (!(first > 0)) return false;
      const least = (first * (1 - NORM_SLACK)) ** 2, most = (first * (1 + NORM_SLACK)) ** 2;
      for (let i = 0; i < count; i++) {
        const at = 4 * i;
        const w = numbers[at + pw]!, x = numbers[at + px]!, y = numbers[at + py]!, z = numbers[at + pz]!;
        const vv = x * x + y * y + z * z;
        const square = w * w + vv;
        if (square < least || square > most) return false;
        if (multiple === 1) writeRotation(w, x, y, z, m, 9 * i);
        // q² = (w² − v·v, 2 w v); √q ∝ (w + |q|, v), on the principal branch.
        else if (multiple === 0.5) writeRotation(w * w - vv, 2 * w * x, 2 * w * y, 2 * w * z, m, 9 * i);
        else {
          const scalarOfRoot = w + Math.sqrt(square);
          if (scalarOfRoot > 1e-9) writeRotation(scalarOfRoot, x, y, z, m, 9 * i);
          else if (vv > 0) writeRotation(0, x, y, z, m, 9 * i);
          else return false;
        }
      }
      return true;
    },
  };
}

/**
 * Read with the scalar at the other end, a quaternion is the transpose with both sets relabelled. With k the third unit
 * quaternion and u the half turn about (1, 0, 1): (n4; n1, n2, n3) = u k (n1; n2, n3, n4)* u*, up to sign. So
 * R(last) = (U K) R(first)ᵀ Uᵀ, which is why attitudes alone cannot name a slip of the scalar when both sets are unknown.
 */
const U = turnOf({ column: [2, 1, 0], sign: [1, -1, 1] });
const K = turnOf({ column: [0, 1, 2], sign: [-1, -1, 1] });
const UK = product(U, K);

function statementsOf(transposed: boolean, scalars: readonly Scalar[], readAs: Scalar, numbersAre?: NumbersAre): Statement[] {
  return scalars.flatMap((scalar) => QUATERNION_PRODUCTS.flatMap((quaternionProduct) => MAPS.flatMap((maps) => {
    // hamilton / reference-to-body is R(q) itself; either facet turned round transposes it, and so does the other scalar.
    const transposes = (quaternionProduct === 'hamilton') === (maps === 'body-to-reference');
    const slipped = scalar !== readAs;
    if ((transposes !== slipped) !== transposed) return [];
    const [left, right] = !slipped ? [IDENTITY_TURN, IDENTITY_TURN] : transposes ? [U, UK] : [UK, U];
    return [{ facets: { representation: 'quaternion', scalar, product: quaternionProduct, maps, sign: 'any' }, ...(numbersAre ? { numbersAre } : {}), left, right } satisfies Statement];
  })));
}

const SCALARS = ['first', 'last'] as const;

/** Plain quaternions: either scalar by one reader. Half and double the rotation: the slip is no relabelling any more. */
export const QUATERNION_DECODERS: readonly Decoder[] = [
  ...oneReader(quaternionReader('first', 1), SCALARS, 'first'),
  ...([[0.5, 'half-angle'], [2, 'double-angle']] as const).flatMap(([multiple, numbersAre]) =>
    SCALARS.flatMap((scalar) => oneReader(quaternionReader(scalar, multiple), [scalar], scalar, numbersAre))),
];

function oneReader(reader: Reader, scalars: readonly Scalar[], readAs: Scalar, numbersAre?: NumbersAre): Decoder[] {
  return [false, true].map((transposed) => ({ reader, transposed, statements: statementsOf(transposed, scalars, readAs, numbersAre) }));
}

/** Relabelling by which a scalar read at the wrong end is undone; kept for the tests that prove it. */
export const SCALAR_SLIP = { left: UK, right: U, inverseLeft: inverse(UK), inverseRight: inverse(U) } as const;
