import { z } from 'zod';
import { REPRESENTATIONS } from '../attitude/convention.ts';
import { RATE_UNITS } from '../attitude/rates/rate.ts';
import { conventionFacets, conventionReference } from './convention.ts';
import { endpoint } from './endpoint.ts';
import { attitudeRows, numberRows } from './numbers.ts';
import { rateFacets, rateReference } from './rates.ts';

const angleUnit = z.enum(['deg', 'rad']);
const number = z.number({ error: 'must be a finite number' });
const axis = z.tuple([z.number(), z.number(), z.number()]);

const offset = z.strictObject({
  side: z.enum(['reference', 'body']),
  axis: axis.meta({ description: 'Unit axis: in north, east, down (or the named frame) for the reference side, in forward, right, down for the body side.' }),
  angle: z.number(), unit: angleUnit,
}).meta({ id: 'ConstantOffset', description: 'A constant rotation T = R(axis, angle) on one side: the numbers mean C T (reference) or T C (body) where C is the true attitude.' });

const numbersAre = z.enum(['half-angle', 'double-angle', 'vector-part']).meta({ description: 'The numbers are those of half or of twice the rotation, or only the vector part of the quaternion.' });
const statement = { convention: conventionFacets, numbersAre: numbersAre.optional(), constantOffset: z.array(offset).max(2).optional() };
const equivalentStatement = z.strictObject(statement).meta({ id: 'EquivalentStatement' });

const explanation = z.strictObject({
  ...statement,
  timeLag: z.strictObject({ seconds: z.number() }).optional().meta({ description: 'The numbers are those of the attitude so much earlier.' }),
  scale: z.number().optional().meta({ description: 'Every number is so many times what it should be.' }),
  edits: z.array(z.string()).meta({ description: 'What differs from the stated convention, one sentence each; empty where it is right as stated.' }),
  residual: z.strictObject({ rms: z.number(), max: z.number(), unit: angleUnit }).meta({ description: 'Of the angles that are left; √3 times the noise where the explanation is right.' }),
  sameNumbersAs: z.array(equivalentStatement).meta({ description: 'Other ways to state the same: equal numbers for every attitude. May be cut.' }),
}).meta({ id: 'Explanation' });

const discriminating = z.strictObject({
  attitude: z.array(z.number()).meta({ description: 'In the reference’s convention.' }),
  reading: z.string(),
  separates: z.strictObject({
    answers: z.int(), explanations: z.int(),
    predictions: z.array(z.strictObject({ numbers: z.array(z.number()), explanations: z.array(z.int()) })).meta({ description: 'What the box would list there, with the explanations, by their place, that say so.' }),
  }),
}).meta({ id: 'DiscriminatingAttitude', description: 'An attitude to put the box in that tells remaining explanations apart.' });

export const identification = z.strictObject({
  outcome: z.enum(['unique', 'ambiguous', 'none']).meta({ description: 'unique: one explanation, and no other fits the data within the noise. ambiguous: several do. none: nothing in the lattice does.' }),
  explanations: z.array(explanation).max(100).meta({ description: 'Fewest edits first; at most 100.' }),
  remaining: z.int().meta({ description: 'How many explanations remain in all.' }),
  unobservable: z.array(z.string()).meta({ description: 'What these data cannot tell.' }),
  discriminating: z.array(discriminating).max(3),
  runnerUp: z.strictObject({ convention: conventionFacets, numbersAre: numbersAre.optional(), edits: z.array(z.string()), residual: z.strictObject({ rms: z.number(), unit: angleUnit }), timesNoise: z.number() }).nullable()
    .meta({ description: 'The nearest explanation that was given up, and how many times the noise it is off.' }),
}).meta({ id: 'Identification' });

const rateUnit = z.enum(RATE_UNITS);
const rateStatement = { attitude: conventionFacets, rate: rateFacets };

