import type { Router } from 'express';
import { convertEndpoint } from '#shared/api/attitude.ts';
import { identifyEndpoint } from '#shared/api/identify.ts';
import { ratesEndpoint } from '#shared/api/rates.ts';
import { convertAttitudes } from '#server/domain/attitude/convert.ts';
import { identify } from '#server/domain/attitude/identify.ts';
import { convertRates } from '#server/domain/attitude/rates.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function attitudeRoutes(services: Services, router: Router): void {
  mount(services, router, convertEndpoint)(({ body, meter }) => convertAttitudes(services, body, meter));
  mount(services, router, ratesEndpoint)(({ body, meter }) => convertRates(body, meter));
  mount(services, router, identifyEndpoint)(({ body, meter }) => identify(services, body, meter));
}
