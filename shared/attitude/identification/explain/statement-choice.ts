import type { Convention, Representation } from '../../convention.ts';
import { dot9 } from '../fit/best-rotation.ts';
import { multiply, transposed } from '../fit/small-matrix.ts';
import type { Decoder, Statement } from '../lattice/decoder.ts';
import { BODY_SETS_BY_TURN, IDENTITY_TURN, inverse, product, REFERENCE_SETS, TURN_COUNT, turnMatrix, type SetNames } from '../lattice/turns.ts';
import type { Fit } from '../search/fit.ts';
import { facetCost } from './facet-edits.ts';
import { offsetTerms, type OffsetTerms } from './offsets.ts';

/** What was said of the numbers, and what may be said of them. */
export interface Claim {
  readonly stated: Convention | null;
  readonly representation: Representation;
  /** The named frame that the reference axes must be, or null where they are a local-level set. */
  readonly frame: string | null;
  /** The component matrices have determinant −1: the two sets differ in handedness. */
  readonly mirrored: boolean;
}

/** A statement with its axis sets and offsets; the same numbers for all attitudes as every other of its fit. */
export interface Choice {
  readonly statement: Statement;
  readonly convention: Convention;
  readonly offsets: { readonly reference?: OffsetTerms; readonly body?: OffsetTerms };
  readonly cost: number;
}

/** Sets that interfaces do use (common practice); between equal counts of edits they are meant rather than others. */
const USUAL = new Set(['NED', 'ENU', 'NWU', 'FRD', 'FLU', 'RFU']);
const UNUSUAL_SET = 0.3;
const LEFT_HANDED = 0.35;
const SHUSTER = 0.05;
/** An offset is one edit; the larger it is, the sooner other axis sets with a smaller offset are the better word. */
const OFFSET_PER_RADIAN = 1;
const FREE_HEADING = 0.1;
const TURN_MATRICES = Array.from({ length: TURN_COUNT }, (_, turn) => turnMatrix(turn));

/** A side on which a rotation was fitted, to be shared between axis sets and an offset: B = P_b T, or A = T P_rᵀ. */
class OffsetSide {
  readonly #rotation: Float64Array;
  readonly #isReference: boolean;
  readonly #deviation: number;
  readonly #nearest: number;
  /** By the turn of the axis sets as the decoder has them: relabelling a statement changes no offset. */
  readonly #terms = new Map<number, OffsetTerms>();

  constructor(rotation: Float64Array, isReference: boolean, deviation: number) {
    this.#rotation = rotation;
    this.#isReference = isReference;
    this.#deviation = deviation;
    const toward = isReference ? transposed(rotation) : rotation;
    this.#nearest = TURN_MATRICES.reduce((best, turn, k) => (dot9(turn, toward) > dot9(TURN_MATRICES[best]!, toward) ? k : best), 0);
  }

  /** With the nearest axis sets, and with the stated ones. */
  shared(relabel: number, stated: number): { readonly turn: number; readonly offset: OffsetTerms; readonly cost: number }[] {
    const asStated = product(inverse(relabel), stated);
    return (asStated === this.#nearest ? [asStated] : [asStated, this.#nearest]).map((own) => {
      const offset = this.#termsFor(own);
      // A heading may be counted from anywhere; any other offset is small.
      const free = this.#isReference && offset.alongAxis === 2;
      return { turn: product(relabel, own), offset, cost: 1 + (free ? FREE_HEADING : OFFSET_PER_RADIAN) * Math.abs(offset.angle) };
    });
  }

  #termsFor(turn: number): OffsetTerms {
    let terms = this.#terms.get(turn);
    if (!terms) {
      const t = this.#isReference ? multiply(this.#rotation, TURN_MATRICES[turn]!) : multiply(TURN_MATRICES[inverse(turn)]!, this.#rotation);
      this.#terms.set(turn, terms = offsetTerms(t, this.#deviation));
    }
    return terms;
  }
}

/** Chooses words for fits: of all statements that are the same numbers, the one with the fewest edits. */
export class StatementChooser {
  readonly #claim: Claim;
  readonly #ordered = new Map<Decoder, { readonly statement: Statement; readonly cost: number }[]>();

  readonly #leastCosts = new Map<Decoder, Map<number, number>>();
  readonly #statedBody: number;
  readonly #statedReference: number;

  constructor(claim: Claim) {
    this.#claim = claim;
    const { stated, frame } = claim;
    this.#statedBody = stated ? turnOfSet(BODY_SETS_BY_TURN, stated.body) : IDENTITY_TURN;
    this.#statedReference = stated && !frame ? turnOfSet(REFERENCE_SETS, stated.reference) : IDENTITY_TURN;
  }

