import type { EulerConvention } from './convention.ts';
import { LISTED_AT_MOST } from './errors.ts';
import type { AttitudeWarning, AttitudeWarningCode, WorstCase } from './warnings.ts';

/** |cos| of the middle angle below which an answer is called severe. */
const SEVERE_COSINE = 1e-6;
const DEG_PER_RAD = 180 / Math.PI;

interface Tally {
  count: number;
  readonly indices: number[];
  worst: WorstCase | null;
}

/** Gathers what a batch must be warned of: one entry per code, the first 100 indices, the worst case of each. */
export class WarningTally {
  readonly #tallies = new Map<AttitudeWarningCode, Tally>();
  readonly #warnWithinDeg: number;

  constructor(warnWithinDeg: number) {
    this.#warnWithinDeg = warnWithinDeg;
  }

  /** Reports how near lock an Euler answer is. `angles` are the listed numbers. */
  lock(index: number, cosine: number, locked: boolean, convention: EulerConvention, listed: readonly [number, number, number], middle: number): void {
    const marginDeg = Math.asin(Math.min(1, cosine)) * DEG_PER_RAD;
    const code: AttitudeWarningCode | null = locked ? 'gimbal-lock' : cosine < SEVERE_COSINE ? 'severe-gimbal-lock' : marginDeg < this.#warnWithinDeg ? 'near-gimbal-lock' : null;
    if (!code) return;
    const condition = locked ? null : 1 / cosine;
    this.#add(code, {
      index, condition, digitsLost: condition === null ? null : Math.log10(condition), marginDeg: locked ? 0 : marginDeg,
      wellConditioned: wellConditioned(convention, listed, middle),
    }, (worst) => marginDeg < (worst.marginDeg ?? Infinity));
  }

  repaired(index: number, code: 'renormalised' | 'reorthonormalised', defect: number): void {
    this.#add(code, { index, defect }, (worst) => defect > (worst.defect ?? 0));
  }

  warnings(): AttitudeWarning[] {
    return [...this.#tallies].map(([code, { count, indices, worst }]) => ({ code, message: messageOf(code, count, this.#warnWithinDeg), count, indices: [...indices], worst: worst! }));
  }

  #add(code: AttitudeWarningCode, candidate: WorstCase, isWorse: (worst: WorstCase) => boolean): void {
    let tally = this.#tallies.get(code);
    if (!tally) this.#tallies.set(code, tally = { count: 0, indices: [], worst: null });
    tally.count++;
    if (tally.indices.length < LISTED_AT_MOST) tally.indices.push(candidate.index);
    if (!tally.worst || isWorse(tally.worst)) tally.worst = candidate;
  }
}

/** The combination of first and last applied angle that lock leaves alone: their sum or difference, by the side of the middle angle. */
function wellConditioned(convention: EulerConvention, listed: readonly [number, number, number], middle: number): NonNullable<WorstCase['wellConditioned']> {
  const { sequence, order, signs, unit, motion } = convention;
  const applied = (turn: number) => listed[order.indexOf(turn as 1 | 2 | 3)]! * signs[turn - 1]!;
  const [a, b, c] = [...sequence].map((letter) => 'XYZ'.indexOf(letter)) as [number, number, number];
  const cyclic = (b - a + 3) % 3 === 1;
  // Intrinsic and cyclic: at a middle angle of +90° the third axis has come to lie on the first, and the two add up.
  // Extrinsic motion is the reversed intrinsic one, whose parity is the opposite.
  const symmetric = a === c;
  const adds = symmetric ? Math.cos(unit === 'deg' ? middle / DEG_PER_RAD : middle) > 0 : (middle > 0) === (cyclic === (motion === 'intrinsic'));
  const turn = unit === 'deg' ? 360 : 2 * Math.PI;
  const angle = adds ? applied(1) + applied(3) : applied(1) - applied(3);
  return { combination: adds ? 'first-plus-last' : 'first-minus-last', angle: angle - turn * Math.round(angle / turn), unit };
}

function messageOf(code: AttitudeWarningCode, count: number, warnWithinDeg: number): string {
  const subject = count === 1 ? '1 attitude' : `${count} attitudes`;
  const verb = count === 1 ? 'is' : 'are';
  switch (code) {
    case 'near-gimbal-lock': return `${subject} ${verb} within ${warnWithinDeg}° of gimbal lock: an attitude error grows by the condition number in the first and last angle.`;
    case 'severe-gimbal-lock': return `${subject} ${verb} so near gimbal lock (|cos| of the middle angle below ${SEVERE_COSINE}) that the first and last angle alone mean little; use their well-conditioned combination.`;
    case 'gimbal-lock': return `${subject} ${verb} at gimbal lock: only one combination of the first and last angle exists. The last applied is given as 0 and the first carries the whole; the attitude is still exact.`;
    case 'renormalised': return `${subject} had a quaternion norm off 1 by more than 1e-12 and ${count === 1 ? 'was' : 'were'} normalised.`;
    case 'reorthonormalised': return `${subject} had a matrix off orthogonal by more than 1e-12 and ${count === 1 ? 'was' : 'were'} replaced by the nearest rotation.`;
  }
}
