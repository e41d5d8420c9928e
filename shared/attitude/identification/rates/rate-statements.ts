import { bodyPermutation, handedness, isNamedFrame, referencePermutation } from '../../axes.ts';
import type { Convention, DcmConvention, EulerConvention, QuaternionConvention } from '../../convention.ts';
import type { Rate, RateKind, RateUnit } from '../../rates/rate.ts';
import { facetCost, facetSentences } from '../explain/facet-edits.ts';
import type { Facets } from '../lattice/decoder.ts';
import { BODY_SETS_BY_TURN, IDENTITY_TURN, REFERENCE_SETS, turnOf } from '../lattice/turns.ts';
import { eulerConventionsByClass, keyOfClass } from './euler-class.ts';
import type { RateHypothesis } from './hypotheses.ts';
import type { RateStatement } from './rate-identification.ts';

/** One way to state a hypothesis, with how far it is from what was stated. */
export interface RateChoice {
  readonly statement: RateStatement;
  readonly cost: number;
  readonly edits: readonly string[];
}

const NAMES: Readonly<Record<RateKind, string>> = {
  body: 'the angular velocity in body axes', reference: 'the angular velocity in reference axes', euler: 'rates of Euler angles', quaternion: 'the derivative of the quaternion', dcm: 'the derivative of the matrix',
};
/** Sets of axes in which rates of Euler angles are put into words, beside the stated ones. */
const COMMON_REFERENCES = ['NED', 'ENU', 'NWU'];
const COMMON_BODIES = ['FRD', 'FLU', 'RFU'];

