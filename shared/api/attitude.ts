import { z } from 'zod';
import { conventionFacets, conventionReference } from './convention.ts';
import { endpoint } from './endpoint.ts';
import { ATTITUDES_PER_CALL, CROSS_CHECKED_PER_CALL } from './limits.ts';
import { attitudeRows } from './numbers.ts';

const worstCase = z.strictObject({
  index: z.int().nonnegative(),
  condition: z.number().nullable().optional().meta({ description: 'κ = 1/|cos(middle angle)| (1/|sin| where the first and third axes are the same): an attitude error δ shows up as at most κ·δ in the first and last angle. null at exact lock.' }),
  digitsLost: z.number().nullable().optional().meta({ description: 'log10 κ; null at exact lock.' }),
  marginDeg: z.number().optional().meta({ description: 'Angle left to gimbal lock, in degrees.' }),
  wellConditioned: z.strictObject({
    combination: z.enum(['first-minus-last', 'first-plus-last']),
    angle: z.number(),
    unit: z.enum(['deg', 'rad']),
  }).optional().meta({ description: 'The combination of first and last applied angle that stays well conditioned near lock.' }),
  defect: z.number().optional().meta({ description: 'Norm defect of a quaternion or orthogonality defect of a matrix that was repaired.' }),
}).meta({ id: 'WorstCase' });

export const warning = z.strictObject({
  code: z.enum(['near-gimbal-lock', 'severe-gimbal-lock', 'gimbal-lock', 'renormalised', 'reorthonormalised']),
  message: z.string(),
  count: z.int().positive(),
  indices: z.array(z.int().nonnegative()).max(100).meta({ description: 'The first 100.' }),
  worst: worstCase,
}).meta({ id: 'Warning' });

export const crossCheckReport = z.strictObject({
  maxUlp: z.number().meta({ description: 'Largest difference of a component from the exact one, in units of its last place. Half a unit is as near as a double can be. Differences below 1e-22, where components cancel, count as none.' }),
  maxAngleRad: z.number().meta({ description: 'Largest angle between the attitude answered and the exact one.' }),
  methods: z.array(z.strictObject({ method: z.string(), maxUlp: z.number().optional(), maxAngleRad: z.number() })),
}).meta({ id: 'CrossCheck' });

export const convertInput = z.strictObject({
  from: conventionReference,
  to: conventionReference,
  attitudes: attitudeRows,
  options: z.strictObject({
    readings: z.boolean().optional().meta({ description: 'Also say each attitude in a plain sentence.' }),
    crossCheck: z.boolean().optional().meta({ description: `Compute every answer again by independent code, in 64-digit arithmetic and with a general-purpose package, and report the differences. At most ${CROSS_CHECKED_PER_CALL.toLocaleString('en')} attitudes; it takes some milliseconds each.` }),
    repair: z.enum(['none', 'nearest']).optional().meta({ description: 'What to do with numbers that are no rotation by more than 1e-6: refuse them (none, the policy when absent) or take the nearest rotation.' }),
    warnWithinDeg: z.number().min(0).max(90).optional().meta({ description: 'Warn when an attitude comes closer to gimbal lock than this; 1° when absent.' }),
  }).optional(),
}).meta({ id: 'ConvertInput' });

export const convertOutput = z.strictObject({
  attitudes: z.array(z.array(z.number())),
  from: conventionFacets,
  to: conventionFacets,
  warnings: z.array(warning),
  worst: worstCase.optional().meta({ description: 'The attitude nearest to gimbal lock, where a warning tells of one.' }),
  readings: z.array(z.string()).optional(),
  crossCheck: crossCheckReport.optional(),
  engine: z.string().meta({ description: 'Name and version of the numerical core that answered.' }),
}).meta({ id: 'ConvertOutput' });

export const convertEndpoint = endpoint({
  id: 'convertAttitudes', method: 'post', path: '/convert', tag: 'Attitude',
  summary: 'Convert attitudes between two conventions',
  description: `Up to ${ATTITUDES_PER_CALL.toLocaleString('en')} attitudes a call. One bad attitude refuses the batch and names every bad index (first 100). 90 given in degrees is exact gimbal lock; the double nearest to π/2 given in radians is not.`,
  auth: 'caller', permission: 'attitude.compute', recordsSessions: true,
  body: convertInput, status: 200, response: convertOutput,
  problems: [400, 401, 403, 413, 415, 422, 429, 503],
  example: { from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-quaternion' }, attitudes: [[30, 10, 20]], options: { readings: true } },
});

export type ConvertInput = z.output<typeof convertInput>;
export type ConvertOutput = z.output<typeof convertOutput>;
