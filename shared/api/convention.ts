import { z } from 'zod';
import { isBodyAxes, isReferenceAxes } from '../attitude/axes.ts';
import {
  ANGLE_RANGES, ANGLE_UNITS, MAPS, MATRIX_LAYOUTS, MOTIONS, MRP_SHADOWS, QUATERNION_PRODUCTS, QUATERNION_SIGNS,
  SCALAR_POSITIONS, SEQUENCES,
  type Convention,
} from '../attitude/convention.ts';

const referenceAxesError = 'must be three letters, x then y then z, one of N/S, one of E/W, one of U/D in any order (such as NED, ENU, NWU), or a named frame: ECEF, GCRF, ICRF, EME2000, TEME';
const referenceAxes = z.string({ error: referenceAxesError }).refine(isReferenceAxes, { error: referenceAxesError }).meta({ description: 'Reference axes, x then y then z: NED, ENU, NWU … (one of N/S, one of E/W, one of U/D, in any order), or a named frame such as ECEF.', examples: ['NED'] });

const bodyAxesError = 'must be three letters, x then y then z, one of F/B, one of R/L, one of U/D in any order (such as FRD, FLU)';
const bodyAxes = z.string({ error: bodyAxesError }).refine(isBodyAxes, { error: bodyAxesError }).meta({ description: 'Body axes, x then y then z: FRD, FLU … (one of F/B, one of R/L, one of U/D, in any order).', examples: ['FRD'] });

const between = { reference: referenceAxes, body: bodyAxes };
const maps = z.enum(MAPS).meta({ description: 'dcm: body-to-reference is v_ref = M v_body. quaternion (hamilton): body-to-reference is v_ref = R(q) v_body. The others: as the Hamilton quaternion (cos a/2, n sin a/2).' });
const unit = z.enum(ANGLE_UNITS);
const sign = z.union([z.literal(1), z.literal(-1)], { error: 'must be 1 or -1' });
const orderError = 'must hold each of 1, 2, 3 once: order[i] is the number of the applied rotation whose angle stands i-th in the list';
const rotationNumber = z.literal([1, 2, 3], { error: orderError });
const order = z.tuple([rotationNumber, rotationNumber, rotationNumber], { error: orderError })
  .refine((value) => new Set(value).size === 3, { error: orderError })
  .meta({ description: 'order[i] is the number of the applied rotation whose angle stands i-th in the list: [1,2,3] is the order applied.', examples: [[1, 2, 3]] });

/** A convention with every facet stated. */
export const conventionFacets = z.discriminatedUnion('representation', [
  z.strictObject({
    representation: z.literal('euler'), ...between,
    sequence: z.enum(SEQUENCES).meta({ description: 'Axes of the successive rotations, in the order applied.' }),
    motion: z.enum(MOTIONS), unit, order,
    signs: z.tuple([sign, sign, sign], { error: 'must hold three signs, each 1 or -1, aligned with the applied order' }).meta({ description: 'Number listed = sign × angle; aligned with the applied order.', examples: [[1, 1, 1]] }),
    range: z.enum(ANGLE_RANGES).meta({ description: 'Of the first applied angle on output: signed (−180, 180] or positive [0, 360).' }),
  }),
  z.strictObject({
    representation: z.literal('quaternion'), ...between,
    scalar: z.enum(SCALAR_POSITIONS), product: z.enum(QUATERNION_PRODUCTS), maps, sign: z.enum(QUATERNION_SIGNS).meta({ description: 'Binds output only.' }),
  }),
  z.strictObject({ representation: z.literal('dcm'), ...between, maps, layout: z.enum(MATRIX_LAYOUTS) }),
  z.strictObject({ representation: z.literal('rotation-vector'), ...between, maps, unit }),
  z.strictObject({ representation: z.literal('axis-angle'), ...between, maps, unit }),
  z.strictObject({ representation: z.literal('mrp'), ...between, maps, shadow: z.enum(MRP_SHADOWS) }),
  z.strictObject({ representation: z.literal('gibbs'), ...between, maps }),
]).meta({ id: 'ConventionFacets', description: 'A convention with every facet stated. Nothing has a default.' });

const presetReference = z.strictObject({ preset: z.string().meta({ examples: ['aircraft-euler-deg'] }) })
  .meta({ id: 'PresetReference', description: 'A preset by its id; see GET /conventions.' });
const interfaceReference = z.strictObject({ interface: z.string(), version: z.int().positive() })
  .meta({ id: 'InterfaceReference', description: 'A published interface version.' });

/** How a body names a convention: every facet, a preset id, or a published interface version. */
export const conventionReference = z.union([conventionFacets, presetReference, interfaceReference])
  .meta({ id: 'Convention', description: 'Every facet, a preset id, or a published interface version.' });

export type ConventionFacets = z.output<typeof conventionFacets>;
export type ConventionReference = z.output<typeof conventionReference>;

/** The schema's output is the core's type: this line stops compiling when they part. */
export const asCoreConvention = (facets: ConventionFacets): Convention => facets;