const rateExplanation = z.strictObject({
  ...rateStatement,
  edits: z.array(z.string()).meta({ description: 'What differs from what was stated, one sentence each; empty where it is right.' }),
  residual: z.strictObject({ rms: z.number(), max: z.number(), unit: rateUnit }).meta({ description: 'Of the differences of the angular velocities.' }),
  sameNumbersAs: z.array(z.strictObject(rateStatement)),
}).meta({ id: 'RateExplanation' });

export const rateIdentification = z.strictObject({
  outcome: z.enum(['unique', 'ambiguous', 'none']),
  explanations: z.array(rateExplanation).max(100), remaining: z.int(), unobservable: z.array(z.string()), discriminating: z.array(discriminating).max(3),
}).meta({ id: 'RateIdentification', description: 'As Identification, of rates: a convention of the attitude and a form of rate stand in place of the convention. A test to make is an attitude to hold and a body axis to turn about, which its reading names.' });

const times = z.array(number).meta({ description: 'Seconds, increasing, one for each attitude; needed to find a time lag, and to identify rates at all.' });
const noise = z.strictObject({
  angle: number.nonnegative({ error: 'must not be negative' }).meta({ description: 'Standard deviation of each component of the error rotation vector; 0 means exact.' }),
  unit: angleUnit,
  rate: number.nonnegative({ error: 'must not be negative' }).optional().meta({ description: 'Of observed rates: standard deviation of each component of the angular velocity; the angle is then the noise of the reference.' }),
  rateUnit: rateUnit.optional(),
}).meta({ id: 'Noise' });

const observedAttitudes = z.strictObject({
  representation: z.enum(REPRESENTATIONS).meta({ description: 'What the box is said to list. A claim: every reading of so many numbers is tried.' }),
  numbers: attitudeRows,
  stated: conventionReference.optional().meta({ description: 'The convention on the interface sheet; the edits say how the numbers differ from it.' }),
}).meta({ id: 'ObservedAttitudes' });

const observedRates = z.strictObject({
  rates: numberRows,
  stated: z.strictObject({ attitude: conventionReference, rate: rateReference }).meta({ description: 'What the box is said to list, and the convention of the attitude that goes with it.' }),
}).meta({ id: 'ObservedRates' });

export const identifyInput = z.strictObject({
  reference: z.strictObject({ convention: conventionReference, attitudes: attitudeRows }),
  observed: z.union([observedAttitudes, observedRates], { error: 'must be observed attitudes, {"representation", "numbers", "stated"?}, or observed rates, {"rates", "stated"}' }),
  times: times.optional(),
  noise,
}).meta({ id: 'IdentifyInput' });

export const identifyEndpoint = endpoint({
  id: 'identifyConvention', method: 'post', path: '/identify', tag: 'Attitude',
  summary: 'Find every convention that a box’s numbers may follow',
  description: 'Compares the numbers with trusted attitudes under every reading, axis set, order, sign and unit, and with constant offsets, a time lag and a scale. Says what explains them, what else would, what the data cannot tell, and which attitude to test next. Rates are compared with those of the reference attitudes, which takes their times.',
  auth: 'caller', permission: 'attitude.compute', recordsSessions: true,
  body: identifyInput, status: 200, response: z.union([identification, rateIdentification]), problems: [400, 401, 403, 413, 415, 422, 429, 503],
  example: {
    reference: { convention: { preset: 'aircraft-euler-deg' }, attitudes: [[30, 10, 20], [120, -20, 40], [250, 30, -25], [340, 5, 60]] },
    observed: { representation: 'quaternion', numbers: [[0.1449, 0.1277, 0.2393, 0.9515], [0.3097, 0.2101, 0.8311, 0.4113], [0.0871, 0.3162, -0.7404, 0.5868], [0.4985, -0.0495, -0.1717, 0.8483]], stated: { preset: 'aircraft-quaternion' } },
    noise: { angle: 0.01, unit: 'deg' },
  },
});

export type IdentifyInput = z.output<typeof identifyInput>;
export type ObservedRates = z.output<typeof observedRates>;
export type ObservedAttitudes = z.output<typeof observedAttitudes>;
export type RateIdentificationDocument = z.output<typeof rateIdentification>;
export type IdentificationDocument = z.output<typeof identification>;
