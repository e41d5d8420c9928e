import type { Router } from 'express';
import { convertEndpoint } from '#shared/api/attitude.ts';
import { BASE_PATH } from '#shared/api/endpoint.ts';
import { AttitudeError } from '#shared/attitude/errors.ts';
import { DomainError } from '#server/domain/errors.ts';
import type { Services } from '#server/services.ts';
import { admit, type Admission } from '../admit.ts';
import { authenticate } from '../authenticate.ts';
import { openCall } from '../call.ts';
import { refuse } from '../mount.ts';
import { HttpProblem } from '../problems.ts';
import { answerBatch } from './answer-batch.ts';
import { answerStream } from './answer-stream.ts';
import { BrokenOffError, leaveBody } from './body.ts';
import { exchangeOf, type Exchange } from './negotiate.ts';

/**
 * POST /convert for everything but short JSON: rows as NDJSON, CSV or doubles on either side, and JSON so long that it
 * would hold up the service. Goes the same way as any call: caller → limits → work → record → answer.
 */
export function mountConvertBatches(services: Services, router: Router): void {
  const route = BASE_PATH + convertEndpoint.path;
  router.post(convertEndpoint.path, async (request, response, next) => {
    let exchange: Exchange | null | HttpProblem;
    try {
      exchange = exchangeOf(request);
    } catch (error) {
      exchange = error as HttpProblem;
    }
    if (!exchange) return next();
    const call = openCall(request, response, services.clock());
    let admission: Admission | null = null;
    let answered = false;
    try {
      await authenticate(services, convertEndpoint, call);
      admission = await admit(services, call);
      if (exchange instanceof Error) throw exchange;
      const { input, output } = exchange;
      if (input && output) await answerStream(services, call, route, { input, output });
      else await answerBatch(services, call, route, exchange);
      answered = true;
    } catch (error) {
      leaveBody(request, response);
      await refuse(services, call, route, asProblem(error));
    } finally {
      admission?.leave(answered);
    }
  });
}

function asProblem(error: unknown): unknown {
  if (error instanceof AttitudeError) return new DomainError(error.code, error.message);
  if (error instanceof BrokenOffError) return new HttpProblem('malformed-request', error.message);
  return error;
}
