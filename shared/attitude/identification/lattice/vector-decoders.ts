import { ANGLE_UNITS, MAPS, type AngleUnit, type Maps } from '../../convention.ts';
import type { Decoder, Facets, NumbersAre, Reader, Statement } from './decoder.ts';
import { writeRotation } from './rotation-of-quaternion.ts';
import { IDENTITY_TURN } from './turns.ts';

/**
 * Three numbers along the rotation axis, and four that hold the axis and the angle: each way to read them is a function
 * of the length alone. R(q) with q = (cos a/2, n sin a/2) is the matrix of "reference-to-body"; the other sense is its
 * transpose.
 */
type Length = (length: number) => readonly [w: number, perLength: number];

/** n times the angle in a unit, or times a multiple of it. */
const byAngle = (unit: AngleUnit, multiple: number): Length => {
  const half = (unit === 'deg' ? Math.PI / 360 : 0.5) / multiple;
  return (length) => {
    const a = length * half;
    return [Math.cos(a), length < 1e-12 ? half : Math.sin(a) / length];
  };
};

/** n tan(angle / divisor): q is (1, n tan(angle / divisor)) raised to divisor / 2. */
const byTangent = (divisor: 1 | 2 | 4 | 8): Length => {
  if (divisor === 2) return () => [1, 1];
  if (divisor === 4) return (t) => [1 - t * t, 2];
  const power = divisor / 2;
  return (t) => {
    const a = Math.atan(t) * power;
    return [Math.cos(a), t < 1e-12 ? power : Math.sin(a) / t];
  };
};

/** A hair more than 1, for a vector part of a half turn that carries noise. */
const LONGEST_VECTOR_PART = 1.01;

function vectorReader(ofLength: Length, longest = Infinity): Reader {
  return {
    width: 3,
    // A vector part has no slope with its scale at a half turn, and its length is bounded: a scale of it is not looked for.
    scalable: longest === Infinity,
    read(numbers, count, factor, m) {
      for (let i = 0; i < count; i++) {
        const x = numbers[3 * i]! * factor, y = numbers[3 * i + 1]! * factor, z = numbers[3 * i + 2]! * factor;
        const length = Math.sqrt(x * x + y * y + z * z);
        if (length > longest) return false;
        const [w, s] = ofLength(length);
        writeRotation(w, s * x, s * y, s * z, m, 9 * i);
      }
      return true;
    },
  };
}

/** Both senses of one reader, each under every name that means the same numbers. */
function bothSenses(reader: Reader, names: readonly ((maps: Maps) => { readonly facets: Facets; readonly numbersAre?: NumbersAre })[]): Decoder[] {
  return MAPS.map((maps) => ({
    reader,
    transposed: maps === 'body-to-reference',
    statements: names.map((name): Statement => ({ ...name(maps), left: IDENTITY_TURN, right: IDENTITY_TURN })),
  }));
}

const MULTIPLES = [[1, undefined], [0.5, 'half-angle'], [2, 'double-angle']] as const;
const named = (numbersAre: NumbersAre | undefined) => (numbersAre ? { numbersAre } : {});

const rotationVectors = ANGLE_UNITS.flatMap((unit) => MULTIPLES.flatMap(([multiple, numbersAre]) =>
  bothSenses(vectorReader(byAngle(unit, multiple)), [(maps) => ({ facets: { representation: 'rotation-vector', maps, unit }, ...named(numbersAre) })])));

const mrp = (maps: Maps): Facets => ({ representation: 'mrp', maps, shadow: 'any' });
const gibbs = (maps: Maps): Facets => ({ representation: 'gibbs', maps });

const tangents = [
  ...bothSenses(vectorReader(byTangent(4)), [(maps) => ({ facets: mrp(maps) }), (maps) => ({ facets: gibbs(maps), numbersAre: 'half-angle' })]),
  ...bothSenses(vectorReader(byTangent(2)), [(maps) => ({ facets: gibbs(maps) }), (maps) => ({ facets: mrp(maps), numbersAre: 'double-angle' })]),
  ...bothSenses(vectorReader(byTangent(1)), [(maps) => ({ facets: gibbs(maps), numbersAre: 'double-angle' })]),
  ...bothSenses(vectorReader(byTangent(8)), [(maps) => ({ facets: mrp(maps), numbersAre: 'half-angle' })]),
];

/** A vector part says nothing of where the scalar would stand, and Shuster's product turns the sense round. */
const vectorParts = bothSenses(
  vectorReader((length) => [Math.sqrt(Math.max(0, 1 - length * length)), 1], LONGEST_VECTOR_PART),
  (['first', 'last'] as const).flatMap((scalar) => (['hamilton', 'shuster'] as const).map((product) => (maps: Maps) => ({
    facets: { representation: 'quaternion' as const, scalar, product, maps: product === 'hamilton' ? maps : opposite(maps), sign: 'scalar-non-negative' as const },
    numbersAre: 'vector-part' as const,
  }))),
);

function opposite(maps: Maps): Maps {
  return maps === 'body-to-reference' ? 'reference-to-body' : 'body-to-reference';
}

export const VECTOR_DECODERS: readonly Decoder[] = [...rotationVectors, ...tangents, ...vectorParts];

/** How far an axis may be from unit length before the four numbers are no axis and angle. */
const AXIS_SLACK = 0.02;

function axisAngleReader(unit: AngleUnit, multiple: number): Reader {
  const half = (unit === 'deg' ? Math.PI / 360 : 0.5) / multiple;
  return {
    width: 4,
    scalable: true,
    read(numbers, count, factor, m) {
      for (let i = 0; i < count; i++) {
        const x = numbers[4 * i]!, y = numbers[4 * i + 1]!, z = numbers[4 * i + 2]!, angle = numbers[4 * i + 3]! * factor;
        const length = Math.sqrt(x * x + y * y + z * z);
        if (Math.abs(length - 1) > AXIS_SLACK && (length > 0 || angle !== 0)) return false;
        const s = length > 0 ? Math.sin(half * angle) / length : 0;
        writeRotation(Math.cos(half * angle), s * x, s * y, s * z, m, 9 * i);
      }
      return true;
    },
  };
}

export const AXIS_ANGLE_DECODERS: readonly Decoder[] = ANGLE_UNITS.flatMap((unit) => MULTIPLES.flatMap(([multiple, numbersAre]) =>
  bothSenses(axisAngleReader(unit, multiple), [(maps) => ({ facets: { representation: 'axis-angle', maps, unit }, ...named(numbersAre) })])));
