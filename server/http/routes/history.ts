import type { Router } from 'express';
import { exportHistoryEndpoint, listHistoryEndpoint } from '#shared/api/history.ts';
import { exportHistory, listHistory } from '#server/domain/history/history.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function historyRoutes(services: Services, router: Router): void {
  mount(services, router, listHistoryEndpoint)(({ caller, query }) => listHistory(services, caller, query));
  mount(services, router, exportHistoryEndpoint)(({ caller, query, call }) => {
    const rows = exportHistory(services, caller, query);
    call.response.setHeader('Content-Disposition', `attachment; filename="history-${new Date(services.clock()).toISOString().slice(0, 10)}.csv"`);
    return rows;
  });
}
