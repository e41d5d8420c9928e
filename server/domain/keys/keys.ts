import { randomUUID } from 'node:crypto';
import type { ApiKeyDocument, IssueKeyInput } from '#shared/api/keys.ts';
import type { ApiKeysRepository } from '#server/db/repositories/api-keys.ts';
import { scopeOf, type Caller } from '../caller.ts';
import type { Clock } from '../clock.ts';
import { DomainError } from '../errors.ts';
import type { KeyRing } from './key-ring.ts';
import { presentKey } from './present-key.ts';
import { newSecret } from './secret.ts';

export interface KeysContext {
  readonly apiKeys: ApiKeysRepository;
  readonly keyRing: KeyRing;
  readonly clock: Clock;
}

export async function listKeys(context: KeysContext, caller: Caller): Promise<ApiKeyDocument[]> {
  return (await context.apiKeys.list(scopeOf(caller, 'keys.read'))).map(presentKey);
}

/** Issues a key that belongs to the caller. The secret is returned here and nowhere else. */
export async function issueKey(context: KeysContext, caller: Caller, input: IssueKeyInput): Promise<{ key: ApiKeyDocument; secret: string }> {
  const now = context.clock();
  const expiresAt = input.expiresAt === null ? null : Date.parse(input.expiresAt);
  if (expiresAt !== null && expiresAt <= now) {
    throw new DomainError('invalid-field', 'The key would have expired already.', [{ pointer: '/expiresAt', message: `must lie in the future; ${input.expiresAt} has passed` }]);
  }
  const { secret, prefix, hash } = newSecret();
  const id = randomUUID();
  await context.apiKeys.insert({
    id, name: input.name, prefix, secretHash: hash, role: input.role, ownerId: caller.ownerId, createdBy: caller.ownerId,
    createdAt: now, expiresAt, lastUsedAt: null, revokedAt: null,
    requestsPerMinute: null, attitudesPerMonth: null, attitudesPerCall: null, parallelRequests: null,
  });
  return { key: presentKey(await existing(context, id)), secret };
}

/** Revokes a key: committed and forgotten by the key ring before this returns, so the next call with it is refused. */
export async function revokeKey(context: KeysContext, id: string): Promise<ApiKeyDocument> {
  const key = await existing(context, id);
  if (!(await context.apiKeys.revoke(id, context.clock()))) {
    throw new DomainError('already-revoked', `The key ${key.prefix} was revoked before.`);
  }
  context.keyRing.forget(key.secretHash);
  return presentKey(await existing(context, id));
}

async function existing({ apiKeys }: KeysContext, id: string) {
  const key = await apiKeys.byId(id);
  if (!key) throw new DomainError('not-found', `There is no API key with the id "${id}".`);
  return key;
}
