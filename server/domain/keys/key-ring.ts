import type { ApiKeysRepository } from '#server/db/repositories/api-keys.ts';
import type { ApiKeyRow } from '#server/db/models/api-key.ts';
import type { Caller } from '../caller.ts';
import type { Clock } from '../clock.ts';
import { DomainError } from '../errors.ts';
import { hashSecret, looksLikeKey } from './secret.ts';

/** Keys kept in memory at most; the oldest looked up is dropped first. */
const REMEMBERED = 10_000;

/** Tells a caller from the secret of an API key, remembering keys so that a call costs no query. */
export class KeyRing {
  readonly #apiKeys: ApiKeysRepository;
  readonly #clock: Clock;
  readonly #known = new Map<string, ApiKeyRow>();
  /** Counts every forgetting: a look-up that was under way meanwhile must not bring an old row back. */
  #generation = 0;

  constructor(apiKeys: ApiKeysRepository, clock: Clock) {
    this.#apiKeys = apiKeys;
    this.#clock = clock;
  }

  /** @throws DomainError `invalid-key`, or RefusedKeyError for a key that was issued and no longer works. */
  async callerOf(secret: string): Promise<Caller> {
    if (!looksLikeKey(secret)) throw new DomainError('invalid-key', 'This is not a key of this service: its shape or its check characters are wrong.');
    const key = await this.#find(hashSecret(secret));
    if (!key) throw new DomainError('invalid-key', 'This service has issued no such key.');
    const caller: Caller = { kind: 'key', role: key.role, ownerId: key.ownerId, keyId: key.id, personId: null, sessionId: null, keyLimits: key };
    if (key.revokedAt !== null) throw new RefusedKeyError('revoked-key', `The key ${key.prefix} was revoked on ${new Date(key.revokedAt).toISOString()}.`, caller);
    if (key.expiresAt !== null && key.expiresAt <= this.#clock()) throw new RefusedKeyError('expired-key', `The key ${key.prefix} expired on ${new Date(key.expiresAt).toISOString()}.`, caller);
    return caller;
  }

  /** Drops a key after a change to it. */
  forget(secretHash: string): void {
    this.#generation++;
    this.#known.delete(secretHash);
  }

  async #find(secretHash: string): Promise<ApiKeyRow | null> {
    const remembered = this.#known.get(secretHash);
    if (remembered) return remembered;
    const generation = this.#generation;
    const key = await this.#apiKeys.bySecretHash(secretHash);
    if (key && generation === this.#generation) {
      if (this.#known.size >= REMEMBERED) this.#known.delete(this.#known.keys().next().value!);
      this.#known.set(secretHash, key);
    }
    return key;
  }
}

/** The key is ours but no longer works; the history still says whose call it was. */
export class RefusedKeyError extends DomainError {
  readonly caller: Caller;
  constructor(code: 'revoked-key' | 'expired-key', detail: string, caller: Caller) {
    super(code, detail);
    this.caller = caller;
  }
}
