import { keepPreviousData, queryOptions, useMutation } from '@tanstack/react-query';
import type { Convention } from '../../../../../shared/attitude/convention.ts';
import type { Identification } from '../../../../../shared/attitude/identification/identification.ts';
import type { Rate } from '../../../../../shared/attitude/rates/rate.ts';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { components } from '../../../lib/contract.gen.ts';

/** The client loosens tuples to arrays; the contract has them. */
export type AttitudeRun = Omit<components['schemas']['AttitudeRun'], 'expected' | 'actual' | 'diagnosis'> & { expected: Convention; actual: Convention; diagnosis?: Identification };
export type RateRun = Omit<components['schemas']['RateRun'], 'attitude' | 'expected' | 'actual'> & { attitude: Convention; expected: Rate; actual: Rate };
export type Run = AttitudeRun | RateRun;
export type Tolerance = components['schemas']['Tolerance'];

export interface RunsFilter {
  readonly verdict: string;
  readonly label: string;
  readonly cursor: string;
}

export function runsQuery(filter: RunsFilter, limit = 25) {
  const query = {
    ...(filter.verdict === 'pass' || filter.verdict === 'fail' ? { verdict: filter.verdict as 'pass' | 'fail' } : {}),
    ...(filter.label && { label: filter.label }), ...(filter.cursor && { cursor: filter.cursor }), limit: String(limit),
  };
  return queryOptions({
    queryKey: ['runs', query],
    queryFn: async ({ signal }) => (await dataOf(client.GET('/runs', { params: { query }, signal }))) as unknown as { items: Run[]; nextCursor: string | null },
    placeholderData: keepPreviousData,
  });
}

export const runQuery = (id: string) => queryOptions({
  queryKey: ['runs', id],
  queryFn: async ({ signal }) => (await dataOf(client.GET('/runs/{id}', { params: { path: { id } }, signal }))) as unknown as Run,
  staleTime: Infinity,
});

export interface VerifyRequest {
  readonly expected: { readonly convention: Convention; readonly attitudes: readonly (readonly number[])[] };
  readonly actual: { readonly convention: Convention; readonly attitudes: readonly (readonly number[])[] };
  readonly tolerance: Tolerance;
  readonly label?: string;
  readonly diagnose?: boolean;
  readonly repair?: 'none' | 'nearest';
}

export function useVerify() {
  return useMutation({
    mutationFn: (request: VerifyRequest) => dataOf(client.POST('/verify', { body: request as unknown as components['schemas']['VerifyInput'] })),
  });
}
