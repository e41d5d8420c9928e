import { arcTangentDegrees, arcTangentRadians } from '../arithmetic/arc-tangent.gen.ts';
import { scratch as S } from '../arithmetic/scratch.ts';
import { ANGLES, COSINE, LOCKED_FIRST, LOCKED_LAST, POINTS } from '../arithmetic/slots.ts';
import { PI, TWO_PI } from '../arithmetic/tables.gen.ts';
import type { EulerConvention } from '../convention.ts';
import { canonicalSequence } from './frames.ts';
import { FINE, LOCKED, type Writer } from './status.ts';

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
export function angleWriter(convention: EulerConvention, lockAt: number): Writer {
  const { symmetric, lastSense, placeOfApplied } = canonicalSequence(convention);
  const { order, signs, range } = convention;
  const degrees = convention.unit === 'deg';
  const arcTangent = degrees ? arcTangentDegrees : arcTangentRadians;
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

  return (numbers, at) => {
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
    for (let i = 0; i < 3; i++) {
      const factor = factors[i]!;
      let hi = factor * S[slots[i]!]!;
      const lo = factor * S[slots[i]! + 1]!;
      if (i !== middleAt) {
        if (i === positiveAt && hi < 0) {
          // Correctly rounded on the whole; what rounds to a full turn is 0.
          const s = turnHigh + hi;
          hi = s + (hi - (s - turnHigh) + (turnLow + lo));
          if (hi === turnHigh) hi = 0;
        } else if (hi === -halfHigh && (degrees || lo === -halfLow)) hi = halfHigh;
      }
      numbers[at + i] = hi + 0;
    }
    return locked ? LOCKED : FINE;
  };
}

function negatePoint(slot: number): void {
  for (let i = slot; i < slot + 4; i++) S[i] = -S[i]!;
}
