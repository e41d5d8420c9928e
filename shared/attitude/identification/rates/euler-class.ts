import { bodyPermutation, handedness, referencePermutation, type SignedPermutation } from '../../axes.ts';
import { MOTIONS, ORDERS, SEQUENCES, type AngleSigns, type EulerConvention } from '../../convention.ts';
import { intrinsicAxes } from '../../rates/euler-rates.ts';

/**
 * Rates of Euler angles are parts of the angular velocity along three lines: one fixed in the reference, one fixed in
 * the body, and the line of nodes across both. So for rates it matters only which lines these are, in which order they are
 * listed and with which signs; whether first and third axis are the same does not (the middle angle differs by a
 * constant): 9 pairs of lines × 6 orders × 8 signs.
 */
export interface EulerClass {
  /** Reference axis (0 north, 1 east, 2 down) and body axis (0 forward, 1 right, 2 down). */
  readonly lines: readonly [reference: number, body: number];
  /** Per listed number: 0 the rate about the reference axis, 1 about the nodes (body × reference), 2 about the body axis. */
  readonly listed: readonly [number, number, number];
  readonly signs: readonly [number, number, number];
}

export const keyOfClass = ({ lines, listed, signs }: EulerClass): string => `${lines.join('')}/${listed.join('')}/${signs.join()}`;

const axisOf = ({ column, sign }: SignedPermutation, k: number): readonly [axis: number, sign: number] => [column[k]!, sign[k]!];
const cyclicSign = (a: number, b: number): 1 | -1 => ((b - a + 3) % 3 === 1 ? 1 : -1);

/**
 * The class of a convention's rates. With u3 and u1 the last and first axis, the middle angle turns about ±u3 × u1: the
 * sign is that of e_c × e_a = ±e_b for three different axes, where the cosine of the middle angle is positive, and − for
 * first = third, where its sine is.
 */
export function eulerClassOf(convention: EulerConvention): EulerClass {
  const [a, , c] = intrinsicAxes(convention);
  const [referenceAxis, referenceSign] = axisOf(referencePermutation(convention.reference), a);
  const [bodyAxis, bodySign] = axisOf(bodyPermutation(convention.body), c);
  // What is listed for the middle angle of first = third is never negative, whatever its sign.
  const handed = a === c ? -convention.signs[1] : cyclicSign(c, a);
  // An angular velocity is an axial vector: between left-handed sets the lines turn round.
  const hand = handedness(bodyPermutation(convention.body));
  const senses = [hand * referenceSign, handed * bodySign * referenceSign, hand * bodySign];
  const { order, signs, motion } = convention;
  const listed: number[] = [];
  const listedSigns: number[] = [];
  for (let place = 0; place < 3; place++) {
    const applied = order[place]!;
    const turn = motion === 'extrinsic' ? 3 - applied : applied - 1;
    listed.push(turn);
    listedSigns.push(senses[turn]! * signs[applied - 1]!);
  }
  return { lines: [referenceAxis, bodyAxis], listed: listed as [number, number, number], signs: listedSigns as [number, number, number] };
}

const SIGN_CHOICES: readonly AngleSigns[] = [1, -1].flatMap((a) => [1, -1].flatMap((b) => [1, -1].map((c) => [a, b, c] as unknown as AngleSigns)));

const tables = new Map<string, ReadonlyMap<string, readonly EulerConvention[]>>();

/** Every Euler convention between two sets, by its class. Made once for each pair of sets. */
export function eulerConventionsByClass(reference: string, body: string): ReadonlyMap<string, readonly EulerConvention[]> {
  const key = `${reference}/${body}`;
  let table = tables.get(key);
  if (!table) {
    const byClass = new Map<string, EulerConvention[]>();
    for (const sequence of SEQUENCES) for (const motion of MOTIONS) for (const order of ORDERS) for (const signs of SIGN_CHOICES) {
      const convention: EulerConvention = { representation: 'euler', reference, body, sequence, motion, order, signs, unit: 'deg', range: 'signed' };
      const classKey = keyOfClass(eulerClassOf(convention));
      byClass.set(classKey, [...(byClass.get(classKey) ?? []), convention]);
    }
    tables.set(key, table = byClass);
  }
  return table;
}
