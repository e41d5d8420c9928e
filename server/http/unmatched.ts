import type { Router } from 'express';
import { BASE_PATH } from '#shared/api/endpoint.ts';
import { ENDPOINTS } from '#shared/api/table.ts';
import type { Services } from '../services.ts';
import { authenticate } from './authenticate.ts';
import { openCall } from './call.ts';
import { refuse } from './mount.ts';
import { HttpProblem } from './problems.ts';

/** Answers what no endpoint answers: an address that exists under another method, or none at all. Recorded like any call. */
export function mountUnmatched(services: Services, router: Router): void {
  router.use(async (request, response) => {
    const call = openCall(request, response, services.clock());
    const methods = methodsAt(request.path);
    const problem = methods.length > 0
      ? new HttpProblem('method-not-allowed', `${BASE_PATH}${request.path} answers to ${methods.join(', ')}, not to ${request.method}.`, [], { Allow: methods.join(', ') })
      : new HttpProblem('unknown-route', `There is nothing at ${request.method} ${request.originalUrl.split('?')[0]!.slice(0, 200)}. The operations are listed at /docs.`);
    await tellWhose();
    await refuse(services, call, methods.length > 0 ? BASE_PATH + request.path : 'unknown', problem);

    async function tellWhose() {
      // Only to say in the history whose call it was; the answer is the same for everybody.
      await authenticate(services, { auth: 'caller' } as Parameters<typeof authenticate>[1], call).catch(() => undefined);
    }
  });
}

function methodsAt(path: string): string[] {
  return ENDPOINTS.filter((endpoint) => new RegExp(`^${endpoint.path.replaceAll(/\{\w+\}/g, '[^/]+')}$`).test(path)).map(({ method }) => method.toUpperCase());
}
