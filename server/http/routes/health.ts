import type { Router } from 'express';
import { healthEndpoint } from '#shared/api/health.ts';
import { ENGINE } from '#server/domain/attitude/engine.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function healthRoutes(services: Services, router: Router): void {
  mount(services, router, healthEndpoint)(() => ({ status: 'ok' as const, engine: ENGINE }));
}
