import type { Convention, DcmConvention } from '../../convention.ts';
import { createConverter, type Converter } from '../../converter.ts';
import { frameRotation, multiply } from '../fit/small-matrix.ts';
import type { NumbersAre } from '../lattice/decoder.ts';
import type { Choice } from './statement-choice.ts';

/** Lists attitudes, given as v_FRD = C v_ref, as a box following a statement would. */
export class Predictor {
  readonly #choice: Choice;
  readonly #scale: number;
  readonly #converter: Converter;
  readonly #body: Float64Array;
  readonly #reference: Float64Array;

  /** @param standard - reference-to-body, row by row, standard axes. */
  constructor(choice: Choice, scale: number, standard: DcmConvention) {
    this.#choice = choice;
    this.#scale = scale;
    const { statement: { numbersAre }, convention } = choice;
    this.#converter = createConverter(standard, numbersAre ? rotationVectorBeside(convention) : convention, { warnWithinDeg: 0 });
    this.#body = offsetMatrix(choice.offsets.body);
    this.#reference = offsetMatrix(choice.offsets.reference);
  }

  /** Null where the representation cannot express the attitude. */
  listed(c: Float64Array): number[] | null {
    const { statement: { numbersAre }, convention } = this.#choice;
    let numbers: number[];
    try {
      numbers = [...this.#converter.convert(multiply(multiply(this.#body, c), this.#reference))];
    } catch {
      return null;
    }
    if (numbersAre) numbers = instead(convention, numbersAre, numbers);
    if (this.#scale === 1) return numbers;
    return convention.representation === 'axis-angle' ? [...numbers.slice(0, 3), numbers[3]! * this.#scale] : numbers.map((number) => number * this.#scale);
  }
}

const offsetMatrix = (offset: Choice['offsets']['body']): Float64Array => (offset ? frameRotation(offset.axis[0] * offset.angle, offset.axis[1] * offset.angle, offset.axis[2] * offset.angle) : frameRotation(0, 0, 0));

/** The rotation vector, rad, with the sense of the convention's own numbers. */
function rotationVectorBeside(convention: Convention): Convention {
  const { reference, body } = convention;
  const maps = 'maps' in convention ? convention.maps : 'body-to-reference';
  const turnedRound = convention.representation === 'quaternion' && convention.product === 'shuster';
  return { representation: 'rotation-vector', reference, body, unit: 'rad', maps: turnedRound ? (maps === 'body-to-reference' ? 'reference-to-body' : 'body-to-reference') : maps };
}

/** The numbers of half or twice the rotation, or its vector part, from its rotation vector. */
function instead(convention: Convention, numbersAre: NumbersAre, v: readonly number[]): number[] {
  const angle = Math.hypot(...v);
  const axis = angle === 0 ? [1, 0, 0] : v.map((component) => component / angle);
  const listed = angle * (numbersAre === 'half-angle' ? 0.5 : numbersAre === 'double-angle' ? 2 : 1);
  const along = (length: number): number[] => axis.map((component) => component * length);
  const unit = 'unit' in convention && convention.unit === 'deg' ? 180 / Math.PI : 1;
  switch (convention.representation) {
    case 'quaternion': {
      const vector = along(Math.sin(listed / 2));
      if (numbersAre === 'vector-part') return vector;
      return convention.scalar === 'first' ? [Math.cos(listed / 2), ...vector] : [...vector, Math.cos(listed / 2)];
    }
    case 'rotation-vector': return along(listed * unit);
    case 'axis-angle': return [...axis, listed * unit];
    case 'mrp': return along(Math.tan(listed / 4));
    case 'gibbs': return along(Math.tan(listed / 2));
    case 'dcm': {
      // R(n, a) of v ↦ q v q* is the transpose of the frame rotation; layout and sense are the convention's.
      const [x, y, z] = along(listed) as [number, number, number];
      const m = frameRotation(-x, -y, -z);
      return convention.layout === 'row-major' ? [...m] : [...m.map((_, k) => m[3 * (k % 3) + Math.floor(k / 3)]!)];
    }
    case 'euler': throw new Error('Euler angles are never taken for those of half or twice the rotation.');
  }
}
