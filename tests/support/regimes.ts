import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { CONVENTIONS } from './named-conventions.ts';
import type { Random } from './random.ts';

/** A kind of attitude on which converters fail in ways of their own. */
export interface Regime {
  readonly name: string;
  /** Numbers of one attitude in the convention; null where the regime does not apply to it. */
  readonly numbers: (from: Convention, random: Random) => readonly number[] | null;
  /** Bits below the unit that an exact computation needs. */
  readonly bits: number;
}

/** The attitude of other numbers, as the numbers of `to`: a source of doubles, whose own rounding does not matter. */
const expressed = (from: Convention, to: Convention, numbers: readonly number[]): number[] => Array.from(createConverter(from, to, { repair: 'nearest' }).convert(Float64Array.from(numbers)));
const fromEuler = (to: Convention, angles: readonly number[]): number[] => expressed(CONVENTIONS['euler rad'], to, angles);
const fromVector = (to: Convention, vector: readonly number[]): number[] => expressed(CONVENTIONS['rotation vector'], to, vector);

export const REGIMES: readonly Regime[] = [
  { name: 'random', bits: 300, numbers: (from, random) => expressed(CONVENTIONS.quaternion, from, random.rotation()) },
  {
    name: 'within 1e-3 rad of lock', bits: 300,
    numbers: (from, random) => fromEuler(from, [random.between(-3, 3), random.sign() * (Math.PI / 2 - random.between(1e-4, 1e-3)), random.between(-3, 3)]),
  },
  {
    name: 'within 1e-13 rad of lock', bits: 300,
    numbers: (from, random) => fromEuler(from, [random.between(-3, 3), random.sign() * (Math.PI / 2 - random.between(1e-14, 1e-13)), random.between(-3, 3)]),
  },
  {
    name: 'within 1e-14° of ±90°', bits: 400,
    numbers: (from, random) => fromEuler(from, [random.between(-3, 3), random.sign() * (Math.PI / 2 - random.between(0, 1.8e-16)), random.between(-3, 3)]),
  },
  {
    name: 'rotations from 1e-300 rad', bits: 2400, // squares of 1e-300, to 64 digits and more
    numbers: (from, random) => {
      const size = 10 ** Math.trunc(random.between(-300, -1)) * random.between(1, 10);
      return fromVector(from, random.direction().map((component) => component * size));
    },
  },
  {
    name: 'near a half turn', bits: 300,
    numbers: (from, random) => {
      if (from.representation === 'gibbs') return null;
      const size = Math.PI - 10 ** random.between(-16, -1);
      return fromVector(from, random.direction().map((component) => component * size));
    },
  },
  {
    name: 'matrices off by up to 1e-2', bits: 300,
    numbers: (from, random) => (from.representation === 'dcm' ? expressed(CONVENTIONS.quaternion, from, random.rotation()).map((element) => element + random.between(-5e-3, 5e-3)) : null),
  },
  {
    name: 'quaternions of norm 1e-150 to 1e150', bits: 1500,
    numbers: (from, random) => {
      if (from.representation !== 'quaternion') return null;
      const norm = 10 ** random.between(-150, 150);
      return random.rotation().map((component) => component * norm);
    },
  },
];
