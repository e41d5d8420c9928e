import type { Role } from '#shared/api/roles.ts';
import type { KeyLimits } from '#server/db/repositories/api-keys.ts';
import type { Caller } from '../caller.ts';
import { DomainError } from '../errors.ts';
import type { KeysContext } from '../keys/keys.ts';
import type { Limits, LimitTable } from './limit-table.ts';

export async function changeRoleLimits({ limits, clock }: { limits: LimitTable; clock: () => number }, caller: Caller, role: Role, changed: Limits): Promise<Limits & { role: Role }> {
  await limits.change({ role, ...changed }, caller.ownerId, clock());
  return { role, ...changed };
}

/** In force on the key's next call. */
export async function changeKeyLimits({ apiKeys, keyRing }: KeysContext, id: string, changed: KeyLimits): Promise<KeyLimits> {
  const key = await apiKeys.byId(id);
  if (!key) throw new DomainError('not-found', `There is no API key with the id "${id}".`);
  await apiKeys.setLimits(id, changed);
  keyRing.forget(key.secretHash);
  return changed;
}
