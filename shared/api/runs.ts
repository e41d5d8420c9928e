import { z } from 'zod';
import { RATE_UNITS } from '../attitude/rates/rate.ts';
import { warning } from './attitude.ts';
import { pageQuery, timestamp } from './common.ts';
import { conventionFacets, conventionReference } from './convention.ts';
import { endpoint } from './endpoint.ts';
import { identification } from './identify.ts';
import { attitudeRows, numberRows } from './numbers.ts';
import { rateFacets, rateReference } from './rates.ts';

const toleranceUnit = z.enum(['deg', 'rad', 'arcsec']);
const tolerance = z.strictObject({
  angle: z.number({ error: 'must be a number greater than 0' }).positive({ error: 'must be greater than 0' }), unit: toleranceUnit,
}).meta({ id: 'Tolerance' });
const verdict = z.enum(['pass', 'fail']);
const worst = z.strictObject({
  index: z.int().nonnegative(), angle: z.number(), unit: toleranceUnit,
  axisBody: z.tuple([z.number(), z.number(), z.number()]).meta({ description: 'Unit axis in forward, right, down: the rotation by the angle about it carries the expected attitude into the actual one.' }),
}).meta({ id: 'WorstError' });
const statistics = z.strictObject({ rms: z.number(), median: z.number(), p95: z.number(), max: z.number(), unit: toleranceUnit }).meta({ id: 'ErrorStatistics', description: 'Of the error angles; percentiles by nearest rank.' });
const failures = z.array(z.strictObject({ index: z.int().nonnegative(), angle: z.number() })).max(100).meta({ description: 'The first 100 attitudes off by more than the tolerance, with the angle in its unit.' });

const label = z.string().trim().min(1, { error: 'must not be empty' }).max(120, { error: 'must have at most 120 characters' });
const commit = z.string().regex(/^[0-9a-fA-F]{4,64}$/, { error: 'must be a commit id: 4 to 64 hexadecimal digits' });
const listed = z.strictObject({ convention: conventionReference, attitudes: attitudeRows });

export const verifyInput = z.strictObject({
  expected: listed, actual: listed, tolerance,
  repair: z.enum(['none', 'nearest']).optional().meta({ description: 'What to do with numbers that are no rotation by more than 1e-6, such as quaternions of four digits: refuse them (none, the policy when absent) or take the nearest rotation and warn.' }),
  diagnose: z.boolean().optional().meta({ description: 'Where the verdict is fail, also say which mistakes would explain the actual attitudes. The noise is taken as a fifth of the tolerance.' }),
  times: z.array(z.number({ error: 'must be a finite number' })).optional().meta({ description: 'Seconds, increasing, one for each attitude; with them a diagnosis can find a time lag.' }),
  label: label.optional().meta({ description: 'What was checked; runs can be found by it.' }),
  commit: commit.optional().meta({ description: 'The commit of the code that computed the actual attitudes.' }),
}).meta({ id: 'VerifyInput' });

export const verifyOutput = z.strictObject({
  verdict, run: z.string().meta({ description: 'Id of the stored run.' }), count: z.int(), failed: z.int(), worst, statistics, failures,
  summary: z.string().meta({ description: 'The worst error in a plain sentence.' }), engine: z.string(),
  warnings: z.array(warning).optional().meta({ description: 'What was repaired.' }),
  diagnosis: identification.optional(),
}).meta({ id: 'VerifyOutput' });

export const verifyEndpoint = endpoint({
  id: 'verifyAttitudes', method: 'post', path: '/verify', tag: 'Attitude',
  summary: 'Verify attitudes that code computed against expected ones',
  description: 'The error is the angle of the rotation between the two attitudes, never a difference of angles. The verdict is kept as a run.',
  auth: 'caller', permission: 'attitude.compute', recordsSessions: true,
  body: verifyInput, status: 200, response: verifyOutput, problems: [400, 401, 403, 413, 415, 422, 429, 503],
  example: {
    expected: { convention: { preset: 'aircraft-euler-deg' }, attitudes: [[30, 10, 20]] },
    actual: { convention: { preset: 'aircraft-quaternion' }, attitudes: [[0.9515, 0.1449, 0.1277, 0.2393]] },
    tolerance: { angle: 0.05, unit: 'deg' }, repair: 'nearest', label: 'Autopilot attitude', commit: '4f9d2c1',
  },
});

const rateUnit = z.enum(RATE_UNITS);
const rateTolerance = z.strictObject({ rate: z.number({ error: 'must be a number greater than 0' }).positive({ error: 'must be greater than 0' }), unit: rateUnit }).meta({ id: 'RateTolerance' });
const worstRate = z.strictObject({
  index: z.int().nonnegative(), rate: z.number(), unit: rateUnit,
  axisBody: z.tuple([z.number(), z.number(), z.number()]).meta({ description: 'Unit direction in forward, right, down of the actual angular velocity less the expected one.' }),
}).meta({ id: 'WorstRateError' });
const rateStatistics = z.strictObject({ rms: z.number(), median: z.number(), p95: z.number(), max: z.number(), unit: rateUnit }).meta({ id: 'RateErrorStatistics' });
const rateFailures = z.array(z.strictObject({ index: z.int().nonnegative(), rate: z.number() })).max(100);
const listedRates = z.strictObject({ rate: rateReference, rates: numberRows });

