import type { Router } from 'express';
import { listHistoryEndpoint } from '#shared/api/history.ts';
import { listHistory } from '#server/domain/history/history.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function historyRoutes(services: Services, router: Router): void {
  mount(services, router, listHistoryEndpoint)(({ caller, query }) => listHistory(services, caller, query));
}
