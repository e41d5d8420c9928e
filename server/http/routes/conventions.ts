import type { Router } from 'express';
import { getConventionEndpoint, listConventionsEndpoint } from '#shared/api/conventions.ts';
import { getPreset, listPresets } from '#server/domain/conventions/presets.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function conventionRoutes(services: Services, router: Router): void {
  mount(services, router, listConventionsEndpoint)(() => ({ items: listPresets() }));
  mount(services, router, getConventionEndpoint)(({ params }) => getPreset(params.id));
}
