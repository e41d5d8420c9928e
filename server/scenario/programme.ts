import type { Role } from '#shared/api/roles.ts';
import type { Convention } from '#shared/attitude/convention.ts';

/**
 * The demo's invented programme: the Petrel survey aircraft, built from units of suppliers that do not exist.
 * Nothing here stands for a real company, aircraft or person.
 */
export const PROGRAMME = { name: 'Petrel', description: 'A survey aircraft with units of five suppliers, each with a convention of its own.' } as const;

export interface ScenarioPerson {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

export const PEOPLE: readonly ScenarioPerson[] = [
  { name: 'Ilse Vantorre', email: 'ilse.vantorre@petrel.example', role: 'administrator' },
  { name: 'Tomasz Ferreby', email: 'tomasz.ferreby@petrel.example', role: 'integrator' },
  { name: 'Amina Okell', email: 'amina.okell@petrel.example', role: 'engineer' },
  { name: 'Joris Haldane', email: 'joris.haldane@petrel.example', role: 'engineer' },
  { name: 'Reva Lindqvist', email: 'reva.lindqvist@petrel.example', role: 'reviewer' },
];

export interface ScenarioUnit {
  readonly name: string;
  readonly supplier: string;
  readonly states: string;
  readonly convention: Convention;
}

/** What each unit's interface control document says, in facets. */
export const UNITS: readonly ScenarioUnit[] = [
  {
    name: 'Inertial unit', supplier: 'Harrow Sound Instruments', states: 'Attitude quaternion, scalar first, from body to north-east-down',
    convention: { representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'continuous' },
  },
  {
    name: 'Autopilot', supplier: 'Quillfeather Controls', states: 'Roll, pitch, yaw in radians',
    convention: { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'rad', order: [3, 2, 1], signs: [1, 1, 1], range: 'signed' },
  },
  {
    name: 'Camera gimbal', supplier: 'Oxbow Optomechanics', states: 'Quaternion, scalar last, from forward-left-up to east-north-up',
    convention: { representation: 'quaternion', reference: 'ENU', body: 'FLU', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' },
  },
  {
    name: 'Flight simulator', supplier: 'Marram Simulation', states: 'Matrix from north-west-up to forward-left-up, by columns',
    convention: { representation: 'dcm', reference: 'NWU', body: 'FLU', maps: 'reference-to-body', layout: 'column-major' },
  },
  {
    name: 'Ground display', supplier: 'Lantern Row Displays', states: 'Heading 0 to 360, pitch, bank in degrees',
    convention: { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'positive' },
  },
];

export interface ScenarioKey {
  readonly name: string;
  readonly role: Role;
  /** E-mail address of the person whose pipeline it serves. */
  readonly owner: string;
  /** Whether demo.json gives its secret away; the others show how a used or revoked key looks. */
  readonly published: boolean;
  readonly issuedDaysAgo: number;
  readonly revokedDaysAgo?: number;
  readonly expiresInDays?: number;
}

export const KEYS: readonly ScenarioKey[] = [
  { name: 'Autopilot pipeline', role: 'engineer', owner: 'amina.okell@petrel.example', published: true, issuedDaysAgo: 44 },
  { name: 'Integration rig', role: 'integrator', owner: 'tomasz.ferreby@petrel.example', published: true, issuedDaysAgo: 43 },
  { name: 'Gimbal pipeline', role: 'engineer', owner: 'joris.haldane@petrel.example', published: false, issuedDaysAgo: 40, expiresInDays: 12 },
  { name: 'Simulator nightly', role: 'engineer', owner: 'amina.okell@petrel.example', published: false, issuedDaysAgo: 38 },
  { name: 'Bench laptop', role: 'engineer', owner: 'joris.haldane@petrel.example', published: false, issuedDaysAgo: 41, revokedDaysAgo: 17 },
];
