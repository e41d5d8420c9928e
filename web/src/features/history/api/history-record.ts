import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { components } from '../../../lib/contract.gen.ts';

export type HistoryRecord = components['schemas']['HistoryRecord'];
type ConvertInput = components['schemas']['ConvertInput'];

export const historyRecordQuery = (id: string) => queryOptions({
  queryKey: ['history', 'record', id],
  queryFn: ({ signal }) => dataOf(client.GET('/history/{id}', { params: { path: { id } }, signal })),
  // What was recorded does not change.
  staleTime: Infinity,
});

/** Sends a stored conversion again, as it was, in the name of whoever is signed in; the answer's request id and count. */
export function useSendAgain() {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: async (text: string): Promise<{ requestId: string; attitudes: number }> => {
      const { data, response } = await client.POST('/convert', { body: JSON.parse(text) as ConvertInput });
      return { requestId: response.headers.get('x-request-id') ?? '', attitudes: (data as components['schemas']['ConvertOutput']).attitudes.length };
    },
    onSettled: () => queries.invalidateQueries({ queryKey: ['history'] }),
  });
}
