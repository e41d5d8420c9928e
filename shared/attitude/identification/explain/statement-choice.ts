import type { Convention, Representation } from '../../convention.ts';
import { multiply } from '../fit/small-matrix.ts';
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
const TURN_MATRICES = Array.from({ length: TURN_COUNT }, (_, turn) => turnMatrix(turn));

/** Chooses words for fits: of all statements that are the same numbers, the one with the fewest edits. */
export class StatementChooser {
  readonly #claim: Claim;
  readonly #ordered = new Map<Decoder, { readonly statement: Statement; readonly cost: number }[]>();

  constructor(claim: Claim) {
    this.#claim = claim;
  }

  /** Fewest edits of a pair of turns, offsets aside; Infinity where no statement is possible. */
  leastCost(decoder: Decoder, bodyTurn: number, referenceTurn: number): number {
    let least = Infinity;
    for (const { statement, cost } of this.#statements(decoder)) {
      if (cost >= least) break;
      for (const { cost: sets } of this.#setPairs(product(statement.left, bodyTurn), product(statement.right, referenceTurn))) least = Math.min(least, cost + sets);
    }
    return least;
  }

  /**
   * The statements of a fit, fewest edits first.
   * @param deviation - of a component of a fitted offset, rad.
   */
  choices(fit: Fit, deviation: number, most: number): Choice[] {
    const found: Choice[] = [];
    const beside = fit.freed.filter((block) => block === 'lag' || block === 'scale').length;
    for (const { statement, cost } of this.#statements(fit.decoder)) {
      // The list is in the order of its facets' costs, and sets and offsets only add.
      if (found.length >= most && cost + beside > found[most - 1]!.cost) break;
      const bodies = this.#side(fit.bodyTurn, statement.left, () => multiply(turnMatrix(statement.left), fit.b), this.#statedBody(), deviation, false);
      const references = this.#side(fit.referenceTurn, statement.right, () => multiply(fit.a, turnMatrix(inverse(statement.right))), this.#statedReference(), deviation, true);
      for (const body of bodies) for (const reference of references) {
        for (const sets of this.#setPairs(body.turn, reference.turn)) {
          found.push({
            statement,
            convention: { ...statement.facets, reference: sets.reference, body: sets.body } as Convention,
            offsets: { ...(reference.offset ? { reference: reference.offset } : {}), ...(body.offset ? { body: body.offset } : {}) },
            cost: cost + sets.cost + body.cost + reference.cost + beside,
          });
        }
      }
      found.sort((x, y) => x.cost - y.cost);
    }
    return found.slice(0, most);
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

  /** One side's turn, or the turns between which and an offset a fitted rotation may be shared. */
  #side(turn: number | null, relabel: number, rotation: () => Float64Array, stated: number, deviation: number, isReference: boolean): { readonly turn: number; readonly offset?: OffsetTerms; readonly cost: number }[] {
    if (turn !== null) return [{ turn: product(relabel, turn), cost: 0 }];
    const r = rotation();
    // body: B = P_b T; reference: A = T P_rᵀ.
    const left = (candidate: number): Float64Array => (isReference ? multiply(r, TURN_MATRICES[candidate]!) : multiply(TURN_MATRICES[inverse(candidate)]!, r));
    const nearest = TURN_MATRICES.reduce((best, _, candidate) => (traceOf(left(candidate)) > traceOf(left(best)) ? candidate : best), 0);
    return [...new Set([stated, nearest])].map((candidate) => {
      const offset = offsetTerms(left(candidate), deviation);
      // A heading may be counted from anywhere; any other offset is small.
      const free = isReference && offset.alongAxis === 2;
      return { turn: candidate, offset, cost: 1 + (free ? 0.1 : OFFSET_PER_RADIAN) * Math.abs(offset.angle) };
    });
  }

  #statedBody(): number {
    return this.#claim.stated ? turnOfSet(BODY_SETS_BY_TURN, this.#claim.stated.body) : IDENTITY_TURN;
  }

  #statedReference(): number {
    const { stated, frame } = this.#claim;
    return stated && !frame ? turnOfSet(REFERENCE_SETS, stated.reference) : IDENTITY_TURN;
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

const traceOf = (m: Float64Array): number => m[0]! + m[4]! + m[8]!;

