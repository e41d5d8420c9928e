import type { Role } from '#shared/api/roles.ts';

/**
 * The demo's invented programme: the Sallowtern survey aircraft, built from units of suppliers that do not exist.
 * Nothing here stands for a real company, aircraft or person.
 */
export const PROGRAMME = { name: 'Sallowtern', description: 'A survey aircraft with units of five suppliers, each with a convention of its own.' } as const;

export interface ScenarioPerson {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

/** The programme's own people, then the suppliers'. */
export const PEOPLE: readonly ScenarioPerson[] = [
  { name: 'Ilse Vantorre', email: 'ilse.vantorre@sallowtern.example', role: 'administrator' },
  { name: 'Tomasz Ferreby', email: 'tomasz.ferreby@sallowtern.example', role: 'integrator' },
  { name: 'Amina Okell', email: 'amina.okell@quillfeather.example', role: 'engineer' },
  { name: 'Joris Penhallam', email: 'joris.penhallam@teaselwick.example', role: 'engineer' },
  { name: 'Wendela Prue', email: 'wendela.prue@marrowfen.example', role: 'engineer' },
  { name: 'Mateus Corliss', email: 'mateus.corliss@harvenook.example', role: 'engineer' },
  { name: 'Edda Marchant', email: 'edda.marchant@lampwright.example', role: 'engineer' },
  { name: 'Reva Lindqvist', email: 'reva.lindqvist@sallowtern.example', role: 'reviewer' },
];

export interface ScenarioKey {
  readonly name: string;
  readonly role: Role;
  /** E-mail address of the person whose pipeline it serves. */
  readonly owner: string;
  /** Whether demo.json gives its secret away; the others show how a used, expiring or revoked key looks. */
  readonly published: boolean;
  readonly issuedDaysAgo: number;
  readonly revokedDaysAgo?: number;
  readonly expiresInDays?: number;
}

export const KEYS: readonly ScenarioKey[] = [
  { name: 'Autopilot pipeline', role: 'engineer', owner: 'amina.okell@quillfeather.example', published: true, issuedDaysAgo: 44 },
  { name: 'Integration rig', role: 'integrator', owner: 'tomasz.ferreby@sallowtern.example', published: true, issuedDaysAgo: 43 },
  { name: 'Gimbal pipeline', role: 'engineer', owner: 'joris.penhallam@teaselwick.example', published: false, issuedDaysAgo: 40, expiresInDays: 12 },
  { name: 'Simulator nightly', role: 'engineer', owner: 'wendela.prue@marrowfen.example', published: false, issuedDaysAgo: 38 },
  { name: 'Inertial unit acceptance', role: 'engineer', owner: 'mateus.corliss@harvenook.example', published: false, issuedDaysAgo: 36 },
  { name: 'Ground display build', role: 'engineer', owner: 'edda.marchant@lampwright.example', published: false, issuedDaysAgo: 30, expiresInDays: 60 },
  { name: 'Bench laptop', role: 'engineer', owner: 'joris.penhallam@teaselwick.example', published: false, issuedDaysAgo: 41, revokedDaysAgo: 17 },
];
