import type { ApiKeyDocument } from '#shared/api/keys.ts';
import type { ListedKey } from '#server/db/repositories/api-keys.ts';
import { toTimestamp, toTimestampOrNull } from '../clock.ts';

/** A key as the API shows it: never its hash. */
export function presentKey(key: ListedKey): ApiKeyDocument {
  return {
    id: key.id,
    name: key.name,
    prefix: key.prefix,
    role: key.role,
    createdAt: toTimestamp(key.createdAt),
    createdBy: { id: key.createdBy, name: key.createdByName },
    expiresAt: toTimestampOrNull(key.expiresAt),
    lastUsedAt: toTimestampOrNull(key.lastUsedAt),
    revokedAt: toTimestampOrNull(key.revokedAt),
  };
}
