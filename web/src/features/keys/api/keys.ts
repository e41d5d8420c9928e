import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { components } from '../../../lib/contract.gen.ts';

export type ApiKey = components['schemas']['ApiKey'];
export type IssueKeyInput = components['schemas']['IssueKeyInput'];

export const keysQuery = queryOptions({
  queryKey: ['keys'],
  queryFn: async ({ signal }): Promise<ApiKey[]> => (await dataOf(client.GET('/keys', { signal }))).items,
});

export function useIssueKey() {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (input: IssueKeyInput) => dataOf(client.POST('/keys', { body: input })),
    onSuccess: () => queries.invalidateQueries(keysQuery),
  });
}

export function useRevokeKey() {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => dataOf(client.POST('/keys/{id}/revoke', { params: { path: { id } } })),
    onSuccess: () => queries.invalidateQueries(keysQuery),
  });
}

/** What a key's state is called. */
export function stateOf(key: ApiKey, now = Date.now()): 'in use' | 'unused' | 'revoked' | 'expired' {
  if (key.revokedAt !== null) return 'revoked';
  if (key.expiresAt !== null && Date.parse(key.expiresAt) <= now) return 'expired';
  return key.lastUsedAt === null ? 'unused' : 'in use';
}
