import type { Router } from 'express';
import { getRunEndpoint, getRunJUnitEndpoint, listRunsEndpoint, verifyEndpoint, verifyRatesEndpoint } from '#shared/api/runs.ts';
import { runAsJUnit } from '#server/domain/runs/junit.ts';
import { getRun, listRuns } from '#server/domain/runs/runs.ts';
import { verifyStatedRates } from '#server/domain/runs/verify-rates.ts';
import { verify } from '#server/domain/runs/verify.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function runRoutes(services: Services, router: Router): void {
  mount(services, router, verifyEndpoint)(async ({ body, meter, call }) => {
    const { answer, run } = await verify(services, body, meter);
    call.run = run;
    return answer;
  });
  mount(services, router, verifyRatesEndpoint)(({ body, meter, call }) => {
    const { answer, run } = verifyStatedRates(body, meter);
    call.run = run;
    return answer;
  });
  mount(services, router, listRunsEndpoint)(({ caller, query }) => listRuns(services, caller, query));
  mount(services, router, getRunJUnitEndpoint)(async ({ caller, params }) => runAsJUnit(await getRun(services, caller, params.id)));
  mount(services, router, getRunEndpoint)(({ caller, params }) => getRun(services, caller, params.id));
}
