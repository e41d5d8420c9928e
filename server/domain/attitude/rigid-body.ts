import type { RigidBodyInput, RigidBodyOutput } from '#shared/api/rigid-body.ts';
import { inertiaFault, isSymmetricAircraft, principalMoments } from '#shared/attitude/rigid-body/inertia.ts';
import { newtonEuler } from '#shared/attitude/rigid-body/newton-euler.ts';
import { DomainError } from '../errors.ts';
import type { Meter } from '../meter.ts';
import { ENGINE } from './engine.ts';

type Vector = [number, number, number];

/** Forces and moments of each state, and what is left of those given. */
export function rigidBody({ mass, inertia, symmetricAircraft, states }: RigidBodyInput, meter: Meter): RigidBodyOutput {
  meter.spend(states.length, '/states');
  const fault = inertiaFault(inertia);
  if (fault) throw impossible(fault.at ? `/inertia/${fault.at.join('/')}` : '/inertia', fault.message);
  const symmetric = isSymmetricAircraft(inertia);
  if (symmetricAircraft && !symmetric) {
    const [i, j] = Math.abs(inertia[0][1]) > Math.abs(inertia[1][2]) ? [0, 1] : [1, 2];
    throw impossible(`/inertia/${i}/${j}`, `is ${inertia[i as 0]![j as 1]}; with symmetricAircraft, Ixy and Iyz must be 0`);
  }
  const computed = states.map((state) => newtonEuler(mass, inertia, state));
  const compared = states.some(({ force, moment }) => force !== undefined || moment !== undefined);
  return {
    forces: computed.map(({ force }) => [...force] as Vector),
    moments: computed.map(({ moment }) => [...moment] as Vector),
    ...(compared ? { residuals: states.map(({ force, moment }, i) => ({ force: less(force, computed[i]!.force), moment: less(moment, computed[i]!.moment) })) } : {}),
    inertia: {
      principalMoments: principalMoments(inertia), symmetricAircraft: symmetric,
      statement: symmetric ? 'Ixy = Iyz = 0: the body’s x-z plane is a plane of symmetry, as of an ordinary aircraft.' : 'Ixy or Iyz is not 0: the body’s x-z plane is no plane of symmetry, and the equations that leave them out do not hold.',
    },
    engine: ENGINE,
  };
}

const less = (given: Vector | undefined, computed: readonly number[]): Vector | null => (given === undefined ? null : given.map((component, k) => component - computed[k]! + 0) as Vector);
const impossible = (pointer: string, message: string): DomainError => new DomainError('impossible-inertia', `${pointer} ${message}.`, [{ pointer, message }]);
