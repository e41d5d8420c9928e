import { z } from 'zod';
import { LARGEST_COMPONENT } from '../attitude/refuse-out-of-range.ts';
import { endpoint } from './endpoint.ts';
import { ATTITUDES_PER_CALL } from './limits.ts';

const within = `must be a number within ±${LARGEST_COMPONENT}`;
const number = z.number({ error: within }).min(-LARGEST_COMPONENT, { error: within }).max(LARGEST_COMPONENT, { error: within });
const vector = z.tuple([number, number, number], { error: 'must hold three numbers, x, y, z' });
const vectorOut = z.tuple([z.number(), z.number(), z.number()]);

const state = z.strictObject({
  velocity: vector.meta({ description: 'm/s, of the centre of mass relative to an inertial frame.' }),
  angularVelocity: vector.meta({ description: 'rad/s.' }),
  velocityDerivative: vector.meta({ description: 'm/s²: derivatives of the components as they stand.' }),
  angularVelocityDerivative: vector.meta({ description: 'rad/s².' }),
  force: vector.optional().meta({ description: 'N, to be compared with what the motion takes.' }),
  moment: vector.optional().meta({ description: 'N m about the centre of mass, to be compared.' }),
});

export const rigidBodyInput = z.strictObject({
  mass: number.positive({ error: 'must be greater than 0, in kg' }),
  inertia: z.tuple([vector, vector, vector], { error: 'must be three rows of three numbers, in kg m²' }).meta({ description: 'Inertia matrix about the centre of mass in the same right-handed body axes, kg m²: moments on the diagonal, negative products beside it ([0][2] is −Ixz).' }),
  symmetricAircraft: z.boolean().optional().meta({ description: 'true: refuse the matrix unless Ixy = Iyz = 0.' }),
  states: z.array(state).min(1, { error: 'must hold at least one state' }),
}).meta({ id: 'RigidBodyInput' });

export const rigidBodyOutput = z.strictObject({
  forces: z.array(vectorOut).meta({ description: 'N: m (v̇ + ω × v), the sum of all external forces, weight among them.' }),
  moments: z.array(vectorOut).meta({ description: 'N m: I ω̇ + ω × I ω.' }),
  residuals: z.array(z.strictObject({ force: vectorOut.nullable(), moment: vectorOut.nullable() })).optional().meta({ description: 'Given less computed, where a state gives a force or a moment.' }),
  inertia: z.strictObject({
    principalMoments: z.tuple([z.number(), z.number(), z.number()]).meta({ description: 'kg m², least first.' }),
    symmetricAircraft: z.boolean(), statement: z.string(),
  }),
  engine: z.string(),
}).meta({ id: 'RigidBodyOutput' });

export const rigidBodyEndpoint = endpoint({
  id: 'computeRigidBody', method: 'post', path: '/rigid-body', tag: 'Attitude',
  summary: 'Forces and moments that a rigid body’s motion takes, in body axes',
  description: `Newton’s and Euler’s equations. An inertia matrix that no body can have is refused. Up to ${ATTITUDES_PER_CALL.toLocaleString('en')} states a call; each counts as an attitude.`,
  auth: 'caller', permission: 'attitude.compute', recordsSessions: true,
  body: rigidBodyInput, status: 200, response: rigidBodyOutput, problems: [400, 401, 403, 413, 415, 422, 429, 503],
  example: {
    mass: 9300, inertia: [[12875, 0, -1331], [0, 75674, 0], [-1331, 0, 85552]],
    states: [{ velocity: [120, 3, 9], angularVelocity: [0.31, -0.12, 0.07], velocityDerivative: [0.4, -0.2, 1.1], angularVelocityDerivative: [0.4, -0.05, 0.02] }],
  },
});

export type RigidBodyInput = z.output<typeof rigidBodyInput>;
export type RigidBodyOutput = z.output<typeof rigidBodyOutput>;
