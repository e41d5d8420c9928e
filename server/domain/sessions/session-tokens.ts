import type { KeyObject } from 'node:crypto';
import jwt from 'jsonwebtoken';

const ISSUER = 'dextral';
const AUDIENCE = 'dextral-console';
const ALGORITHM = 'HS256';

export interface SessionClaims {
  readonly personId: string;
  readonly sessionId: string;
}

/** Signs and reads the token of a session. Algorithm, issuer, audience and expiry are pinned on reading. */
export class SessionTokens {
  readonly #secret: KeyObject;

  constructor(secret: KeyObject) {
    this.#secret = secret;
  }

  sign({ personId, sessionId }: SessionClaims, expiresAt: number): string {
    return jwt.sign({ sub: personId, sid: sessionId, exp: Math.floor(expiresAt / 1000) }, this.#secret, { algorithm: ALGORITHM, issuer: ISSUER, audience: AUDIENCE });
  }

  /** Null for anything that this service did not sign, or that has expired. */
  read(token: string, now: number): SessionClaims | null {
    try {
      const claims = jwt.verify(token, this.#secret, { algorithms: [ALGORITHM], issuer: ISSUER, audience: AUDIENCE, clockTimestamp: Math.floor(now / 1000) });
      if (typeof claims === 'string' || typeof claims.sub !== 'string' || typeof claims['sid'] !== 'string') return null;
      return { personId: claims.sub, sessionId: claims['sid'] };
    } catch (error) {
      if (error instanceof jwt.JsonWebTokenError) return null;
      throw error;
    }
  }
}
