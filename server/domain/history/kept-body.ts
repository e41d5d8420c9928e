import { createHash } from 'node:crypto';
import { KEPT_BODY_BYTES } from '#shared/api/limits.ts';

export interface KeptBody {
  readonly sha256: string;
  readonly bytes: number;
  /** Null where it is too long to keep, or bodies are not kept. */
  readonly text: string | null;
}

/** What stays of a body: always enough to prove that it was this one, and the whole of it where that is wanted. */
export function keptBody(body: Buffer, keepBodies: boolean): KeptBody {
  return {
    sha256: createHash('sha256').update(body).digest('hex'),
    bytes: body.length,
    text: keepBodies && body.length <= KEPT_BODY_BYTES ? body.toString('utf8') : null,
  };
}
