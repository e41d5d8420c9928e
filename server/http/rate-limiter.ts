import type { Request, Response } from 'express';
import { rateLimit } from 'express-rate-limit';
import { HttpProblem } from './problems.ts';

const WINDOW_MS = 60_000;

/** Whose requests are counted, and how many a minute are allowed. */
export interface RateSubject {
  readonly subject: string;
  readonly perMinute: number;
}

/** Counts a request against its subject's minute and sets the RateLimit headers. @throws HttpProblem `too-many-requests`. */
export type RateLimiter = (request: Request, response: Response, subject: RateSubject) => Promise<void>;

/**
 * Requests a minute by express-rate-limit, keyed by the id of the key or person and never by an address that a header
 * could forge. The limit is read anew for every request, so that a change is in force on the next one.
 */
export function createRateLimiter(): RateLimiter {
  const subjects = new WeakMap<Request, RateSubject>();
  const limiter = rateLimit({
    windowMs: WINDOW_MS,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    identifier: 'requests-per-minute',
    keyGenerator: (request) => subjects.get(request)!.subject,
    limit: (request) => subjects.get(request)!.perMinute,
    handler: (request, response, next) => {
      const { perMinute } = subjects.get(request)!;
      const retryAfter = String(response.getHeader('Retry-After') ?? WINDOW_MS / 1000);
      next(new HttpProblem('too-many-requests', `More than ${perMinute} requests in this minute; try again in ${retryAfter} s.`, [], { 'Retry-After': retryAfter }));
    },
  });
  return (request, response, subject) => {
    subjects.set(request, subject);
    return new Promise((resolve, reject) => {
      void limiter(request, response, (error?: unknown) => (error ? reject(error) : resolve()));
    });
  };
}
