import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { components } from '../../../lib/contract.gen.ts';

export type UsageByKey = components['schemas']['UsageByKey'];
export type RoleLimits = components['schemas']['RoleLimits'];
export type Limits = components['schemas']['Limits'];

export const usageByKeyQuery = (month: string) => queryOptions({
  queryKey: ['usage', 'keys', month],
  queryFn: ({ signal }): Promise<UsageByKey> => dataOf(client.GET('/usage/keys', { params: { query: month ? { month } : {} }, signal })),
});

export const limitsQuery = queryOptions({
  queryKey: ['limits'],
  queryFn: async ({ signal }): Promise<RoleLimits[]> => (await dataOf(client.GET('/limits', { signal }))).items,
});

export function useChangeLimits() {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: ({ role, ...limits }: RoleLimits) => dataOf(client.PUT('/limits/{role}', { params: { path: { role } }, body: limits })),
    onSuccess: () => Promise.all([queries.invalidateQueries(limitsQuery), queries.invalidateQueries({ queryKey: ['usage'] })]),
  });
}
