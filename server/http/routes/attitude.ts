import type { Router } from 'express';
import { convertEndpoint } from '#shared/api/attitude.ts';
import { convertAttitudes } from '#server/domain/attitude/convert.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function attitudeRoutes(services: Services, router: Router): void {
  mount(services, router, convertEndpoint)(({ body, meter }) => convertAttitudes(services, body, meter));
}
