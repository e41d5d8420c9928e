import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { components } from '../../../lib/contract.gen.ts';

export type Person = components['schemas']['Person'];
export type Role = Person['role'];
export type SignInInput = components['schemas']['SignInInput'];

/** Who is signed in; null for nobody. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: async ({ signal }): Promise<Person | null> => (await dataOf(client.GET('/sessions/current', { signal }))).person,
  staleTime: 60_000,
});

export function useSignIn() {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: async (input: SignInInput) => (await dataOf(client.POST('/sessions', { body: input }))).person,
    onSuccess: (person) => {
      queries.clear();
      queries.setQueryData(sessionQuery.queryKey, person);
    },
  });
}

/** Signs out, and forgets everything that this page holds by leaving it: nothing is fetched again on the way. */
export function useSignOut() {
  return useMutation({
    mutationFn: async () => {
      await client.DELETE('/sessions/current');
    },
    onSettled: () => location.assign('/sign-in'),
  });
}
