import type { Router } from 'express';
import { changeKeyLimitsEndpoint, changeLimitsEndpoint, listLimitsEndpoint, ownUsageEndpoint, usageByKeyEndpoint } from '#shared/api/usage.ts';
import { changeKeyLimits, changeRoleLimits } from '#server/domain/limits/change-limits.ts';
import { ownUsage, usageByKey } from '#server/domain/usage/usage.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function usageRoutes(services: Services, router: Router): void {
  mount(services, router, ownUsageEndpoint)(({ caller, query }) => ownUsage(services, caller, query.month));
  mount(services, router, usageByKeyEndpoint)(({ caller, query }) => usageByKey(services, caller, query.month));
  mount(services, router, listLimitsEndpoint)(() => ({ items: services.limits.rows() }));
  mount(services, router, changeLimitsEndpoint)(({ caller, params, body }) => changeRoleLimits(services, caller, params.role, body));
  mount(services, router, changeKeyLimitsEndpoint)(({ params, body }) => changeKeyLimits(services, params.id, body));
}
