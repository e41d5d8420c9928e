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

/** Signs in on the sign-in page: whatever was fetched for somebody else is forgotten. */
export function useSignIn() {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: signIn,
    onSuccess: (person) => {
      queries.clear();
      queries.setQueryData(sessionQuery.queryKey, person);
    },
  });
}

/** Goes on with the same person's session where the last one ended: what failed meanwhile is fetched again. */
export function useSignInAgain() {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: signIn,
    onSuccess: async (person) => {
      queries.setQueryData(sessionQuery.queryKey, person);
      await queries.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== sessionQuery.queryKey[0] });
    },
  });
}

const signIn = async (input: SignInInput): Promise<Person> => (await dataOf(client.POST('/sessions', { body: input }))).person;

/** Signs out, and forgets everything that this page holds by leaving it. */
export function useSignOut() {
  return useMutation({
    mutationFn: async () => {
      await client.DELETE('/sessions/current');
    },
    onSettled: () => location.assign('/sign-in'),
  });
}
