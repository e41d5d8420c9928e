import type { Router } from 'express';
import { changeHistorySettingsEndpoint, exportHistoryEndpoint, getHistoryEntryEndpoint, getHistorySettingsEndpoint, listHistoryEndpoint } from '#shared/api/history.ts';
import { exportHistory, getHistoryEntry, listHistory } from '#server/domain/history/history.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function historyRoutes(services: Services, router: Router): void {
  mount(services, router, listHistoryEndpoint)(({ caller, query }) => listHistory(services, caller, query));
  mount(services, router, exportHistoryEndpoint)(({ caller, query, call }) => {
    const rows = exportHistory(services, caller, query);
    call.response.setHeader('Content-Disposition', `attachment; filename="history-${new Date(services.clock()).toISOString().slice(0, 10)}.csv"`);
    return rows;
  });
  // Before the entries: "settings" is no request id.
  mount(services, router, getHistorySettingsEndpoint)(() => services.historySettings.current);
  mount(services, router, changeHistorySettingsEndpoint)(({ caller, body }) => services.historySettings.change(body, caller.ownerId, services.clock()));
  mount(services, router, getHistoryEntryEndpoint)(({ caller, params }) => getHistoryEntry(services, caller, params.id));
}