  /** Fewest edits with two turns, null standing for an offset of no size; Infinity where no statement is possible. */
  leastCost(decoder: Decoder, bodyTurn: number | null, referenceTurn: number | null): number {
    const key = (bodyTurn ?? TURN_COUNT) * (TURN_COUNT + 1) + (referenceTurn ?? TURN_COUNT);
    let costs = this.#leastCosts.get(decoder);
    if (!costs) this.#leastCosts.set(decoder, costs = new Map());
    const known = costs.get(key);
    if (known !== undefined) return known;
    let least = Infinity;
    for (const { statement: { left, right }, cost } of this.#statements(decoder)) {
      const sides = (bodyTurn === null ? 1 : 0) + (referenceTurn === null ? 1 : 0);
      if (cost + sides >= least) break;
      const bodies = bodyTurn === null ? this.#statedBody : product(left, bodyTurn);
      const references = referenceTurn === null ? this.#statedReference : product(right, referenceTurn);
      for (const sets of this.#setPairs(bodies, references)) least = Math.min(least, cost + sides + sets.cost);
    }
    costs.set(key, least);
    return least;
  }

  /**
   * The statements of a fit, fewest edits first.
   * @param deviation - of a component of a fitted offset, rad.
   */
  choices(fit: Fit, deviation: number, most: number): Choice[] {
    const found: Choice[] = [];
    const beside = fit.freed.filter((block) => block === 'lag' || block === 'scale').length;
    const body = fit.bodyTurn === null ? new OffsetSide(fit.b, false, deviation) : null;
    const reference = fit.referenceTurn === null ? new OffsetSide(fit.a, true, deviation) : null;
    const sides = beside + (body ? 1 : 0) + (reference ? 1 : 0);
    for (const { statement, cost } of this.#statements(fit.decoder)) {
      // The list is in the order of its facets' costs, and sets and offsets only add.
      if (found.length >= most && cost + sides >= found[most - 1]!.cost) break;
      const { left, right } = statement;
      const bodies = body ? body.shared(left, this.#statedBody) : [{ turn: product(left, fit.bodyTurn!), cost: 0 }];
      const references = reference ? reference.shared(right, this.#statedReference) : [{ turn: product(right, fit.referenceTurn!), cost: 0 }];
      for (const b of bodies) for (const r of references) for (const sets of this.#setPairs(b.turn, r.turn)) {
        const total = cost + sets.cost + b.cost + r.cost + beside;
        if (found.length >= most && total >= found[most - 1]!.cost) continue;
        found.push({
          statement,
          convention: { ...statement.facets, reference: sets.reference, body: sets.body } as Convention,
          offsets: { ...('offset' in r ? { reference: r.offset } : {}), ...('offset' in b ? { body: b.offset } : {}) },
          cost: total,
        });
        found.sort((x, y) => x.cost - y.cost);
        found.length = Math.min(found.length, most);
      }
    }
    return found;
  }

  #statements(decoder: Decoder) {
    let ordered = this.#ordered.get(decoder);
    if (!ordered) {
      const { stated, representation } = this.#claim;
      ordered = decoder.statements
        .map((statement) => ({ statement, cost: facetCost(statement.facets, statement.numbersAre, stated, representation) + ('product' in statement.facets && statement.facets.product === 'shuster' ? SHUSTER : 0) }))
        .sort((x, y) => x.cost - y.cost);
      this.#ordered.set(decoder, ordered);
    }
    return ordered;
  }

  /** Letters for a pair of turns: both right-handed or both left-handed, or one of each where the matrices are mirrored. */
  #setPairs(body: number, reference: number): { readonly reference: string; readonly body: string; readonly cost: number }[] {
    const { stated, frame, mirrored } = this.#claim;
    const bodies = BODY_SETS_BY_TURN[body]!;
    if (frame) {
      if (reference !== IDENTITY_TURN) return [];
      const letters = mirrored ? bodies.leftHanded : bodies.rightHanded;
      return [{ reference: frame, body: letters, cost: setCost(letters, mirrored, stated?.body ?? 'FRD') }];
    }
    const references = REFERENCE_SETS[reference]!;
    return [false, true].map((leftHanded) => {
      const r = leftHanded ? references.leftHanded : references.rightHanded;
      const bodyLeft = leftHanded !== mirrored;
      const b = bodyLeft ? bodies.leftHanded : bodies.rightHanded;
      return { reference: r, body: b, cost: setCost(r, leftHanded, stated?.reference ?? 'NED') + setCost(b, bodyLeft, stated?.body ?? 'FRD') };
    });
  }
}

const setCost = (letters: string, leftHanded: boolean, stated: string): number =>
  (letters === stated ? 0 : 1 + (USUAL.has(letters) ? 0 : leftHanded ? LEFT_HANDED : UNUSUAL_SET));

const turnOfSet = (sets: readonly SetNames[], letters: string): number => {
  const turn = sets.findIndex(({ rightHanded, leftHanded }) => rightHanded === letters || leftHanded === letters);
  return turn < 0 ? IDENTITY_TURN : turn;
};
