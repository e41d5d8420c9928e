import { reachOf, type Permission, type Role } from '#shared/api/roles.ts';
import type { KeyLimits } from '#server/db/repositories/api-keys.ts';
import { DomainError } from './errors.ts';

/** Who is asking: a pipeline with an API key, or a person signed in to the console. */
export interface Caller {
  readonly kind: 'key' | 'session';
  readonly role: Role;
  /** The person whose calls and things these are: the key's owner, or the person signed in. */
  readonly ownerId: string;
  readonly keyId: string | null;
  readonly personId: string | null;
  readonly sessionId: string | null;
  /** Limits of the key that are tighter than its role's. */
  readonly keyLimits: KeyLimits | null;
}

/** Whose use is metered: the key, or the person signed in. */
export const subjectOf = ({ keyId, ownerId }: Caller): string => keyId ?? ownerId;

/**
 * What the caller may reach of what a permission covers: null for everything, else the owner whose things they are.
 * The result belongs into the query, so that nothing is fetched that the caller may not see.
 * @throws DomainError `not-allowed`.
 */
export function scopeOf(caller: Caller, permission: Permission): string | null {
  const reach = reachOf(caller.role, permission);
  if (reach === 'none') throw new DomainError('not-allowed', `The role ${caller.role} may not do this (${permission}).`);
  return reach === 'all' ? null : caller.ownerId;
}
