import { randomUUID } from 'node:crypto';
import type { Request, Response } from 'express';
import type { Caller } from '#server/domain/caller.ts';
import { NoMeter, type Meter } from '#server/domain/meter.ts';
import type { VerifiedRun } from '#server/domain/runs/verify.ts';
import type { PersonDocument } from '#server/domain/sessions/sessions.ts';

/** One API call from its first byte to its record: filled in as it goes. */
export interface Call {
  readonly id: string;
  readonly request: Request;
  readonly response: Response;
  readonly startedAt: number;
  readonly startedNs: bigint;
  meter: Meter;
  caller: Caller | null;
  person: PersonDocument | null;
  /** The verification that this call made, stored with its record. */
  run: VerifiedRun | null;
  /** The JSON body as it arrived, decompressed. */
  body: Buffer | null;
  /** Whether the history may hold the body: only where a body never carries a secret. */
  bodyMayBeKept: boolean;
}

/** Opens a call and names it in the answer's headers. */
export function openCall(request: Request, response: Response, now: number): Call {
  const id = randomUUID();
  response.setHeader('X-Request-Id', id);
  return { id, request, response, startedAt: now, startedNs: process.hrtime.bigint(), meter: new NoMeter(), caller: null, person: null, run: null, body: null, bodyMayBeKept: false };
}
