import { LOCAL_LEVEL_SETS, NAMED_FRAMES, BODY_SETS } from '../../../../../shared/attitude/axes.ts';
import {
  ANGLE_RANGES, ANGLE_UNITS, MAPS, MATRIX_LAYOUTS, MOTIONS, MRP_SHADOWS, NUMBERS_PER_ATTITUDE, ORDERS, QUATERNION_PRODUCTS, QUATERNION_SIGNS, SCALAR_POSITIONS, SEQUENCES,
  type Convention, type Representation,
} from '../../../../../shared/attitude/convention.ts';

export const REPRESENTATIONS = Object.keys(NUMBERS_PER_ATTITUDE) as Representation[];

const SIGNS = [[1, 1, 1], [1, 1, -1], [1, -1, 1], [1, -1, -1], [-1, 1, 1], [-1, 1, -1], [-1, -1, 1], [-1, -1, -1]] as const;
const maps = ['maps', MAPS] as const;
const unit = ['unit', ANGLE_UNITS] as const;

/** The facets of each representation beside its axes, with every value they can have. */
export const FACETS: Readonly<Record<Representation, readonly (readonly [facet: string, choices: readonly unknown[]])[]>> = {
  euler: [['sequence', SEQUENCES], ['motion', MOTIONS], unit, ['order', ORDERS], ['signs', SIGNS], ['range', ANGLE_RANGES]],
  quaternion: [['scalar', SCALAR_POSITIONS], ['product', QUATERNION_PRODUCTS], maps, ['sign', QUATERNION_SIGNS]],
  dcm: [maps, ['layout', MATRIX_LAYOUTS]],
  'rotation-vector': [maps, unit],
  'axis-angle': [maps, unit],
  mrp: [maps, ['shadow', MRP_SHADOWS]],
  gibbs: [maps],
};

export const REFERENCE_CHOICES: readonly string[] = [...new Set(['NED', 'ENU', 'NWU', ...LOCAL_LEVEL_SETS]), ...NAMED_FRAMES];
export const BODY_CHOICES: readonly string[] = [...new Set(['FRD', 'FLU', ...BODY_SETS])];

/** A statement in another representation that keeps every facet the two have in common and takes the first value of the others. */
export function inRepresentation(convention: Convention, representation: Representation): Convention {
  const before = convention as unknown as Record<string, unknown>;
  const facets = FACETS[representation].map(([facet, choices]) => [facet, choices.some((choice) => same(choice, before[facet])) ? before[facet] : facet === 'sequence' ? 'ZYX' : choices[0]]);
  return { representation, reference: convention.reference, body: convention.body, ...Object.fromEntries(facets) } as unknown as Convention;
}

export const same = (a: unknown, b: unknown): boolean => JSON.stringify(a) === JSON.stringify(b);
