import { z } from 'zod';
import { conventionFacets, conventionReference } from './convention.ts';
import { endpoint } from './endpoint.ts';
import { ATTITUDES_PER_CALL, CROSS_CHECKED_PER_CALL } from './limits.ts';
import { STREAMED_TYPES } from './media-types.ts';
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

const inQuery = (which: string) => z.string().optional().meta({ description: `${which}, where the body is only rows: the id of a preset, or a convention as JSON. JSON bodies state it themselves.`, examples: ['aircraft-quaternion'] });

/** What the query says where the body is only rows. */
export const convertQuery = z.strictObject({
  from: inQuery('Convention of the body'),
  to: inQuery('Convention of the answer'),
  repair: z.enum(['none', 'nearest']).optional().meta({ description: 'As options.repair of a JSON body.' }),
  warnWithinDeg: z.string().regex(/^(?:90(?:\.0+)?|[1-8]?\d(?:\.\d+)?)$/, { error: 'must be a number from 0 to 90' }).optional().meta({ description: 'As options.warnWithinDeg of a JSON body.' }),
});

/** A convention that the query carries as JSON, under the name of its parameter. */
export const streamedConvention = z.strictObject({ from: conventionReference.optional(), to: conventionReference.optional() });

export const convertEndpoint = endpoint({
  id: 'convertAttitudes', method: 'post', path: '/convert', tag: 'Attitude',
  summary: 'Convert attitudes between two conventions',
  description: [
    `Up to ${ATTITUDES_PER_CALL.toLocaleString('en')} attitudes a JSON call. One bad attitude refuses the batch and names every bad index (first 100). 90 given in degrees is exact gimbal lock; the double nearest to π/2 given in radians is not.`,
    `Body and answer may also be rows alone, any of these to any: application/x-ndjson (an array a line; the answer's last line is an object with count and warnings), text/csv (RFC 4180; \`header=present\` where the first line names the columns) and application/octet-stream (little-endian float64, nothing between the rows). Content-Type and Accept choose; conventions stand in the query. Rows to rows are streamed, as many as the month's quota allows: read while you send. With JSON on one side the call is a batch like any other.`,
    `What is wrong in the first MiB is refused with a problem document. A bad row further on ends the answer where its row would stand: NDJSON with \`{"problem":{…,"row":n}}\`, CSV with a line \`problem,<code>,<row>,"<detail>"\`, float64 with a row of NaN; the trailer Dextral-Problem says \`<code>;row=<n>\`, and the history keeps it. The rows before it were answered and are metered. Trailer Dextral-Warnings counts warnings by code.`,
  ].join('\n\n'),
  auth: 'caller', permission: 'attitude.compute', recordsSessions: true,
  query: convertQuery, body: convertInput, rowTypes: STREAMED_TYPES, status: 200, response: convertOutput,
  problems: [400, 401, 403, 406, 413, 415, 422, 429, 503],
  example: { from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-quaternion' }, attitudes: [[30, 10, 20]], options: { readings: true } },
});

export type ConvertInput = z.output<typeof convertInput>;
export type ConvertOutput = z.output<typeof convertOutput>;
