import { angleBetween, ofQuaternion, toQuaternion, type Matrix } from './matrices.ts';
import { Noise } from './noise.ts';
import { listed, meaning, type Statement } from './statements.ts';

/** Attitudes without symmetry and well apart, for telling statements from each other. */
const GENERIC: readonly Matrix[] = (() => {
  const noise = new Noise(20);
  return Array.from({ length: 12 }, () => ofQuaternion(noise.normal(), noise.normal(), noise.normal(), noise.normal()));
})();

/**
 * How far, rad, two statements are from being the same numbers for all attitudes: the largest angle between an attitude
 * and what the second statement makes of the numbers that the first lists for it. Lags aside.
 */
export function distance(truth: Statement, claimed: Statement, attitudes: readonly Matrix[] = GENERIC): number {
  return Math.max(...attitudes.map((c) => {
    const numbers = listed(truth, c);
    if (numbers.length !== widthOf(claimed)) return Math.PI;
    return angleBetween(c, meaning(claimed, numbers));
  }));
}

const widthOf = ({ convention, numbersAre }: Statement): number =>
  (numbersAre === 'vector-part' ? 3 : { euler: 3, quaternion: 4, dcm: 9, 'rotation-vector': 3, 'axis-angle': 4, mrp: 3, gibbs: 3 }[convention.representation]);

export { toQuaternion };