export const verifyRatesInput = z.strictObject({
  attitude: listed.meta({ description: 'The attitudes at which the rates stand, one for each.' }),
  expected: listedRates, actual: listedRates, tolerance: rateTolerance,
  label: label.optional(), commit: commit.optional(),
}).meta({ id: 'VerifyRatesInput' });

export const verifyRatesOutput = z.strictObject({
  verdict, run: z.string(), count: z.int(), failed: z.int(), worst: worstRate, statistics: rateStatistics, failures: rateFailures, summary: z.string(), engine: z.string(),
}).meta({ id: 'VerifyRatesOutput' });

export const verifyRatesEndpoint = endpoint({
  id: 'verifyRates', method: 'post', path: '/verify-rates', tag: 'Attitude',
  summary: 'Verify rates that code computed against expected ones',
  description: 'The error is the length of the difference of the two angular velocities, whatever forms the rates come in; never a difference of Euler rates. The verdict is kept as a run.',
  auth: 'caller', permission: 'attitude.compute', recordsSessions: true,
  body: verifyRatesInput, status: 200, response: verifyRatesOutput, problems: [400, 401, 403, 413, 415, 422, 429, 503],
  example: {
    attitude: { convention: { preset: 'aircraft-euler-deg' }, attitudes: [[0, 0, 35]] },
    expected: { rate: { rate: 'euler', unit: 'deg/s' }, rates: [[9, 0, 0]] }, actual: { rate: { rate: 'body', unit: 'deg/s' }, rates: [[0, 5.162, 7.372]] },
    tolerance: { rate: 0.01, unit: 'deg/s' }, label: 'Rate gyros',
  },
});

const ofRun = {
  id: z.string(), at: timestamp, verdict, label: z.string().nullable(), commit: z.string().nullable(),
  key: z.strictObject({ id: z.string(), name: z.string() }).nullable(), person: z.strictObject({ id: z.string(), name: z.string() }).nullable(),
  count: z.int(), failed: z.int(), summary: z.string(), engine: z.string(),
};
const attitudeRun = z.strictObject({
  kind: z.literal('attitudes'), ...ofRun, tolerance, worst, statistics, expected: conventionFacets, actual: conventionFacets, failures,
  diagnosis: identification.optional().meta({ description: 'Where one was asked for and the verdict is fail; at most the ten plainest explanations are kept.' }),
}).meta({ id: 'AttitudeRun' });
const rateRun = z.strictObject({
  kind: z.literal('rates'), ...ofRun, tolerance: rateTolerance, worst: worstRate, statistics: rateStatistics,
  attitude: conventionFacets, expected: rateFacets, actual: rateFacets, failures: rateFailures,
}).meta({ id: 'RateRun' });

export const run = z.discriminatedUnion('kind', [attitudeRun, rateRun]).meta({ id: 'Run' });

export const listRunsEndpoint = endpoint({
  id: 'listRuns', method: 'get', path: '/runs', tag: 'Runs', summary: 'Runs, newest first',
  auth: 'caller', permission: 'runs.read',
  query: z.strictObject({ ...pageQuery, verdict: verdict.optional(), label: z.string().max(120).optional(), key: z.string().optional() }),
  status: 200, response: z.strictObject({ items: z.array(run), nextCursor: z.string().nullable() }), problems: [400, 401, 403, 422, 429, 503],
});

const byId = z.strictObject({ id: z.string() });

export const getRunJUnitEndpoint = endpoint({
  id: 'getRunAsJUnit', method: 'get', path: '/runs/{id}.junit.xml', tag: 'Runs', summary: 'One run as JUnit XML, for a build’s test report',
  auth: 'caller', permission: 'runs.read', params: byId, status: 200, response: z.string(), contentType: 'application/xml', problems: [401, 403, 404, 429, 503],
});

export const getRunEndpoint = endpoint({
  id: 'getRun', method: 'get', path: '/runs/{id}', tag: 'Runs', summary: 'One run',
  auth: 'caller', permission: 'runs.read', params: byId, status: 200, response: run, problems: [401, 403, 404, 429, 503],
});

export type VerifyInput = z.output<typeof verifyInput>;
export type VerifyOutput = z.output<typeof verifyOutput>;
export type VerifyRatesInput = z.output<typeof verifyRatesInput>;
export type VerifyRatesOutput = z.output<typeof verifyRatesOutput>;
export type RunDocument = z.output<typeof run>;
