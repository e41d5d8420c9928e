import type { AngleUnit, Convention, Representation } from '../../convention.ts';
import type { Facets, NumbersAre } from '../lattice/decoder.ts';

/** A facet in which a statement differs from what was stated. */
export interface FacetEdit {
  readonly sentence: string;
}

const NAMES: Readonly<Record<Representation, string>> = {
  euler: 'Euler angles',
  quaternion: 'a quaternion',
  dcm: 'a direction cosine matrix',
  'rotation-vector': 'a rotation vector',
  'axis-angle': 'axis and angle',
  mrp: 'modified Rodrigues parameters',
  gibbs: 'a Gibbs vector',
};

const UNIT_NAMES: Readonly<Record<AngleUnit, string>> = { deg: 'degrees', rad: 'radians' };
const ORDINALS = ['first', 'second', 'third'];

type AnyFacets = Readonly<Record<string, unknown>>;

/** What a convention is taken to mean by saying nothing but its representation: the plainest of each (common practice). */
const PLAIN: AnyFacets = {
  sequence: 'ZYX', motion: 'intrinsic', order: [1, 2, 3], signs: [1, 1, 1], unit: 'rad', scalar: 'first', product: 'hamilton', layout: 'row-major', maps: 'body-to-reference',
};
const PLAIN_MATRIX: AnyFacets = { ...PLAIN, maps: 'reference-to-body' };

/** Facets that change what numbers mean, in the order they are spoken of. */
const MEANING: Readonly<Record<Representation, readonly string[]>> = {
  euler: ['unit', 'sequence', 'motion', 'order', 'signs'],
  quaternion: ['scalar', 'product', 'maps'],
  dcm: ['maps', 'layout'],
  'rotation-vector': ['unit', 'maps'],
  'axis-angle': ['unit', 'maps'],
  mrp: ['maps'],
  gibbs: ['maps'],
};

/** Facets of `representation` that the stated convention implies: its own, where it has them. */
export function impliedFacets(stated: Convention | null, representation: Representation): AnyFacets {
  const plain = representation === 'dcm' ? PLAIN_MATRIX : PLAIN;
  if (!stated) return plain;
  if (stated.representation === representation) return { ...plain, ...stated };
  const { maps, unit } = stated as { maps?: string; unit?: string };
  return { ...plain, ...(maps ? { maps } : {}), ...(unit ? { unit } : {}) };
}

/** How many edits a statement's facets are from the stated ones; each flipped sign counts. */
export function facetCost(facets: Facets, numbersAre: NumbersAre | undefined, stated: Convention | null, claimed: Representation): number {
  const representation = stated?.representation ?? claimed;
  const changed = facets.representation !== representation;
  const implied = impliedFacets(stated, facets.representation);
  let cost = changed ? 1 : 0;
  // A vector part in place of another vector is one slip, not two; and nothing tells where its scalar would stand.
  if (numbersAre && !(numbersAre === 'vector-part' && changed)) cost += 1;
  for (const name of MEANING[facets.representation]) cost += difference(name, (facets as unknown as AnyFacets)[name], implied[name]);
  return cost;
}

function difference(name: string, actual: unknown, implied: unknown): number {
  if (name === 'signs') return (actual as number[]).filter((sign, i) => sign !== (implied as number[])[i]).length;
  return same(actual, implied) ? 0 : 1;
}

const same = (a: unknown, b: unknown): boolean => (Array.isArray(a) ? a.join() === (b as unknown[]).join() : a === b);

/** One sentence for each facet that differs; nothing without a stated convention. */
export function facetSentences(facets: Facets, numbersAre: NumbersAre | undefined, stated: Convention | null): string[] {
  const sentences: string[] = [];
  if (stated && facets.representation !== stated.representation) {
    sentences.push(numbersAre === 'vector-part' ? `reads the vector part of a quaternion, stated ${NAMES[stated.representation]}` : `reads ${NAMES[facets.representation]}, stated ${NAMES[stated.representation]}`);
  } else if (numbersAre === 'vector-part') sentences.push('reads only the vector part of the quaternion');
  if (numbersAre === 'half-angle') sentences.push('the numbers are those of half the rotation');
  if (numbersAre === 'double-angle') sentences.push('the numbers are those of twice the rotation');
  if (!stated) return sentences;
  const implied = impliedFacets(stated, facets.representation);
  for (const name of MEANING[facets.representation]) {
    const actual = (facets as unknown as AnyFacets)[name];
    if (difference(name, actual, implied[name]) > 0) sentences.push(...sentencesFor(name, actual, implied[name]));
  }
  return sentences;
}

function sentencesFor(name: string, actual: unknown, stated: unknown): string[] {
  switch (name) {
    case 'unit': return [`reads ${UNIT_NAMES[actual as AngleUnit]}, stated ${UNIT_NAMES[stated as AngleUnit]}`];
    case 'sequence': return [`reads rotations about ${[...(actual as string)].join(', ')}, stated ${[...(stated as string)].join(', ')}`];
    case 'order': return [`reads the angles of rotations ${(actual as number[]).join(', ')} in this order, stated ${(stated as number[]).join(', ')}`];
    case 'signs': return (actual as number[]).flatMap((sign, i) => (sign === (stated as number[])[i] ? [] : [`the angle of the ${ORDINALS[i]} rotation has the opposite sign`]));
    case 'scalar': return [`reads scalar ${actual as string}, stated scalar ${stated as string}`];
    case 'product': return [`reads ${capital(actual as string)}'s product, stated ${capital(stated as string)}'s`];
    default: return [`reads ${actual as string}, stated ${stated as string}`];
  }
}

const capital = (name: string): string => name[0]!.toUpperCase() + name.slice(1);