const PLAIN_ANGLES: EulerConvention = { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'rad', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' };

/** Ways to state a hypothesis; none where it has no name (another frame's axes are not ours to turn). */
export function statementsOf(hypothesis: RateHypothesis, stated: RateStatement): RateChoice[] {
  const { attitude } = stated;
  switch (hypothesis.kind) {
    case 'body': return one(stated, { ...attitude, body: bodyName(hypothesis.turn, attitude) }, { rate: 'body', unit: unitOf(hypothesis.degrees) });
    case 'reference': {
      const reference = referenceName(hypothesis.turn, attitude);
      return reference === null ? [] : one(stated, { ...attitude, reference }, { rate: 'reference', unit: unitOf(hypothesis.degrees) });
    }
    case 'euler': {
      const angles = anglesStated(stated);
      return setPairs(angles).flatMap(({ reference, body }) => (eulerConventionsByClass(reference, body).get(keyOfClass(hypothesis.of)) ?? []).flatMap((convention) =>
        one(stated, attitude, { rate: 'euler', unit: unitOf(hypothesis.degrees), angles: { ...convention, unit: angles.unit, range: angles.range } })));
    }
    case 'quaternion': {
      const base: QuaternionConvention = attitude.representation === 'quaternion' ? attitude : { representation: 'quaternion', reference: attitude.reference, body: attitude.body, scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'any' };
      return setsOf(hypothesis, base).flatMap((sets) => (['hamilton', 'shuster'] as const).flatMap((product) => {
        const maps = (product === 'hamilton') !== hypothesis.conjugated ? 'body-to-reference' as const : 'reference-to-body' as const;
        return one(stated, { ...base, ...sets, product, maps, scalar: hypothesis.scalarLast ? 'last' : 'first' }, { rate: 'quaternion' });
      }));
    }
    case 'dcm': {
      const base: DcmConvention = attitude.representation === 'dcm' ? attitude : { representation: 'dcm', reference: attitude.reference, body: attitude.body, maps: 'reference-to-body', layout: 'row-major' };
      return setsOf(hypothesis, base).flatMap((sets) => (['row-major', 'column-major'] as const).flatMap((layout) => {
        const maps = (layout === 'column-major') === hypothesis.transposed ? 'reference-to-body' as const : 'body-to-reference' as const;
        return one(stated, { ...base, ...sets, layout, maps }, { rate: 'dcm' });
      }));
    }
  }
}

const unitOf = (degrees: boolean): RateUnit => (degrees ? 'deg/s' : 'rad/s');

/** A set by its turn, of the handedness that the other side has; the stated one where it is that turn. */
function bodyName(turn: number, { reference, body }: Convention): string {
  if (turnOf(bodyPermutation(body)) === turn) return body;
  return handedness(referencePermutation(reference)) === 1 ? BODY_SETS_BY_TURN[turn]!.rightHanded : BODY_SETS_BY_TURN[turn]!.leftHanded;
}

function referenceName(turn: number, { reference, body }: Convention): string | null {
  if (turnOf(referencePermutation(reference)) === turn) return reference;
  if (isNamedFrame(reference)) return null;
  return handedness(bodyPermutation(body)) === 1 ? REFERENCE_SETS[turn]!.rightHanded : REFERENCE_SETS[turn]!.leftHanded;
}

function setsOf({ bodyTurn, referenceTurn }: { readonly bodyTurn: number; readonly referenceTurn: number }, { reference, body }: Convention): { readonly reference: string; readonly body: string }[] {
  if (isNamedFrame(reference)) return referenceTurn === IDENTITY_TURN ? [{ reference, body: BODY_SETS_BY_TURN[bodyTurn]!.rightHanded }] : [];
  const hands = handedness(bodyPermutation(body)) === 1 ? (['rightHanded', 'leftHanded'] as const) : (['leftHanded', 'rightHanded'] as const);
  return hands.map((hand) => ({ reference: REFERENCE_SETS[referenceTurn]![hand], body: BODY_SETS_BY_TURN[bodyTurn]![hand] }));
}

function anglesStated({ attitude, rate }: RateStatement): EulerConvention {
  if (rate.rate === 'euler') return rate.angles;
  return attitude.representation === 'euler' ? attitude : { ...PLAIN_ANGLES, reference: attitude.reference, body: attitude.body };
}

function setPairs({ reference, body }: EulerConvention): { readonly reference: string; readonly body: string }[] {
  const own = [{ reference, body }];
  if (isNamedFrame(reference)) return own;
  const common = COMMON_REFERENCES.flatMap((r) => COMMON_BODIES.map((b) => ({ reference: r, body: b }))).filter((pair) => pair.reference !== reference || pair.body !== body);
  return [...own, ...common];
}

/** A statement with its distance from the stated one. */
function one(stated: RateStatement, attitude: Convention, rate: Rate): RateChoice[] {
  const edits: string[] = [];
  let cost = 0;
  if (rate.rate !== stated.rate.rate) {
    edits.push(`reads ${NAMES[rate.rate]}, stated ${NAMES[stated.rate.rate]}`);
    cost++;
  }
  const statedUnit: RateUnit = 'unit' in stated.rate ? stated.rate.unit : 'rad/s';
  if ('unit' in rate && rate.unit !== statedUnit) {
    edits.push(`reads ${rate.unit}, stated ${statedUnit}`);
    cost++;
  }
  // Rates of angles are listed by the angles' convention, derivatives of numbers by the attitude's own.
  const [own, other] = rate.rate === 'euler' ? [rate.angles, anglesStated(stated)] : [attitude, stated.attitude];
  if (rate.rate === 'euler' || own.representation === other.representation) {
    const facets = own as unknown as Facets;
    cost += facetCost(facets, undefined, other, own.representation);
    edits.push(...facetSentences(facets, undefined, other));
  }
  if (own.reference !== other.reference && rate.rate !== 'body') {
    edits.push(`reads reference axes ${own.reference}, stated ${other.reference}`);
    cost++;
  }
  if (own.body !== other.body && rate.rate !== 'reference') {
    edits.push(`reads body axes ${own.body}, stated ${other.body}`);
    cost++;
  }
  return [{ statement: { attitude, rate }, cost, edits }];
}
