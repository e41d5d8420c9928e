/** Who may do what: one table, enforced by the server, tested cell by cell, shown in the console as help. */
export const ROLES = ['administrator', 'integrator', 'engineer', 'reviewer'] as const;
export type Role = (typeof ROLES)[number];

/** `all`: everything there is; `own`: what belongs to the caller; `none`: refused. */
export type Reach = 'all' | 'own' | 'none';

export const PERMISSIONS = {
  'attitude.compute': { title: 'Convert and check attitudes', administrator: 'all', integrator: 'all', engineer: 'all', reviewer: 'none' },
  'conventions.read': { title: 'Read conventions', administrator: 'all', integrator: 'all', engineer: 'all', reviewer: 'all' },
  'keys.read': { title: 'List API keys', administrator: 'all', integrator: 'own', engineer: 'own', reviewer: 'none' },
  'keys.issue': { title: 'Issue API keys', administrator: 'all', integrator: 'none', engineer: 'none', reviewer: 'none' },
  'keys.revoke': { title: 'Revoke API keys', administrator: 'all', integrator: 'none', engineer: 'none', reviewer: 'none' },
  'history.read': { title: 'Read the request history', administrator: 'all', integrator: 'all', engineer: 'own', reviewer: 'all' },
  'history.settings': { title: 'Change what the history keeps', administrator: 'all', integrator: 'none', engineer: 'none', reviewer: 'none' },
  'runs.read': { title: 'Read runs', administrator: 'all', integrator: 'all', engineer: 'own', reviewer: 'all' },
  'usage.read': { title: 'Read usage by key and role', administrator: 'all', integrator: 'own', engineer: 'own', reviewer: 'all' },
  'limits.read': { title: 'Read the limits of roles', administrator: 'all', integrator: 'all', engineer: 'all', reviewer: 'all' },
  'limits.change': { title: 'Change limits of roles and keys', administrator: 'all', integrator: 'none', engineer: 'none', reviewer: 'none' },
  'people.read': { title: 'List people', administrator: 'all', integrator: 'none', engineer: 'none', reviewer: 'none' },
} as const satisfies Record<string, { title: string } & Record<Role, Reach>>;

export type Permission = keyof typeof PERMISSIONS;

export function reachOf(role: Role, permission: Permission): Reach {
  return PERMISSIONS[permission][role];
}
