import { queryOptions } from '@tanstack/react-query';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { Convention } from '../../../../../shared/attitude/convention.ts';
import type { components } from '../../../lib/contract.gen.ts';

/** The client loosens tuples to arrays; the contract has them. */
export type Preset = Omit<components['schemas']['Preset'], 'convention'> & { convention: Convention };

export const conventionsQuery = queryOptions({
  queryKey: ['conventions'],
  queryFn: async ({ signal }): Promise<Preset[]> => (await dataOf(client.GET('/conventions', { signal }))).items as unknown as Preset[],
  staleTime: Infinity,
});

export const conventionQuery = (id: string) => queryOptions({
  queryKey: ['conventions', id],
  queryFn: async ({ signal }): Promise<Preset> => (await dataOf(client.GET('/conventions/{id}', { params: { path: { id } }, signal }))) as unknown as Preset,
  staleTime: Infinity,
});
