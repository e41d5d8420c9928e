import type { Database } from '../database.ts';
import type { ApiKeyRow } from '../models/api-key.ts';
import { select } from '../select.ts';

/** A key with the name of whoever issued it. */
export type ListedKey = ApiKeyRow & { readonly createdByName: string };

export type KeyLimits = Pick<ApiKeyRow, 'requestsPerMinute' | 'attitudesPerMonth' | 'attitudesPerCall' | 'parallelRequests'>;

export interface ApiKeysRepository {
  bySecretHash(secretHash: string): Promise<ApiKeyRow | null>;
  byId(id: string): Promise<ListedKey | null>;
  /** Newest first; only one owner's where that is given. */
  list(ownerId: string | null): Promise<ListedKey[]>;
  insert(key: ApiKeyRow): Promise<void>;
  setLimits(id: string, limits: KeyLimits): Promise<void>;
  /** False where the key was revoked before. */
  revoke(id: string, at: number): Promise<boolean>;
}

const LISTED = `
  SELECT k.id, k.name, k.prefix, k.secret_hash AS secretHash, k.role, k.owner_id AS ownerId, k.created_by AS createdBy,
    k.created_at AS createdAt, k.expires_at AS expiresAt, k.last_used_at AS lastUsedAt, k.revoked_at AS revokedAt,
    k.requests_per_minute AS requestsPerMinute, k.attitudes_per_month AS attitudesPerMonth, k.attitudes_per_call AS attitudesPerCall, k.parallel_requests AS parallelRequests, p.name AS createdByName
  FROM api_keys k JOIN people p ON p.id = k.created_by`;

export function apiKeysRepository({ sequelize, apiKeys, writes }: Database): ApiKeysRepository {
  return {
    bySecretHash: async (secretHash) => (await apiKeys.findOne({ where: { secretHash } }))?.get() ?? null,
    byId: async (id) => (await select<ListedKey>(sequelize, `${LISTED} WHERE k.id = $id`, { id }))[0] ?? null,
    list: (ownerId) => select<ListedKey>(sequelize, `${LISTED} ${ownerId === null ? '' : 'WHERE k.owner_id = $ownerId'} ORDER BY k.created_at DESC, k.id`, { ownerId }),
    insert: (key) => writes.run(async (transaction) => {
      await apiKeys.create(key, { transaction });
    }),
    setLimits: (id, limits) => writes.run(async (transaction) => {
      await apiKeys.update({ ...limits }, { where: { id }, transaction });
    }),
    revoke: (id, at) => writes.run(async (transaction) => {
      const [changed] = await apiKeys.update({ revokedAt: at }, { where: { id, revokedAt: null }, transaction });
      return changed === 1;
    }),
  };
}
