import type { Router } from 'express';
import { convertEndpoint } from '#shared/api/attitude.ts';
import { identifyEndpoint } from '#shared/api/identify.ts';
import { ratesEndpoint } from '#shared/api/rates.ts';
import { resolveEndpoint } from '#shared/api/resolve.ts';
import { rigidBodyEndpoint } from '#shared/api/rigid-body.ts';
import { convertAttitudes } from '#server/domain/attitude/convert.ts';
import { identify } from '#server/domain/attitude/identify.ts';
import { convertRates } from '#server/domain/attitude/rates.ts';
import { resolveBatch } from '#server/domain/attitude/resolve.ts';
import { rigidBody } from '#server/domain/attitude/rigid-body.ts';
import type { Services } from '#server/services.ts';
import { mountConvertBatches } from '../batches/convert-batches.ts';
import { refuseStatedTwice } from '../batches/query.ts';
import { mount } from '../mount.ts';

export function attitudeRoutes(services: Services, router: Router): void {
  mountConvertBatches(services, router);
  mount(services, router, convertEndpoint)(({ query, body, meter }) => {
    refuseStatedTwice(query);
    return convertAttitudes(services, body, meter);
  });
  mount(services, router, ratesEndpoint)(({ body, meter }) => convertRates(body, meter));
  mount(services, router, identifyEndpoint)(({ body, meter }) => identify(services, body, meter));
  mount(services, router, resolveEndpoint)(({ body, meter }) => resolveBatch(body, meter));
  mount(services, router, rigidBodyEndpoint)(({ body, meter }) => rigidBody(body, meter));
}
