import { subjectOf } from '#server/domain/caller.ts';
import { QuotaMeter } from '#server/domain/meter.ts';
import type { Services } from '../services.ts';
import type { Call } from './call.ts';
import { HttpProblem } from './problems.ts';

export interface Admission {
  /** Ends the call's stay: books what it spent if it was answered, else gives it back. */
  leave(answered: boolean): void;
}

/** Failed and successful sign-ins from one address a minute. */
const SIGN_INS_PER_MINUTE = 30;

/**
 * Lets a call in within its caller's limits: so many at once, so many a minute; and opens its meter.
 * @throws HttpProblem `too-many-parallel`, `too-many-requests`.
 */
export async function admit(services: Services, call: Call): Promise<Admission | null> {
  const { caller, request, response } = call;
  if (!caller) {
    // The one thing that strangers can ask for again and again is to be signed in.
    if (request.method === 'POST') await services.limitRate(request, response, { subject: `address ${request.socket.remoteAddress ?? 'unknown'}`, perMinute: SIGN_INS_PER_MINUTE });
    return null;
  }
  const subject = subjectOf(caller);
  const limits = services.limits.of(caller);
  await services.limitRate(request, response, { subject, perMinute: limits.requestsPerMinute });
  await services.quota.open(subject);
  if (!services.parallel.enter(subject, limits.parallelRequests)) {
    throw new HttpProblem('too-many-parallel', `More than ${limits.parallelRequests} of your requests are under way; wait for one to be answered.`, [], { 'Retry-After': '1' });
  }
  const meter = new QuotaMeter(services.quota, subject, limits, call.startedAt);
  call.meter = meter;
  return {
    leave(answered) {
      meter.settle(answered);
      services.parallel.leave(subject);
    },
  };
}
