import createClient from 'openapi-fetch';
import { ApiError, UnreachableError, type Problem } from './api-error.ts';
import type { paths } from './contract.gen.ts';

const client = createClient<paths, 'application/json'>({ baseUrl: '/api/v1', credentials: 'same-origin' });

client.use({
  async onResponse({ response }) {
    if (response.ok) return;
    if (response.headers.get('content-type')?.startsWith('application/problem+json')) throw new ApiError((await response.json()) as Problem);
    throw new UnreachableError(`The service answered ${response.status} without saying why.`);
  },
  onError({ error }) {
    throw error instanceof ApiError ? error : new UnreachableError('The service cannot be reached. Is the network up?');
  },
});

export { client };

/** The data of an answer; refusals have thrown before. */
export async function dataOf<T>(answer: Promise<{ data?: T }>): Promise<T> {
  return (await answer).data as T;
}
