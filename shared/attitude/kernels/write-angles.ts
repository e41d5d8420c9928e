import { arcTangentDegrees, arcTangentRadians } from '../arithmetic/arc-tangent.gen.ts';
import { quickArcTangentsDegrees, quickArcTangentsRadians } from '../arithmetic/quick-arc-tangent.gen.ts';
import { scratch as S } from '../arithmetic/scratch.ts';
import { ANGLES, COSINE, LOCKED_FIRST, LOCKED_LAST, POINTS } from '../arithmetic/slots.ts';
import { PI, TWO_PI } from '../arithmetic/tables.gen.ts';
import type { EulerConvention } from '../convention.ts';
import { canonicalSequence } from './frames.ts';
import { FINE, LOCKED, UNSETTLED, type Writer } from './status.ts';

/** The four things that settle where an angle's number stands and how it is written. */
interface Listing {
  readonly slot: number;
  readonly factor: number;
  readonly positive: boolean;
  readonly middle: boolean;
}

/**
 * Writes the canonical POINTS as the numbers of an Euler convention: turned into angles, signed, put in their ranges
 * and their order. Where COSINE is not above `lockAt` the last applied angle is 0 and the first carries what is left.
 */
export interface AngleWriters {
  /** From POINTS as pairs. */
  readonly write: Writer;
  /** From POINTS as heads and tails, away from lock; UNSETTLED where the error could change a rounding. */
  readonly writeQuick: Writer;
}

/** Bounds of the quick arctangent's error, the points' own included. */
const QUICK_ERROR_RADIANS = 2 ** -69;
const QUICK_ERROR_DEGREES = 2 ** -63;

export function angleWriter(convention: EulerConvention, lockAt: number): AngleWriters {
  const { symmetric, lastSense, placeOfApplied } = canonicalSequence(convention);
  const { order, signs, range } = convention;
  const degrees = convention.unit === 'deg';
  const arcTangent = degrees ? arcTangentDegrees : arcTangentRadians;
  const quickArcTangents = degrees ? quickArcTangentsDegrees : quickArcTangentsRadians;
  const quickError = degrees ? QUICK_ERROR_DEGREES : QUICK_ERROR_RADIANS;
  // Rx(a) Ry(b) Rx(c) = Rx(a + π) Ry(−b) Rx(c + π): how a negated middle angle is kept positive when listed.
  const mirrored = symmetric && signs[1] < 0;
  const carrier = convention.motion === 'extrinsic' ? 2 : 0;
  const lockedPoint = carrier === 2 ? LOCKED_LAST : LOCKED_FIRST;
  const [halfHigh, halfLow] = degrees ? [180, 0] : PI;
  const [turnHigh, turnLow] = degrees ? [360, 0] : TWO_PI;

  const listings = order.map((turn): Listing => {
    const place = placeOfApplied[turn - 1]!;
    const sign = signs[turn - 1]! * (place === 2 ? lastSense : 1);
    return { slot: ANGLES + 2 * place, factor: mirrored && place === 1 ? 1 : sign, positive: turn === 1 && range === 'positive', middle: turn === 2 };
  });
  const slots = Int32Array.from(listings.map(({ slot }) => slot));
  const factors = Float64Array.from(listings.map(({ factor }) => factor));
  const positiveAt = listings.findIndex(({ positive }) => positive);
  const middleAt = listings.findIndex(({ middle }) => middle);

  /** Lists ANGLES, known to within `error`; whether every number is then settled. */
  function list(numbers: Float64Array, at: number, error: number): boolean {
    let settled = true;
    for (let i = 0; i < 3; i++) {
      const factor = factors[i]!;
      let hi = factor * S[slots[i]!]!;
      let lo = factor * S[slots[i]! + 1]!;
      if (i === positiveAt && hi + lo < 0) {
        const s = turnHigh + hi;
        lo = hi - (s - turnHigh) + (turnLow + lo);
        hi = s;
      }
      let rounded = hi + (lo - error);
      settled = settled && rounded === hi + (lo + error);
      if (i !== middleAt) {
        if (rounded === -halfHigh) {
          // −180° is +180°, and −π itself is +π; the double nearest to an angle just above −π stands.
          settled = settled && error === 0;
          if (degrees || lo === -halfLow) rounded = halfHigh;
        }
        // What rounds to a full turn is 0.
        if (i === positiveAt && rounded === turnHigh) rounded = 0;
      }
      numbers[at + i] = rounded + 0;
    }
    return settled;
  }

  function write(numbers: Float64Array, at: number): number {
    const locked = S[COSINE]! <= lockAt;
    if (locked) {
      const flat = symmetric ? POINTS + 4 : POINTS + 6;
      S[flat] = 0;
      S[flat + 1] = 0;
      const other = ANGLES + 4 - 2 * carrier;
      S[other] = 0;
      S[other + 1] = 0;
      arcTangent(lockedPoint, ANGLES + 2 * carrier);
    } else {
      if (mirrored) {
        negatePoint(POINTS);
        negatePoint(POINTS + 8);
      }
      arcTangent(POINTS, ANGLES);
      arcTangent(POINTS + 8, ANGLES + 4);
    }
    arcTangent(POINTS + 4, ANGLES + 2);
    list(numbers, at, 0);
    return locked ? LOCKED : FINE;
  }

  function writeQuick(numbers: Float64Array, at: number): number {
    if (mirrored) {
      negatePoint(POINTS);
      negatePoint(POINTS + 8);
    }
    quickArcTangents();
    return list(numbers, at, quickError) ? FINE : UNSETTLED;
  }

  return { write, writeQuick };
}

function negatePoint(slot: number): void {
  for (let i = slot; i < slot + 4; i++) S[i] = -S[i]!;
}
