import { describe, expect, it } from 'vitest';
import { hashSecret, looksLikeKey, newSecret } from '#server/domain/keys/secret.ts';

describe('API key secrets', () => {
  it('have a shape and a check that tell them from look-alikes', () => {
    const { secret, prefix, hash } = newSecret();
    expect(secret).toMatch(/^dxt_[0-9A-Za-z]{8}_[0-9A-Za-z]{38}$/);
    expect(secret.startsWith(`${prefix}_`)).toBe(true);
    expect(hash).toBe(hashSecret(secret));
    expect(looksLikeKey(secret)).toBe(true);
  });
  it('fail the check when any one character changes', () => {
    const { secret } = newSecret();
    for (let i = 4; i < secret.length; i++) {
      if (secret[i] === '_') continue;
      const changed = secret.slice(0, i) + (secret[i] === 'a' ? 'b' : 'a') + secret.slice(i + 1);
      expect(looksLikeKey(changed), `position ${i}`).toBe(false);
    }
  });
  it('are all different', () => {
    expect(new Set(Array.from({ length: 500 }, () => newSecret().secret)).size).toBe(500);
  });
});
