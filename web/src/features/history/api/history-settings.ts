import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { components } from '../../../lib/contract.gen.ts';

export type HistorySettings = components['schemas']['HistorySettings'];

export const historySettingsQuery = queryOptions({
  queryKey: ['history-settings'],
  queryFn: ({ signal }) => dataOf(client.GET('/history/settings', { signal })),
});

export function useChangeHistorySettings() {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (body: HistorySettings) => dataOf(client.PUT('/history/settings', { body })),
    onSuccess: (settings) => queries.setQueryData(historySettingsQuery.queryKey, settings),
  });
}
