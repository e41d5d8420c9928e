import type { Response } from 'express';
import { PROBLEMS, type ProblemCode, type ProblemItem } from '#shared/api/problems.ts';
import { WriteQueueClosedError, WriteQueueFullError } from '#server/db/write-queue.ts';
import { DomainError } from '#server/domain/errors.ts';

/** A request that cannot be answered, as HTTP sees it: the code decides the status. */
export class HttpProblem extends Error {
  override readonly name = 'HttpProblem';
  readonly code: ProblemCode;
  readonly items: readonly ProblemItem[];
  readonly headers: Readonly<Record<string, string>>;

  constructor(code: ProblemCode, detail: string, items: readonly ProblemItem[] = [], headers: Readonly<Record<string, string>> = {}) {
    super(detail);
    this.code = code;
    this.items = items;
    this.headers = headers;
  }
}

/** What any error says to the outside. An error that nobody foresaw says nothing of itself. */
export function problemOf(error: unknown): HttpProblem {
  if (error instanceof HttpProblem) return error;
  if (error instanceof DomainError) return new HttpProblem(error.code, error.message, error.items, { ...challengeFor(error.code), ...(error.retryAfterSeconds === null ? {} : { 'Retry-After': String(error.retryAfterSeconds) }) });
  if (error instanceof WriteQueueFullError || error instanceof WriteQueueClosedError) {
    return new HttpProblem('not-recorded', 'The service records every call before it answers, and cannot record this one now. Try again.', [], { 'Retry-After': '1' });
  }
  return new HttpProblem('internal', 'The service failed to answer. The request id names the failure in its log.');
}

/** RFC 9110 asks a 401 to say how to authenticate. */
function challengeFor(code: ProblemCode): Record<string, string> {
  return PROBLEMS[code].status === 401 && code !== 'wrong-credentials' && code !== 'not-signed-in' ? { 'WWW-Authenticate': 'Bearer realm="dextral"' } : {};
}

export function sendProblem(response: Response, problem: HttpProblem, instance: string): void {
  const { status, title } = PROBLEMS[problem.code];
  const document = {
    type: `/problems/${problem.code}`, title, status, detail: problem.message, instance, code: problem.code, errors: problem.items,
  };
  response.status(status).set(problem.headers).type('application/problem+json').send(JSON.stringify(document));
}

export const missingKey = () => new HttpProblem('missing-key', 'Send an API key as "Authorization: Bearer <key>", or sign in to the console.', [], challengeFor('missing-key'));
